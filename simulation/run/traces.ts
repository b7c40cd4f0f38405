import type { Traces } from '../../shared/model/result';
import { FOLD, type Follow } from './follow';
import { thinned } from './thin';

const WAVEFORM_POINTS = 400;
const SOAK_POINTS = 200;

export const emptyTraces = (elements: number): Traces => {
  const each = () => Array.from({ length: elements }, () => [] as number[]);
  const common = () => ({ time: [], bus: [], temperature: each(), resistance: each(), energy: each(), i2t: [] });
  return { foldAt: FOLD, waveform: { ...common(), current: [] }, soak: { ...common(), peakCurrent: [], rmsCurrent: [] } };
};

const resistances = (run: Follow, temperature: readonly number[][]): number[][] =>
  temperature.map((column, k) => column.map((one) => run.path.elements[k]!.law.resistance(one)));

const waveformOf = (run: Follow): Traces['waveform'] => {
  const { history } = run;
  const end = history.time.findIndex((time) => time > FOLD);
  const within = history.time.slice(0, end < 0 ? undefined : end);
  const kept = thinned(within, history.current, WAVEFORM_POINTS);
  const pick = (column: readonly number[]) => kept.map((k) => column[k]!);
  const temperature = history.temperature.map(pick);
  return {
    time: pick(history.time),
    current: pick(history.current),
    bus: pick(history.bus),
    temperature,
    resistance: resistances(run, temperature),
    energy: history.energy.map(pick),
    i2t: pick(history.i2t),
  };
};

interface SoakRow {
  time: number;
  peak: number;
  rms: number;
  bus: number;
  temperature: number[];
  energy: number[];
  i2t: number;
}

const soakRows = (run: Follow): SoakRow[] => {
  const rows = run.periods.rows.map((row) => ({ ...row, time: row.end, bus: row.lowestBus }));
  const points = run.soaked.flatMap(({ points: list, offset }) =>
    list.map(({ time, cycle, temperature, energy, i2t }) => ({
      time,
      peak: cycle.peak,
      rms: cycle.rms,
      bus: cycle.lowestBus,
      temperature,
      energy: energy.map((one, k) => one + offset.energy[k]!),
      i2t: i2t + offset.i2t,
    })),
  );
  return [...rows, ...points].sort((a, b) => a.time - b.time).filter(({ time }) => time >= FOLD);
};

const soakOf = (run: Follow): Traces['soak'] => {
  const rows = soakRows(run);
  const log = rows.map(({ time }) => Math.log(time));
  const kept = thinned(log, rows.map(({ peak }) => peak), SOAK_POINTS).map((k) => rows[k]!);
  const elements = run.path.elements.map((_, k) => k);
  const temperature = elements.map((k) => kept.map((row) => row.temperature[k]!));
  return {
    time: kept.map(({ time }) => time),
    peakCurrent: kept.map(({ peak }) => peak),
    rmsCurrent: kept.map(({ rms }) => rms),
    bus: kept.map(({ bus }) => bus),
    temperature,
    resistance: resistances(run, temperature),
    energy: elements.map((k) => kept.map((row) => row.energy[k]!)),
    i2t: kept.map(({ i2t }) => i2t),
  };
};

export const tracesOf = (run: Follow): Traces => ({ foldAt: Math.min(FOLD, run.options.duration), waveform: waveformOf(run), soak: soakOf(run) });
