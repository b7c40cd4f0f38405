import { useId, type Ref } from 'react';
import { TextInput, View, type TextInputProps } from 'react-native';

import { FAMILY, Text } from './Text';
import { useTheme } from './theme';
import { RADIUS, TYPE } from './tokens';

export interface TextFieldProps
  extends Pick<TextInputProps, 'secureTextEntry' | 'autoComplete' | 'inputMode' | 'onSubmitEditing' | 'onBlur' | 'autoFocus' | 'maxLength' | 'readOnly'> {
  label: string;
  value: string;
  onChangeText: (text: string) => void;
  hint?: string;
  error?: string | null;
  placeholder?: string;
  multiline?: boolean;
  /** The label is spoken only, as in a search box. */
  hideLabel?: boolean;
  inputRef?: Ref<TextInput>;
}

/** A field for words, label above, hint or error below. */
export const TextField = ({ label, hint, error, multiline, hideLabel, inputRef, ...input }: TextFieldProps) => {
  const { colors } = useTheme();
  const id = useId();
  const said = error ?? hint;
  return (
    <View style={{ gap: 4 }}>
      {hideLabel ? null : <Text variant="label" aria-hidden>{label}</Text>}
      <TextInput
        {...input}
        ref={inputRef}
        aria-label={label}
        aria-invalid={Boolean(error)}
        aria-describedby={said ? id : undefined}
        multiline={multiline}
        placeholderTextColor={colors.quiet}
        style={{
          minHeight: multiline ? 84 : 44,
          paddingHorizontal: 10,
          paddingVertical: multiline ? 8 : 0,
          borderWidth: 1,
          borderTopWidth: 2,
          borderColor: error ? colors.fail : colors.rule2,
          borderTopColor: error ? colors.fail : colors.ink,
          borderBottomWidth: error ? 2 : 1,
          borderRadius: RADIUS.window,
          backgroundColor: colors.panel,
          color: colors.ink,
          fontFamily: FAMILY.text,
          fontSize: 16,
          lineHeight: TYPE.body.lineHeight,
        }}
      />
      {said ? <Text variant="secondary" tone={error ? 'fail' : 'quiet'} nativeID={id} role={error ? 'alert' : undefined}>{said}</Text> : null}
    </View>
  );
};
