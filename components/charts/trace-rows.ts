import type { RunEvent, Traces } from '@/shared/model/result';

import { EVENT_WORD } from './place-events';
import { indexNearest } from './thin-out';

/** One line of the table behind the plot: SI, at a point that was computed, never between two. */
export interface TraceRow {
  key: string;
  time: number;
  /** Instantaneous before the fold, the highest of the half period after it. */
  current: number;
  /** Null before the fold. */
  rms: number | null;
  bus: number;
  temperature: number | null;
  resistance: number | null;
  energy: number | null;
  /** What happens here, or why the row is here. */
  remark: string;
}

const WAVEFORM_ROWS = 20;
const PER_DECADE = [1, 2, 5] as const;

const spread = (from: number, to: number): number[] => Array.from({ length: WAVEFORM_ROWS + 1 }, (_, index) => from + ((to - from) * index) / WAVEFORM_ROWS);
const decades = (from: number, to: number): number[] => {
  const times: number[] = [];
  for (let exponent = Math.floor(Math.log10(from)); 10 ** exponent <= to; exponent += 1) times.push(...PER_DECADE.map((digit) => digit * 10 ** exponent));
  return [from, ...times.filter((time) => time > from && time < to), to];
};
const peakIndex = (values: readonly number[]): number => values.reduce((best, value, index) => (Math.abs(value) > Math.abs(values[best] ?? 0) ? index : best), 0);

interface Picked {
  indexes: number[];
  remarks: Map<number, string>;
}
/** The rows of one half: evenly spread, and besides them the peak and every event. */
const pick = (time: readonly number[], current: readonly number[], wanted: readonly number[], events: readonly RunEvent[], peakWord: string): Picked => {
  const [first, last] = [time[0], time[time.length - 1]];
  if (first === undefined || last === undefined) return { indexes: [], remarks: new Map() };
  const remarks = new Map<number, string>();
  const say = (index: number, word: string) => remarks.set(index, [remarks.get(index), word].filter(Boolean).join(', '));
  events.filter(({ at }) => at >= first && at <= last).forEach(({ at, kind }) => say(indexNearest(time, at), EVENT_WORD[kind]));
  say(peakIndex(current), peakWord);
  const indexes = [...new Set([...wanted.map((at) => indexNearest(time, at)), ...remarks.keys()])].sort((a, b) => a - b);
  return { indexes, remarks };
};

/** A few dozen rows out of thousands of points, with every peak and event among them. */
export const traceRows = ({ waveform, soak }: Traces, events: readonly RunEvent[], element: number): TraceRow[] => {
  const lastOf = (list: readonly number[]) => list[list.length - 1] ?? 0;
  const early = pick(waveform.time, waveform.current, spread(waveform.time[0] ?? 0, lastOf(waveform.time)), events, 'highest current');
  const late = pick(soak.time, soak.peakCurrent, soak.time.length > 1 ? decades(soak.time[0]!, lastOf(soak.time)) : soak.time, events.filter(({ at }) => at > lastOf(waveform.time)), 'highest current of the soak');
  const at = (lists: readonly number[][], index: number) => lists[element]?.[index] ?? null;
  const ofWaveform = early.indexes.map((index): TraceRow => ({
    key: `w${index}`, time: waveform.time[index]!, current: waveform.current[index]!, rms: null, bus: waveform.bus[index]!,
    temperature: at(waveform.temperature, index), resistance: at(waveform.resistance, index), energy: at(waveform.energy, index), remark: early.remarks.get(index) ?? '',
  }));
  const ofSoak = late.indexes.map((index): TraceRow => ({
    key: `s${index}`, time: soak.time[index]!, current: soak.peakCurrent[index]!, rms: soak.rmsCurrent[index]!, bus: soak.bus[index]!,
    temperature: at(soak.temperature, index), resistance: at(soak.resistance, index), energy: at(soak.energy, index), remark: late.remarks.get(index) ?? '',
  }));
  return [...ofWaveform, ...ofSoak];
};
