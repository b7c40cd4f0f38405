import type { ReactNode } from 'react';
import { View } from 'react-native';

import { BrandMark } from '@/components/ui/NavIcons';
import { useLayout, useTheme } from '@/components/ui/theme';
import { useReconnect } from '@/hooks/api/useReconnect';

import { ConnectionNotice } from './ConnectionNotice';
import { PlaceLink } from './PlaceLink';
import { PLACES } from './places';

const Rail = () => {
  const { colors } = useTheme();
  return (
    <View role="navigation" aria-label="Places" style={{ width: 76, borderRightWidth: 1, borderRightColor: colors.rule2 }}>
      <View style={{ height: 56, alignItems: 'center', justifyContent: 'center', borderBottomWidth: 1, borderBottomColor: colors.rule2 }}>
        <BrandMark />
      </View>
      <View style={{ paddingTop: 8 }}>
        {PLACES.map((place) => <PlaceLink key={place.label} place={place} upright />)}
      </View>
    </View>
  );
};

const BottomBar = () => {
  const { colors } = useTheme();
  return (
    <View role="navigation" aria-label="Places" style={{ flexDirection: 'row', borderTopWidth: 1, borderTopColor: colors.rule2, backgroundColor: colors.paper }}>
      {PLACES.map((place) => <PlaceLink key={place.label} place={place} upright={false} />)}
    </View>
  );
};

/** Around every page of the team: a rail beside it on a wide screen, a bar below it on a phone. */
export const TeamFrame = ({ children }: { children: ReactNode }) => {
  const { wide } = useLayout();
  const { colors } = useTheme();
  useReconnect();
  return (
    <View style={{ flex: 1, flexDirection: wide ? 'row' : 'column', backgroundColor: colors.paper }}>
      {wide ? <Rail /> : null}
      <View role="main" style={{ flex: 1, minWidth: 0, minHeight: 0 }}>
        <ConnectionNotice />
        {children}
      </View>
      {wide ? null : <BottomBar />}
    </View>
  );
};
