import { View } from 'react-native';
import Svg, { Line } from 'react-native-svg';

import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';

const LINES = [0.125, 0.25, 0.375, 0.5, 0.625, 0.75, 0.875] as const;

/** The ground of a plot whose traces are still being computed: it stands at once, and only the traces are waited for. */
export const EmptyPlot = ({ text, height }: { text: string; height: number }) => {
  const { colors } = useTheme();
  return (
    <View style={{ height, backgroundColor: colors.panel, borderTopWidth: 1, borderBottomWidth: 1, borderColor: colors.ink, justifyContent: 'center', padding: 16 }}>
      <Svg width="100%" height={height} style={{ position: 'absolute', left: 0, top: 0 }} aria-hidden>
        {LINES.map((share) => <Line key={share} x1={`${share * 100}%`} x2={`${share * 100}%`} y1={0} y2={height} stroke={colors.rule} />)}
      </Svg>
      <Text strong role="status" style={{ backgroundColor: colors.panel, alignSelf: 'flex-start', paddingHorizontal: 4 }}>{text}</Text>
    </View>
  );
};
