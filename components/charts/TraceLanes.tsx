import { memo } from 'react';
import { G } from 'react-native-svg';
import { VictoryArea, VictoryAxis, VictoryChart, VictoryLine } from 'victory-native';

import { FAMILY } from '@/components/ui/Text';
import type { Palette } from '@/components/ui/tokens';

import type { Lane, Series } from './lanes';
import type { LaneRoom, PlotRoom } from './plot-room';
import { thinBand, thinOut } from './thin-out';
import type { TimeScale } from './time-scale';

export interface TraceLanesProps {
  lanes: readonly Lane[];
  room: PlotRoom;
  scale: TimeScale;
  colors: Palette;
  /** Light 15 %, dark 22 %. */
  bandOpacity: number;
  stale: boolean;
}

interface LaneProps extends Omit<TraceLanesProps, 'lanes'> {
  lane: Lane;
  own: LaneRoom;
}

const lineData = ({ time, value }: Series, scale: TimeScale) => {
  const { x, y } = thinOut(time.map(scale.toX), value);
  return x.map((at, index) => ({ x: at, y: y[index]! }));
};

/**
 * The axis, bands and lines of one lane. x is already in px (the fold makes the time axis no function that a chart
 * library knows), y in the lane's unit.
 */
const TraceLane = ({ lane, own, room, scale, colors, bandOpacity, stale }: LaneProps) => {
  const tone = stale ? colors.quiet : colors[lane.tone];
  const line = (width: number, dash?: string) => ({ data: { stroke: tone, strokeWidth: width, strokeDasharray: dash, strokeLinejoin: 'round' as const } });
  const edge = { data: { stroke: tone, strokeWidth: 0.9, strokeOpacity: 0.65 } };
  const bands = stale ? [] : lane.bands.map(({ half, band }) => ({ half, points: thinBand(band.time.map(scale.toX), band.low, band.high) }));
  const axis = {
    axis: { stroke: colors.rule2, strokeWidth: 1 },
    grid: { stroke: colors.rule, strokeWidth: ({ tick }: { tick?: number }) => (tick === 0 ? 1.2 : 0.75) },
    ticks: { stroke: colors.rule2, size: 5 },
    tickLabels: { fill: colors.quiet, fontFamily: FAMILY.mono, fontSize: room.fontSize * 0.96, padding: 3 },
  };
  return (
    <VictoryChart standalone={false} width={room.width} height={room.height} domain={{ x: [room.left, room.right], y: [lane.domain[0], lane.domain[1]] }}
      padding={{ left: room.left, right: room.width - room.right, top: own.top, bottom: room.height - own.bottom }}>
      <VictoryAxis dependentAxis tickValues={[...lane.ticks]} tickFormat={(value: number) => `${value}`.replace('-', '\u2212')} style={axis} />
      {bands.map(({ half, points }) => <VictoryArea key={half} groupComponent={<G />} data={points} x="x" y="high" y0="low" style={{ data: { fill: tone, fillOpacity: bandOpacity, stroke: 'none' } }} />)}
      {bands.map(({ half, points }) => <VictoryLine key={`high-${half}`} groupComponent={<G />} data={points} x="x" y="high" style={edge} />)}
      {bands.map(({ half, points }) => <VictoryLine key={`low-${half}`} groupComponent={<G />} data={points} x="x" y="low" style={edge} />)}
      {[lane.waveform, lane.soak].map((series, half) => series.time.length > 1 ? <VictoryLine key={half} groupComponent={<G />} data={lineData(series, scale)} style={line(1.7)} /> : null)}
      {lane.soakRms && lane.soakRms.time.length > 1 ? <VictoryLine groupComponent={<G />} data={lineData(lane.soakRms, scale)} style={line(1.2, '4 3')} /> : null}
    </VictoryChart>
  );
};

/** All that the chart library draws of the split-time plot; redrawn for a new result only, not for the cursor. */
export const TraceLanes = memo(function TraceLanes({ lanes, ...rest }: TraceLanesProps) {
  return (
    <G>
      {lanes.map((lane, index) => <TraceLane key={lane.key} lane={lane} own={rest.room.lanes[index]!} {...rest} />)}
    </G>
  );
});
