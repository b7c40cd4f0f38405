import { Link, type Href } from 'expo-router';
import type { ReactNode } from 'react';
import { Pressable, View, type ViewStyle } from 'react-native';

import { Text } from './Text';
import { useLayout, useTheme } from './theme';
import { RADIUS, TARGET, type ColorName, type Palette } from './tokens';

export type ButtonKind = 'primary' | 'plain' | 'quiet';

interface Look {
  label: string;
  /** At most one primary button stands in sight. */
  kind?: ButtonKind;
  icon?: ReactNode;
  /** Spoken instead of the label where the label alone would be unclear. */
  spoken?: string;
}
export interface ButtonProps extends Look {
  onPress: () => void;
  disabled?: boolean;
  /** Work is under way: the button says so and takes no second press. */
  busy?: boolean;
  expanded?: boolean;
}
export interface ButtonLinkProps extends Look {
  href: Href;
}

const shape = (kind: ButtonKind, colors: Palette, height: number): ViewStyle => ({
  minHeight: height,
  minWidth: height,
  paddingHorizontal: kind === 'quiet' ? 4 : 14,
  flexDirection: 'row',
  alignItems: 'center',
  justifyContent: 'center',
  gap: 7,
  borderRadius: RADIUS.button,
  borderWidth: kind === 'quiet' ? 0 : 1,
  borderColor: kind === 'primary' ? colors.ink : colors.rule2,
  backgroundColor: kind === 'primary' ? colors.ink : kind === 'plain' ? colors.panel : 'transparent',
});

const Face = ({ label, kind, icon, tone }: { label: string; kind: ButtonKind; icon?: ReactNode; tone: ColorName }) => {
  const { colors } = useTheme();
  const underline = kind === 'quiet' ? { borderBottomWidth: 1, borderBottomColor: colors[tone] } : {};
  return (
    <>
      {icon}
      <View style={underline}>
        <Text strong={kind !== 'quiet'} tone={tone} numberOfLines={1}>{label}</Text>
      </View>
    </>
  );
};

export const Button = ({ label, onPress, kind = 'plain', icon, spoken, disabled = false, busy = false, expanded }: ButtonProps) => {
  const { colors } = useTheme();
  const { finePointer } = useLayout();
  const off = disabled || busy;
  const ground = off ? { backgroundColor: 'transparent', borderColor: colors.rule2, borderStyle: 'dashed' as const } : {};
  return (
    <Pressable
      role="button"
      aria-label={spoken ?? label}
      aria-disabled={off}
      aria-busy={busy}
      aria-expanded={expanded}
      disabled={off}
      onPress={onPress}
      style={[shape(kind, colors, finePointer ? TARGET.pointer : TARGET.finger), ground]}
    >
      <Face label={label} kind={kind} icon={icon} tone={off ? 'quiet' : kind === 'primary' ? 'onFilled' : 'ink'} />
    </Pressable>
  );
};

/** Looks like a button, is a link: what has an address can be opened in another tab. */
export const ButtonLink = ({ label, href, kind = 'plain', icon, spoken }: ButtonLinkProps) => {
  const { colors } = useTheme();
  const { finePointer } = useLayout();
  return (
    <Link href={href} asChild>
      <Pressable role="link" aria-label={spoken ?? label} style={shape(kind, colors, finePointer ? TARGET.pointer : TARGET.finger)}>
        <Face label={label} kind={kind} icon={icon} tone={kind === 'primary' ? 'onFilled' : 'ink'} />
      </Pressable>
    </Link>
  );
};
