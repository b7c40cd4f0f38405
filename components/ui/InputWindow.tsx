import { useId, type ReactNode, type Ref } from 'react';
import { Platform, TextInput, View } from 'react-native';

import { selectUntouched } from './select-untouched';
import { FAMILY, Text } from './Text';
import { useTheme } from './theme';
import { RADIUS, type ColorName } from './tokens';

export interface InputWindowProps {
  label: string;
  /** As typed. */
  value: string;
  onChangeText: (text: string) => void;
  onBlur?: () => void;
  onFocus?: () => void;
  onSubmitEditing?: () => void;
  /** The value as it was understood, such as `10 Ω ±20 %`; an equals sign is set before it. */
  echo?: ReactNode;
  /** A remark behind the echo, such as which check it sets. */
  note?: { text: string; tone: ColorName };
  /** Says what is wrong and gives an example; stands in place of the echo. */
  error?: string | null;
  placeholder?: string;
  readOnly?: boolean;
  inputRef?: Ref<TextInput>;
}

/** One quantity: label and echo at the left, at the right a window sunk into the panel. */
export const InputWindow = ({ label, echo, note, error, inputRef, onFocus, ...input }: InputWindowProps) => {
  const { colors } = useTheme();
  const id = useId();
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: 10, paddingVertical: 4, borderBottomWidth: 1, borderBottomColor: colors.rule, minHeight: 49 }}>
      <View style={{ flex: 1 }}>
        <Text variant="label" aria-hidden>{label}</Text>
        <Text variant="secondary" tone={error ? 'fail' : 'quiet'} nativeID={id} role={error ? 'alert' : undefined}>
          {error ?? (echo ? <>= {echo}</> : null)}
          {note && !error ? <Text variant="secondary" strong tone={note.tone}> {note.text}</Text> : null}
        </Text>
      </View>
      <TextInput
        {...input}
        ref={inputRef}
        aria-label={label}
        aria-invalid={Boolean(error)}
        aria-describedby={id}
        autoCapitalize="none"
        autoCorrect={false}
        spellCheck={false}
        selectTextOnFocus={Platform.OS !== 'web'}
        onFocus={(event) => {
          selectUntouched(event);
          onFocus?.();
        }}
        placeholderTextColor={colors.quiet}
        style={{
          width: 108,
          height: 40,
          paddingHorizontal: 9,
          textAlign: 'right',
          borderWidth: 1,
          borderTopWidth: 2,
          borderColor: error ? colors.fail : colors.rule2,
          borderTopColor: error ? colors.fail : colors.ink,
          borderBottomWidth: error ? 2 : 1,
          borderRadius: RADIUS.window,
          backgroundColor: input.readOnly ? colors.paper : colors.panel,
          color: colors.ink,
          fontFamily: FAMILY.mono,
          fontSize: 16,
          letterSpacing: -0.32,
        }}
      />
    </View>
  );
};
