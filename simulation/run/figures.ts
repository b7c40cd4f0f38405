import type { ElementFigures, Figures } from '../../shared/model/figure';
import type { Follow } from './follow';
import { passes } from './history';
import type { Period } from './recorder';

/** Share of the final ripple maximum at which charging ends. */
const CHARGED = 0.98;
/** V; the voltage that stored charge is waited down to as a service caution (IEC 62368-1, from memory). */
const TOUCHABLE = 60;

/** The last full cycle, or what stands for it. */
interface Ending {
  rms: number;
  peak: number;
  lowestBus: number;
  sourcePower: number;
}

const endingOf = (run: Follow): Ending | null => {
  if (run.endCycle) return run.endCycle;
  // The run may end within a half period: the last full cycle counts.
  const rows = run.periods.rows.filter(({ start, end }) => end - start > 0.999 * run.periods.length).slice(-2);
  if (rows.length < 2 || run.options.stopAt) return null;
  const mean = (pick: (row: Period) => number) => (pick(rows[0]!) + pick(rows[1]!)) / 2;
  return {
    rms: Math.sqrt(mean((row) => row.rms ** 2)),
    peak: Math.max(...rows.map((row) => row.peak)),
    lowestBus: Math.min(...rows.map((row) => row.lowestBus)),
    sourcePower: mean((row) => row.sourcePower),
  };
};

/** The end of charging, with what had been absorbed and how hot the bodies had been by then. */
interface Charged {
  at: number;
  i2t: number;
  energy: number[];
  hottest: number[];
}

const interpolate = (time: readonly number[], column: readonly number[], k: number, at: number): number => {
  const [t0, t1] = [time[k - 1]!, time[k]!];
  return t1 > t0 ? column[k - 1]! + ((at - t0) / (t1 - t0)) * (column[k]! - column[k - 1]!) : column[k]!;
};

/** Not by Math.max(...): a long run has more values than a call may have arguments. */
const largest = (values: readonly number[]): number => values.reduce((most, one) => Math.max(most, one), -Infinity);

const chargedInHistory = ({ history }: Follow, level: number): Charged | null => {
  const { time, bus, i2t, energy, temperature } = history;
  const k = bus.findIndex((one) => one >= level);
  if (k < 0) return null;
  if (k === 0) return { at: 0, i2t: 0, energy: energy.map(() => 0), hottest: temperature.map((column) => column[0]!) };
  const at = passes(time, bus, k, level);
  return {
    at,
    i2t: interpolate(time, i2t, k, at),
    energy: energy.map((column) => interpolate(time, column, k, at)),
    hottest: temperature.map((column) => largest(column.slice(0, k + 1))),
  };
};

const chargedInRows = ({ periods }: Follow, level: number): Charged | null => {
  const { rows } = periods;
  const k = rows.findIndex((row) => row.highestBus >= level);
  if (k < 0) return null;
  const row = rows[k]!;
  const hottest = row.temperature.map((_, n) => largest(rows.slice(0, k + 1).map(({ temperature }) => temperature[n]!)));
  return { at: row.end, i2t: row.i2t, energy: row.energy, hottest };
};

const finalRippleMaximum = (run: Follow): number => {
  if (run.endCycle) return run.endCycle.highestBus;
  const rows = run.periods.rows.slice(-2);
  return rows.length > 0 ? Math.max(...rows.map((row) => row.highestBus)) : run.wave.tally.end.bus;
};

const chargedOf = (run: Follow): Charged | null => {
  if (run.options.stopAt === 'first-pulse') return null;
  const level = CHARGED * finalRippleMaximum(run);
  return level > 0 ? (chargedInHistory(run, level) ?? chargedInRows(run, level)) : null;
};

const dischargeTime = (voltage: number, { bulk }: Follow['path']): number | null => {
  if (voltage <= TOUCHABLE) return 0;
  return bulk.bleeder === null ? null : bulk.bleeder * bulk.capacitance * Math.log(voltage / TOUCHABLE);
};

const sum = (values: readonly number[]) => values.reduce((total, one) => total + one, 0);

