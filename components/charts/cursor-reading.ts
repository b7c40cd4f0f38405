import type { Lane } from './lanes';
import type { Obstacle } from './place-tag';
import { obstaclesOf } from './place-tag';
import type { LaneRoom, PlotRoom } from './plot-room';
import { textWidth } from './PlotText';
import { thinOut, valueAt } from './thin-out';
import { timeText, type TimeScale } from './time-scale';
import type { Callout } from './callouts';

export interface Reading {
  key: Lane['key'];
  title: string;
  value: number | null;
  text: string;
}

const valueText = (value: number, unit: string): string => {
  const digits = Math.abs(value) >= 99.95 ? 0 : Math.abs(value) >= 9.995 ? 1 : 2;
  return `${value.toFixed(digits)} ${unit}`.replace('-', '\u2212');
};

/** What the cursor reads in each lane; past the fold the current is the half-period peak. */
export const readLanes = (lanes: readonly Lane[], scale: TimeScale, at: number): Reading[] =>
  lanes.map((lane) => {
    const inSoak = scale.fold !== null && at > scale.foldAt;
    const series = inSoak ? lane.soak : lane.waveform;
    const last = series.time[series.time.length - 1];
    const value = last === undefined || at > last * 1.0001 ? null : valueAt(series.time, series.value, at);
    const title = lane.key === 'current' && inSoak ? 'Half-period peak current' : lane.title;
    return { key: lane.key, title, value, text: value === null ? 'no value' : valueText(value, lane.unit) };
  });

/** One sentence for a screen reader. */
export const sayReadings = (at: number, readings: readonly Reading[]): string =>
  `${timeText(at)}: ${readings.map(({ title, text }) => `${title} ${text}`).join(', ')}`;

const WEIGHT = { line: 1, edge: 0.35, word: 1.2 } as const;

/** What a tag in this lane had better not cover: the traces, the rating with its name, the callouts. */
export const laneObstacles = (lane: Lane, own: LaneRoom, room: PlotRoom, scale: TimeScale, callouts: readonly Callout[]): Obstacle[] => {
  const curve = (time: readonly number[], value: readonly number[], weight: number) => {
    const { x, y } = thinOut(time.map(scale.toX), value, 3);
    return obstaclesOf(x, y.map(own.toY), weight);
  };
  const lines = [lane.waveform, lane.soak, ...(lane.soakRms ? [lane.soakRms] : [])].flatMap(({ time, value }) => curve(time, value, WEIGHT.line));
  const edges = lane.bands.flatMap(({ band }) => [...curve(band.time, band.high, WEIGHT.edge), ...curve(band.time, band.low, WEIGHT.edge)]);
  const words = callouts.map(({ text, x, y, anchor }): Obstacle => {
    const width = textWidth(text, room.fontSize);
    const x0 = anchor === 'start' ? x : x - width;
    return { x0, x1: x0 + width, y0: y - 11, y1: y + 3, weight: WEIGHT.word };
  });
  const rating: Obstacle[] = [];
  if (lane.rating) {
    const y = lane.rating.above ? own.top + 18 : own.toY(lane.rating.value);
    rating.push({ x0: room.right - 4 - textWidth(lane.rating.label, room.fontSize), x1: room.right, y0: y - 17, y1: y + 1, weight: WEIGHT.word });
    rating.push({ x0: room.left, x1: room.right, y0: y - 1, y1: y + 1, weight: WEIGHT.line });
  }
  return [...lines, ...edges, ...words, ...rating];
};
