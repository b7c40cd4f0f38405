import type { Lane } from './lanes';
import type { LaneRoom, PlotRoom } from './plot-room';
import { textWidth } from './PlotText';
import { valueAt } from './thin-out';
import { timeText, type TimeScale } from './time-scale';

/** A word on the plot, with the point that it speaks of where a line leads there. */
export interface Callout {
  text: string;
  tip: { x: number; y: number } | null;
  x: number;
  y: number;
  anchor: 'start' | 'end';
}

/** Shares by which a peak must stand out to be worth a word. */
const OVER_NOMINAL = 1.05;
const OVER_REST = 1.5;
const LEAD = 15;
/** px over the nominal line, below which a word would stand on that line's own name. */
const CLEARANCE = 22;

const highest = (values: readonly number[]): number => values.reduce((best, value, index) => (value > (values[best] ?? -Infinity) ? index : best), 0);
const median = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;

/** The highest current of any corner, in each half where it stands out: a peak too narrow to be read off the band. */
const peakCallouts = (lane: Lane, own: LaneRoom, room: PlotRoom, scale: TimeScale): Callout[] => {
  return lane.bands.flatMap(({ half, band }): Callout[] => {
    const at = highest(band.high);
    const value = band.high[at];
    const time = band.time[at];
    const nominal = Math.max(0, ...lane[half].value);
    if (value === undefined || time === undefined || value < nominal * OVER_NOMINAL) return [];
    if (half === 'soak' && value < OVER_REST * median(band.high)) return [];
    if (half === 'soak' && own.toY(nominal) - own.toY(value) < CLEARANCE) return [];
    const short = `worst ${Number(value.toPrecision(3))} ${lane.unit}`;
    const text = room.narrow ? short : `worst corner ${Number(value.toPrecision(3))} ${lane.unit} at ${timeText(time)}`;
    const tip = { x: scale.toX(time), y: own.toY(value) };
    const limit = half === 'waveform' && scale.fold ? scale.fold.left : room.right;
    const fitting = [text, short].find((one) => tip.x + LEAD + textWidth(one, room.fontSize) < limit);
    const y = Math.min(Math.max(tip.y + 4, own.top + 12), own.bottom - 4);
    return [fitting ? { text: fitting, tip, x: tip.x + LEAD, y, anchor: 'start' } : { text: short, tip, x: tip.x - LEAD, y, anchor: 'end' }];
  });
};

/** What the two lines of the soak are; on a phone only the dashed one is named. */
const soakNames = (lane: Lane, own: LaneRoom, room: PlotRoom, scale: TimeScale): Callout[] => {
  if (!lane.soakRms || !scale.fold) return [];
  const x = room.right - 5;
  const at = scale.toTime(x);
  const rms = valueAt(lane.soakRms.time, lane.soakRms.value, at);
  const peak = valueAt(lane.soak.time, lane.soak.value, at);
  if (rms === null || peak === null) return [];
  const name = (text: string, y: number): Callout => ({ text, tip: null, x, y, anchor: 'end' });
  const below = name('RMS', Math.min(own.toY(rms) + 14, own.bottom - 3));
  return room.narrow ? [below] : [below, name('half-period peak', own.toY(peak) - 6)];
};

/** The words on the current's lane. */
export const findCallouts = (lane: Lane, own: LaneRoom, room: PlotRoom, scale: TimeScale): Callout[] =>
  lane.key === 'current' ? [...peakCallouts(lane, own, room, scale), ...soakNames(lane, own, room, scale)] : [];
