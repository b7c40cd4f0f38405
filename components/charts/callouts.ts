import type { Lane } from './lanes';
import type { LaneRoom, PlotRoom } from './plot-room';
import { textWidth } from './PlotText';
import { timeText, type TimeScale } from './time-scale';

export interface Callout {
  text: string;
  /** Where the peak is. */
  tip: { x: number; y: number };
  x: number;
  y: number;
  anchor: 'start' | 'end';
}

/** Shares by which a peak must stand out to be worth a word. */
const OVER_NOMINAL = 1.05;
const OVER_REST = 1.5;
const LEAD = 15;

const highest = (values: readonly number[]): number => values.reduce((best, value, index) => (value > (values[best] ?? -Infinity) ? index : best), 0);
const median = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;

/** The highest current of any corner, in each half where it stands out: a peak too narrow to be read off the band. */
export const findCallouts = (lane: Lane, own: LaneRoom, room: PlotRoom, scale: TimeScale): Callout[] => {
  if (lane.key !== 'current') return [];
  return lane.bands.flatMap(({ half, band }): Callout[] => {
    const at = highest(band.high);
    const value = band.high[at];
    const time = band.time[at];
    const nominal = Math.max(0, ...lane[half].value);
    if (value === undefined || time === undefined || value < nominal * OVER_NOMINAL) return [];
    if (half === 'soak' && value < OVER_REST * median(band.high)) return [];
    const short = `worst ${Number(value.toPrecision(3))} ${lane.unit}`;
    const text = room.narrow ? short : `worst corner ${Number(value.toPrecision(3))} ${lane.unit} at ${timeText(time)}`;
    const tip = { x: scale.toX(time), y: own.toY(value) };
    const limit = half === 'waveform' && scale.fold ? scale.fold.left : room.right;
    const fitting = [text, short].find((one) => tip.x + LEAD + textWidth(one, room.fontSize) < limit);
    const y = Math.min(Math.max(tip.y + 4, own.top + 12), own.bottom - 4);
    return [fitting ? { text: fitting, tip, x: tip.x + LEAD, y, anchor: 'start' } : { text: short, tip, x: tip.x - LEAD, y, anchor: 'end' }];
  });
};
