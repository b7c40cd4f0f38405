import type { Audit } from '../../shared/model/result';
import { twinOf } from '../circuit/twin';
import type { Follow } from './follow';
import { Periods } from './periods';
import { Waveform } from './waveform';

/** Relative residual up to which a run counts as clean. */
const CLEAN = 5e-3;
/** K, and share of the rise over ambient; a soak further than both from the waveform at its end is not clean. */
const CLEAN_TEMPERATURE = { absolute: 0.3, relative: 5e-3 };
/** Share of the highest half-period current below which a disagreement on the steady one moves nothing. */
const NEGLIGIBLE = 0.01;
/** Half periods of full waveform that the end of a soak is held against. */
const STRETCH = 2;

/** Heat taken up and given off against heat absorbed, each element by itself, relative to what it absorbed. */
const elementResiduals = ({ path, wave, startTemperatures }: Follow): number[] =>
  path.elements.map(({ heatCapacity }, k) => {
    const [absorbed, given] = [wave.tally.body[k]!, wave.tally.given[k]!];
    const stored = heatCapacity * (wave.y[1 + k]! - startTemperatures[k]!);
    const own = Math.max(absorbed, Math.abs(stored), 1e-3 * heatCapacity);
    return Math.abs(absorbed - given - stored) / own;
  });

/**
 * A stretch of full waveform from the state at the end of the last soak, beside what the soak took it for; the
 * temperature is what the difference in heating made of all the time that was soaked.
 */
const soakResidual = (run: Follow): Audit['soak'] => {
  const { endCycle: cycle, path, circuit } = run;
  if (!cycle || path.elements.length === 0) return null;
  const twin = twinOf(circuit);
  const y = Float64Array.from(run.wave.y);
  y[0] = cycle.capacitorVoltage;
  const spilling = path.source.kind === 'ac' && cycle.lineCurrent > 0;
  y[circuit.size - 1] = spilling || path.source.kind === 'dc' ? cycle.lineCurrent : 0;
  if (spilling) twin.conduction = -1;
  if (path.source.kind === 'dc') twin.conduction = 1;
  if (twin.conduction !== 0) twin.inductive = twin.needsInductance(y, false);
  const wave = new Waveform(twin, { t: 0, y }, { tolerance: run.options.tolerance ?? 1e-5, budget: 400_000 }, () => [], () => undefined);
  const length = new Periods(wave).length;
  for (let k = 1; k <= STRETCH; k += 1) wave.run(k * length, () => false);
  const span = STRETCH * length;
  const highest = run.periods.rows.reduce((most, row) => Math.max(most, row.rms), 0);
  // The bodies go on warming in the stretch itself: what the soak says of its begin and of its end is compared.
  const after = run.lastMap?.at(twin.elementsResistance(wave.y)) ?? cycle;
  const modelledRms = Math.sqrt((cycle.rms ** 2 + after.rms ** 2) / 2);
  const rms = Math.sqrt(wave.tally.i2t / span);
  const soaked = run.soaked.reduce((sum, { from, points }) => sum + points[points.length - 1]!.time - from, 0);
  const drift = path.elements.map(({ dissipation, heatCapacity }, k) => {
    const modelled = (circuit.bodyPower(k, run.wave.y, cycle.rms) + circuit.bodyPower(k, wave.y, after.rms)) / 2;
    const power = wave.tally.body[k]! / span - modelled;
    return (power / dissipation) * -Math.expm1((-soaked * dissipation) / heatCapacity);
  });
  return {
    temperature: Math.max(...drift.map(Math.abs)),
    rmsCurrent: Math.abs(rms - modelledRms) / Math.max(modelledRms, NEGLIGIBLE * highest, Number.MIN_VALUE),
  };
};

export const auditOf = (run: Follow): Audit => {
  const elementEnergy = elementResiduals(run);
  const { residual, energy } = run.sourceBalance;
  const floor = 1e-9 * run.path.bulk.capacitance * run.path.source.amplitude ** 2;
  const sourceEnergy = Math.abs(residual) / Math.max(energy, run.wave.tally.dissipated, floor, 1e-12);
  const soak = run.options.traces === false ? null : soakResidual(run);
  const worstResidual = Math.max(0, sourceEnergy, soak?.rmsCurrent ?? 0, ...elementEnergy);
  const rise = Math.max(0, ...run.hottest.map((hottest) => hottest - run.path.ambient));
  const allowed = Math.max(CLEAN_TEMPERATURE.absolute, CLEAN_TEMPERATURE.relative * rise);
  const notes = [
    ...(run.pulses.expected === run.pulses.found ? [] : [`${run.pulses.expected - run.pulses.found} pulses were passed over`]),
    ...(worstResidual < CLEAN ? [] : [`the largest residual is ${(100 * worstResidual).toPrecision(2)} %`]),
    ...((soak?.temperature ?? 0) < allowed ? [] : ['the soak and the waveform disagree on the final temperature']),
  ];
  return { clean: notes.length === 0, worstResidual, elementEnergy, sourceEnergy, pulses: { ...run.pulses }, soak, notes };
};
