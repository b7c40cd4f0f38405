import type { ColorName } from '@/components/ui/tokens';
import type { Envelope, Traces } from '@/shared/model/result';
import type { Dimension } from '@/shared/quantity/dimension';
import { DIMENSIONS } from '@/shared/quantity/dimension';
import { DISPLAY_PREFIXES } from '@/shared/quantity/prefix';

import { multiples, niceStep } from './time-scale';

export interface RatingLine {
  /** SI */
  value: number;
  label: string;
}
export interface Series {
  /** s */
  time: readonly number[];
  /** In the unit of the lane. */
  value: readonly number[];
}
export interface Band {
  time: readonly number[];
  low: readonly number[];
  high: readonly number[];
}
export type LaneKey = 'current' | 'temperature' | 'energy';
export interface Lane {
  key: LaneKey;
  title: string;
  unit: string;
  tone: ColorName;
  waveform: Series;
  soak: Series;
  /** Current only: rms over the half period. */
  soakRms: Series | null;
  bands: readonly { half: 'waveform' | 'soak'; band: Band }[];
  /** In the unit of the lane; `above` where it lies so far up that the traces would be flattened. */
  rating: { value: number; label: string; above: boolean } | null;
  domain: readonly [number, number];
  ticks: readonly number[];
}

export interface PlotData {
  traces: Traces;
  envelope: Envelope | null;
  ratings: { current?: RatingLine; temperature?: RatingLine; energy?: RatingLine };
  elementNames: readonly string[];
  element: number;
}

/** A rating beyond this many times the highest value is told, not drawn to scale. */
const FLATTENS = 4;
const LANE_TICKS = { current: 4, temperature: 3, energy: 3 } as const;
const ZERO_CELSIUS = 273.15;

interface Display {
  unit: string;
  show: (si: number) => number;
}
/** The prefix that leaves the largest value between 1 and 1000. */
const displayOf = (dimension: Dimension, largest: number): Display => {
  if (dimension === 'temperature') return { unit: '°C', show: (si) => si - ZERO_CELSIUS };
  const exponent = largest > 0 ? Math.floor(Math.log10(largest) / 3 + 1e-12) * 3 : 0;
  const prefix = DISPLAY_PREFIXES.find((one) => one.exponent === Math.min(Math.max(exponent, -15), 12));
  const factor = 10 ** (prefix?.exponent ?? 0);
  return { unit: `${prefix?.symbol ?? ''}${DIMENSIONS[dimension].unit}`, show: (si) => si / factor };
};

const extremes = (lists: readonly (readonly number[])[]): [number, number] => {
  let [low, high] = [Infinity, -Infinity];
  for (const list of lists) {
    for (const value of list) {
      if (value < low) low = value;
      if (value > high) high = value;
    }
  }
  return low > high ? [0, 1] : [low, high];
};

interface LaneSource {
  key: LaneKey;
  title: string;
  waveform: readonly number[];
  soak: readonly number[];
  rms: readonly number[] | null;
  bands: { waveform: Omit<Band, 'time'>; soak: Omit<Band, 'time'> } | null;
}

const sourcesOf = ({ traces, envelope, elementNames, element }: PlotData): LaneSource[] => {
  const of = (lists: readonly number[][]) => lists[element] ?? [];
  const name = elementNames[element];
  const bandsOf = (key: 'temperature' | 'energy') => {
    const [waveform, soak] = [envelope?.waveform[key][element], envelope?.soak[key][element]];
    return waveform && soak ? { waveform, soak } : null;
  };
  const current: LaneSource = {
    key: 'current', title: 'Current', waveform: traces.waveform.current, soak: traces.soak.peakCurrent, rms: traces.soak.rmsCurrent,
    bands: envelope && { waveform: envelope.waveform.current, soak: envelope.soak.current },
  };
  if (name === undefined) return [current];
  return [
    current,
    { key: 'temperature', title: `${name}, body`, waveform: of(traces.waveform.temperature), soak: of(traces.soak.temperature), rms: null, bands: bandsOf('temperature') },
    { key: 'energy', title: `${name}, energy`, waveform: of(traces.waveform.energy), soak: of(traces.soak.energy), rms: null, bands: bandsOf('energy') },
  ];
};

/** Room for the line's own label above, and at the foot only where values go below zero or far above it. */
const domainOf = (low: number, high: number, key: LaneKey): [number, number] => {
  const span = high - low || Math.abs(high) || 1;
  const foot = low >= 0 ? (key === 'temperature' && low > span ? low - span * 0.15 : 0) : low - span * 0.06;
  return [foot, high + span * 0.16];
};

const buildLane = (source: LaneSource, { traces, envelope, ratings }: PlotData): Lane => {
  const { key, bands } = source;
  const drawn = [source.waveform, source.soak, ...(bands ? [bands.waveform.low, bands.waveform.high, bands.soak.low, bands.soak.high] : [])];
  const [lowest, highest] = extremes(drawn);
  const rating = ratings[key];
  const above = rating !== undefined && key !== 'temperature' && rating.value > FLATTENS * Math.max(highest, -lowest);
  const reach = rating && !above ? Math.max(highest, rating.value) : highest;
  const { unit, show } = displayOf(key, Math.max(Math.abs(lowest), reach));
  const [low, high] = domainOf(show(lowest), show(reach), key);
  const showAll = (list: readonly number[]) => list.map(show);
  const halves = ['waveform', 'soak'] as const;
  return {
    key, title: source.title, unit, tone: key,
    waveform: { time: traces.waveform.time, value: showAll(source.waveform) },
    soak: { time: traces.soak.time, value: showAll(source.soak) },
    soakRms: source.rms && { time: traces.soak.time, value: showAll(source.rms) },
    bands: envelope && bands ? halves.map((half) => ({ half, band: { time: envelope[half].time, low: showAll(bands[half].low), high: showAll(bands[half].high) } })) : [],
    rating: rating ? { value: show(rating.value), label: rating.label, above } : null,
    domain: [low, high],
    ticks: multiples(low, high, niceStep(high - low, LANE_TICKS[key])),
  };
};

/** The three lanes of the plot in the units they are shown in; the current alone where the path has no limiter. */
export const buildLanes = (data: PlotData): Lane[] => sourcesOf(data).map((source) => buildLane(source, data));
