import type { ReactNode } from 'react';
import { Platform, Text as NativeText, type TextProps as NativeTextProps, type TextStyle } from 'react-native';

import { useTheme } from './theme';
import { FACES, TYPE, type ColorName, type TextVariant } from './tokens';

const stack = (face: string, rest: string) => (Platform.OS === 'web' ? `${face}, ${rest}` : face);

/** Families with what stands in until the face has come. */
export const FAMILY = {
  text: stack(FACES.text, '"Arial Narrow", Arial, sans-serif'),
  textStrong: stack(FACES.textStrong, '"Arial Narrow", Arial, sans-serif'),
  mono: stack(FACES.mono, 'ui-monospace, Menlo, monospace'),
  monoStrong: stack(FACES.monoStrong, 'ui-monospace, Menlo, monospace'),
} as const;

export interface TextProps extends Omit<NativeTextProps, 'style' | 'role'> {
  children?: ReactNode;
  variant?: TextVariant;
  tone?: ColorName;
  strong?: boolean;
  mono?: boolean;
  /** Heading level for a screen reader; leaves the look alone. */
  heading?: 1 | 2 | 3;
  role?: NativeTextProps['role'];
  style?: TextStyle | TextStyle[];
}

/** All text of the client. Numbers inside sentences stay in the text face; only fields and values are `mono`. */
export const Text = ({ variant = 'body', tone = 'ink', strong = false, mono = false, heading, style, ...rest }: TextProps) => {
  const { colors } = useTheme();
  const family = mono ? (strong ? FAMILY.monoStrong : FAMILY.mono) : strong ? FAMILY.textStrong : FAMILY.text;
  const face: TextStyle = { fontFamily: family, color: colors[tone], fontVariant: ['tabular-nums'], ...TYPE[variant] };
  const asHeading = heading ? ({ role: 'heading', 'aria-level': heading } as const) : {};
  return <NativeText {...asHeading} {...rest} style={[face, ...(Array.isArray(style) ? style : [style])]} />;
};
