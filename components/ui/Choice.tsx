import { Pressable, View } from 'react-native';

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

/** One of a few, side by side; arrow keys move between them on the web as in any radio group. */
export const Choice = <Value extends string>({ label, options, value, onChange, hideLabel, disabled }: ChoiceProps<Value>) => {
  const { colors } = useTheme();
  const { finePointer } = useLayout();
  return (
    <View style={{ gap: 4 }}>
      {hideLabel ? null : <Text variant="label" aria-hidden>{label}</Text>}
      <View role="radiogroup" aria-label={label} style={{ flexDirection: 'row', flexWrap: 'wrap' }}>
        {options.map((option) => {
          const on = option.value === value;
          return (
            <Pressable key={option.value} role="radio" aria-checked={on} aria-label={option.label} aria-disabled={disabled} disabled={disabled} onPress={() => onChange(option.value)}
              style={{ minHeight: finePointer ? TARGET.pointer : TARGET.finger, paddingHorizontal: 12, justifyContent: 'center', marginRight: -1, borderWidth: 1, borderColor: on ? colors.ink : colors.rule2, borderRadius: RADIUS.window, backgroundColor: on ? colors.ink : colors.panel }}>
              <Text variant="label" strong={on} tone={on ? 'onFilled' : 'ink'}>{option.label}</Text>
            </Pressable>
          );
        })}
      </View>
    </View>
  );
};
