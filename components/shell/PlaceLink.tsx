import { Link, usePathname } from 'expo-router';
import { Pressable, View } from 'react-native';

import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';

import type { Place } from './places';

/** One place of the navigation: a bar of ink marks where one is, above on a phone, at the side on a wide screen. */
export const PlaceLink = ({ place, upright }: { place: Place; upright: boolean }) => {
  const { colors } = useTheme();
  const here = usePathname().startsWith(String(place.href));
  const tone = here ? 'ink' : 'quiet';
  const bar = upright ? { left: 0, top: 6, bottom: 6, width: 4 } : { top: 0, left: '25%' as const, right: '25%' as const, height: 4 };
  return (
    <Link href={place.href} asChild>
      <Pressable role="link" aria-label={place.label} aria-current={here ? 'page' : undefined} style={{ flex: upright ? undefined : 1, height: upright ? 62 : 60, alignItems: 'center', justifyContent: 'center', gap: 4 }}>
        {here ? <View style={{ position: 'absolute', backgroundColor: colors.ink, ...bar }} /> : null}
        <place.Icon tone={tone} />
        <Text variant="secondary" tone={tone} strong={here}>{place.label}</Text>
      </Pressable>
    </Link>
  );
};
