import { Link, type Href } from 'expo-router';
import { useEffect, type ReactNode } from 'react';
import { Pressable, View } from 'react-native';

import { BackIcon } from './NavIcons';
import { Text } from './Text';
import { useLayout, useTheme } from './theme';
import { GUTTER, TARGET } from './tokens';

export interface PageHeaderProps {
  title: string;
  subtitle?: ReactNode;
  /** Where the arrow of a phone leads. */
  back?: { href: Href; label: string };
  actions?: ReactNode;
}

/** The name of the place at the top of a page; also the title of the browser's tab. */
export const PageHeader = ({ title, subtitle, back, actions }: PageHeaderProps) => {
  const { colors } = useTheme();
  const { wide } = useLayout();
  useEffect(() => {
    if (typeof document !== 'undefined') document.title = `${title} · Tidegate`;
  }, [title]);
  return (
    <View style={{ minHeight: wide ? 56 : 61, flexDirection: 'row', alignItems: 'center', gap: 8, paddingHorizontal: wide ? GUTTER.wide : GUTTER.phone, borderBottomWidth: 1, borderBottomColor: colors.rule2, backgroundColor: colors.paper }}>
      {back && !wide ? (
        <Link href={back.href} asChild>
          <Pressable role="link" aria-label={back.label} style={{ width: TARGET.finger, height: TARGET.finger, marginLeft: -14, alignItems: 'center', justifyContent: 'center' }}>
            <BackIcon />
          </Pressable>
        </Link>
      ) : null}
      <View style={{ flex: 1, minWidth: 0 }}>
        <Text variant="title" strong heading={1} numberOfLines={1}>{title}</Text>
        {typeof subtitle === 'string' ? <Text variant="secondary" tone="quiet" numberOfLines={1}>{subtitle}</Text> : subtitle}
      </View>
      {actions ? <View style={{ flexDirection: 'row', alignItems: 'center', gap: 8 }}>{actions}</View> : null}
    </View>
  );
};
