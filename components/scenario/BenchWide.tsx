import { ScrollView, useWindowDimensions, View } from 'react-native';

import { useTheme } from '@/components/ui/theme';

import { BenchChecks, BenchEditor, BenchPlot, BenchStrip, BenchVerdict } from './BenchParts';
import type { Bench } from './useBench';

/** From this width on, checks, plot and fields stand in three columns; below it the plot stands above the checks. */
const THREE_COLUMNS = 1240;
/** Header, strip, bracket and foot around the plot. */
const AROUND_PLOT = 320;
const LEAST_PLOT = 400;

/** Wide: everything in sight at once, each column scrolling for itself. */
export const BenchWide = ({ bench }: { bench: Bench }) => {
  const { colors } = useTheme();
  const { width, height } = useWindowDimensions();
  const plotHeight = Math.max(LEAST_PLOT, height - AROUND_PLOT);
  const rule = { borderRightWidth: 1, borderRightColor: colors.rule2 } as const;
  const columns = { flex: 1, flexDirection: 'row', minHeight: 0 } as const;
  const editor = <ScrollView style={{ width: 304, flexGrow: 0, flexShrink: 0 }} contentContainerStyle={{ padding: 16, paddingBottom: 40 }}><BenchEditor bench={bench} /></ScrollView>;
  const checks = <View style={{ paddingHorizontal: 18, paddingTop: 12, paddingBottom: 24 }}><BenchChecks bench={bench} tight /></View>;
  const plot = <View style={{ padding: 16 }}><BenchPlot bench={bench} height={plotHeight} /></View>;
  return (
    <View style={{ flex: 1, minHeight: 0 }}>
      <BenchStrip bench={bench} />
      {width >= THREE_COLUMNS ? (
        <View style={columns}>
          <ScrollView style={{ width: 400, flexGrow: 0, flexShrink: 0, ...rule }}><BenchVerdict bench={bench} />{checks}</ScrollView>
          <ScrollView style={{ flex: 1, ...rule }}>{plot}</ScrollView>
          {editor}
        </View>
      ) : (
        <View style={columns}>
          <ScrollView style={{ flex: 1, ...rule }}><BenchVerdict bench={bench} />{plot}{checks}</ScrollView>
          {editor}
        </View>
      )}
    </View>
  );
};
