import { useId } from 'react';
import { Pressable, View } from 'react-native';

import { focusControl, onKeys } from './keys';
import { Text } from './Text';
import { useLayout, useTheme } from './theme';
import { RADIUS, TARGET } from './tokens';

export interface ChoiceProps<Value extends string> {
  label: string;
  options: readonly { value: Value; label: string }[];
  value: Value;
  onChange: (value: Value) => void;
  /** The label is spoken only. */
  hideLabel?: boolean;
  disabled?: boolean;
}

const STEP: Partial<Record<string, number>> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/** One of a few, side by side; one stop of the Tab key, arrow keys move between the options. */
export const Choice = <Value extends string>({ label, options, value, onChange, hideLabel = false, disabled = false }: ChoiceProps<Value>) => {
  const { colors } = useTheme();
  const { finePointer } = useLayout();
  const group = useId();
  const at = options.findIndex((option) => option.value === value);
  const onKey = (key: string): boolean => {
    const step = STEP[key];
    const next = step === undefined || disabled ? undefined : options[(at + step + options.length) % options.length];
    if (!next) return false;
    onChange(next.value);
    focusControl(`${group}${next.value}`);
    return true;
  };
  return (
    <View style={{ gap: 4 }}>
      {hideLabel ? null : <Text variant="label" aria-hidden>{label}</Text>}
      <View role="radiogroup" aria-label={label} {...onKeys(onKey)} style={{ flexDirection: 'row', flexWrap: 'wrap' }}>
        {options.map((option, index) => {
          const on = option.value === value;
          return (
            <Pressable key={option.value} id={`${group}${option.value}`} role="radio" aria-checked={on} aria-label={option.label} aria-disabled={disabled} disabled={disabled}
              tabIndex={on || (at < 0 && index === 0) ? 0 : -1} onPress={() => onChange(option.value)}
              style={{ minHeight: finePointer ? TARGET.pointer : TARGET.finger, minWidth: 44, paddingHorizontal: 12, justifyContent: 'center', alignItems: 'center', marginRight: -1, borderWidth: 1, borderColor: on ? colors.ink : colors.rule2, borderRadius: RADIUS.window, backgroundColor: on ? colors.ink : colors.panel }}>
              <Text variant="label" strong={on} tone={on ? 'onFilled' : disabled ? 'quiet' : 'ink'}>{option.label}</Text>
            </Pressable>
          );
        })}
      </View>
    </View>
  );
};