const highest = (run: Follow, pick: (row: Period) => number): number => Math.max(0, largest(run.periods.rows.map(pick)));

const tripFigures = ({ trip }: Follow, ending: Ending | null, power: number | null) => {
  const tripped = trip.at !== null;
  return {
    timeToTrip: tripped ? trip.at! - trip.from : null,
    letThroughI2t: tripped ? trip.i2t : null,
    letThroughEnergy: tripped ? trip.energy : null,
    trippedCurrent: tripped ? (ending?.rms ?? null) : null,
    trippedPower: tripped ? power : null,
  };
};

const bodyLoss = (run: Follow, ending: Ending | null): number | null => {
  if (!ending || run.path.elements.length === 0) return null;
  return sum(run.path.elements.map((_, k) => run.circuit.bodyPower(k, run.wave.y, ending.rms)));
};

const loadFigures = ({ happenings, underLoad }: Follow) => {
  const starts = happenings.events.filter(({ kind }) => kind === 'load-starts');
  return {
    busAtLoadStart: underLoad.start,
    lowestBusUnderLoad: Number.isFinite(underLoad.lowest) ? underLoad.lowest : null,
    loadStarts: starts.length,
    loadStartAt: starts[0]?.at ?? null,
  };
};

export const figuresOf = (run: Follow): Figures => {
  const { pulse, wave, bypass } = run;
  const crest = run.options.stopAt === 'first-pulse' ? { value: pulse.peak, at: pulse.peakAt } : run.crest;
  const ending = endingOf(run);
  const charged = chargedOf(run);
  const power = bodyLoss(run, ending);
  const loss = ending && run.path.elements.length > 0 ? ending.rms ** 2 * run.circuit.elementsResistance(wave.y) : null;
  const highestBus = Math.max(highest(run, (row) => row.highestBus), run.endCycle?.highestBus ?? 0, wave.tally.end.bus);
  return {
    peakCurrent: crest.value,
    peakCurrentAt: crest.at,
    pulseWidthHalf: pulse.width(0.5),
    pulseWidthTenth: pulse.width(0.1),
    firstPulseI2t: pulse.i2t,
    firstPulseEnergy: sum(pulse.energy),
    chargeI2t: charged?.i2t ?? null,
    chargeEnergy: charged ? sum(charged.energy) : null,
    chargedAt: charged?.at ?? null,
    totalI2t: wave.tally.i2t,
    sourceEnergy: wave.tally.source,
    steadyRmsCurrent: ending?.rms ?? null,
    steadyPeakCurrent: ending?.peak ?? null,
    highestHalfPeriodRms: run.path.source.kind === 'ac' ? highest(run, (row) => row.rms) : null,
    limiterLoss: loss,
    limiterLossShare: loss !== null && ending!.sourcePower > 1e-9 ? loss / ending!.sourcePower : null,
    highestBus,
    finalBusLow: ending?.lowestBus ?? null,
    ...loadFigures(run),
    bypassClosedAt: bypass.closedAt,
    bypassSecondPeak: bypass.crest?.value ?? null,
    bypassVoltage: bypass.voltage,
    ...tripFigures(run, ending, power),
    timeToDischarge: dischargeTime(highestBus, run.path),
  };
};

export const elementFiguresOf = (run: Follow): ElementFigures[] => {
  const ending = endingOf(run);
  const charged = chargedOf(run);
  return run.path.elements.map((element, k) => {
    const temperature = run.wave.y[1 + k]!;
    return {
      name: element.name,
      startResistance: run.happenings.startResistance[k]!,
      energy: run.wave.tally.body[k]!,
      firstPulseEnergy: run.pulse.energy[k] ?? 0,
      chargeEnergy: charged?.energy[k] ?? null,
      peakTemperature: run.hottest[k]!,
      chargePeakTemperature: charged?.hottest[k] ?? null,
      finalTemperature: temperature,
      finalResistance: element.law.resistance(temperature),
      steadyRmsCurrent: ending ? run.circuit.bodyCurrent(k, run.wave.y, ending.rms) : null,
      trippedAt: run.happenings.events.find(({ kind, element: which }) => kind === 'trips' && which === k)?.at ?? null,
    };
  });
};
