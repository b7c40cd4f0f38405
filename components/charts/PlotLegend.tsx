import { View } from 'react-native';
import Svg, { Path, Rect } from 'react-native-svg';

import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';

/** What line and band mean; set as the remark of the bracket above the plot. */
export const PlotLegend = ({ band }: { band: boolean }) => {
  const { colors } = useTheme();
  return (
    <View style={{ flexDirection: 'row', gap: 12 }}>
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: 5 }}>
        <Svg width={20} height={8} aria-hidden><Path d="M0 4h20" stroke={colors.ink} strokeWidth={1.7} /></Svg>
        <Text variant="secondary" tone="quiet" style={{ lineHeight: 15 }}>nominal</Text>
      </View>
      {band ? (
        <View style={{ flexDirection: 'row', alignItems: 'center', gap: 5 }}>
          <Svg width={20} height={10} aria-hidden>
            <Rect width={20} height={10} fill={colors.ink} fillOpacity={0.18} />
            <Path d="M0 .5h20M0 9.5h20" stroke={colors.ink} strokeWidth={0.9} />
          </Svg>
          <Text variant="secondary" tone="quiet" style={{ lineHeight: 15 }}>all corners</Text>
        </View>
      ) : null}
    </View>
  );
};
