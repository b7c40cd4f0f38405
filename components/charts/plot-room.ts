import type { Lane } from './lanes';
import type { TimeScale } from './time-scale';

/** What follows from the width alone. */
export interface PlotWidth {
  width: number;
  left: number;
  right: number;
  narrow: boolean;
  foldWidth: number;
  waveformShare: number;
  fontSize: number;
}
/** Where one lane lies, px from the top of the plot. */
export interface LaneRoom {
  top: number;
  bottom: number;
  /** y of a value in the lane's unit. */
  toY: (value: number) => number;
}
export interface PlotRoom extends PlotWidth {
  height: number;
  /** The rules above and below the lanes, in which the fold shows. */
  top: number;
  bottom: number;
  lanes: readonly LaneRoom[];
}

/** Below this the plot takes the measures of a phone. */
const NARROW = 480;
const HEAD = 22;
const RULE_OFF = 4;
const FOOT = 36;
/** Height of one row of event words. */
export const EVENT_ROW = 14;
const SHARES = [44, 28, 28] as const;

export const measureWidth = (width: number): PlotWidth =>
  width < NARROW
    ? { width, narrow: true, left: 36, right: width - 6, foldWidth: 12, waveformShare: 0.54, fontSize: 12 }
    : { width, narrow: false, left: 46, right: width - 12, foldWidth: 18, waveformShare: 0.56, fontSize: 12.5 };

/** Divides the height: lanes one over another with a title in each gap, the axis and the events at the foot. */
export const divideHeight = (across: PlotWidth, lanes: readonly Lane[], height: number, eventRows: number): PlotRoom => {
  const gap = across.narrow ? 19 : 22;
  const bottom = height - FOOT - RULE_OFF - Math.max(0, eventRows - 1) * EVENT_ROW;
  const shares = SHARES.slice(0, lanes.length);
  const whole = shares.reduce((sum, share) => sum + share, 0);
  const free = bottom - HEAD - gap * (lanes.length - 1);
  let top = HEAD;
  const rooms = lanes.map((lane, index): LaneRoom => {
    const own = { top, bottom: top + (free * shares[index]!) / whole };
    top = own.bottom + gap;
    const [low, high] = lane.domain;
    return { ...own, toY: (value) => own.bottom - ((value - low) / (high - low)) * (own.bottom - own.top) };
  });
  return { ...across, height, lanes: rooms, top: HEAD - RULE_OFF, bottom: bottom + RULE_OFF };
};

/** What the two halves of the time axis are, over their inner edges. */
export const headWords = ({ narrow }: PlotWidth, { fold }: TimeScale): { text: string; x: number; anchor: 'start' | 'end' }[] =>
  fold
    ? [
        { text: 'waveform, linear', x: fold.left - 4, anchor: 'end' },
        { text: narrow ? 'soak, log' : 'soak, logarithmic', x: fold.right + 4, anchor: 'start' },
      ]
    : [];
