import type { RunEvent } from '@/shared/model/result';

import type { TimeScale } from './time-scale';
import { textWidth } from './PlotText';
import type { PlotWidth } from './plot-room';

export const EVENT_WORD: Record<RunEvent['kind'], string> = {
  'switch-on': 'on', 'switch-off': 'off', charged: 'charged', 'load-starts': 'load starts', 'load-stops': 'load stops',
  'contact-closes': 'contact closes', 'contact-opens': 'contact opens', 'fault-begins': 'fault', trips: 'trips', resets: 'resets',
};
const NARROW_WORD: Partial<Record<RunEvent['kind'], string>> = { 'contact-closes': 'contact', 'contact-opens': 'opens', 'load-starts': 'load', 'load-stops': 'load off' };

export interface PlacedEvent {
  x: number;
  /** Null where there was no room for the word; the table has it. */
  word: { text: string; x: number; row: number } | null;
}

const ROWS = 2;
const BESIDE = 7;
type Span = readonly [number, number];

/** Sets each event's word right or left of its triangle, in the first of two rows where it meets no other. */
export const placeEvents = (events: readonly RunEvent[], scale: TimeScale, { left, right, narrow, fontSize }: PlotWidth): { placed: PlacedEvent[]; rows: number } => {
  const shown = events.filter((event) => event.at <= scale.end);
  const triangles = shown.map((event): Span => [scale.toX(event.at) - 5, scale.toX(event.at) + 5]);
  const taken: Span[][] = Array.from({ length: ROWS }, (_, row) => (row === 0 ? [[right - 10, right]] : []));
  const isFree = ([from, to]: Span, row: number, own: number) =>
    from >= left - 8 && to <= right && !taken[row]!.some((other) => from < other[1] + 4 && other[0] - 4 < to) && (row > 0 || !triangles.some((other, index) => index !== own && from < other[1] && other[0] < to));
  let rows = 1;
  const placed = shown.map((event, own): PlacedEvent => {
    const x = scale.toX(event.at);
    const text = (narrow && NARROW_WORD[event.kind]) || EVENT_WORD[event.kind];
    const width = textWidth(text, fontSize);
    for (let row = 0; row < ROWS; row += 1) {
      for (const start of [x + BESIDE, x - BESIDE - width]) {
        const span: Span = [start, start + width];
        if (!isFree(span, row, own)) continue;
        taken[row]!.push(span);
        rows = Math.max(rows, row + 1);
        return { x, word: { text, x: start, row } };
      }
    }
    return { x, word: null };
  });
  return { placed, rows };
};
