import { diodeI2tCheck } from '../checks/diode-i2t';
import { diodeSurgeCheck, surgeRating, type Surge } from '../checks/diode-surge';
import { peakCurrentCheck } from '../checks/peak-current';
import type { Run } from '../../shared/model/result';
import { levelOf } from './levels';
import { frequencyAt } from './resolve-path';
import { findingOf, orNever, searchWorst, type Studied } from './studied';
import type { Trials } from './trials';
import type { Situation, WorstCase } from './worst-case';

type Ask = (situation: Situation) => Run;
type Measure = (run: Run, situation: Situation) => number | null;

interface Pulse {
  found: WorstCase;
  ask: Ask;
  /** A pulse after the first governs. */
  later: boolean;
}

/**
 * The first pulse is the highest of a cold start unless the bulk is so large that the limiter has warmed before
 * it is charged, or the given angle cuts the first pulse short. Then runs to the end of charging answer instead.
 */
const searchPulse = (trials: Trials, measure: Measure): Pulse => {
  const by = (ask: Ask) => searchWorst(trials, (levels, phase) => orNever(measure(ask({ levels, phase }), { levels, phase })));
  const quick = by(trials.firstPulse);
  const isLater = (one: Situation) => orNever(measure(trials.charge(one), one)) > orNever(measure(trials.firstPulse(one), one)) * 1.0005;
  return isLater(quick.worst) || isLater(quick.nominal)
    ? { found: by(trials.charge), ask: trials.charge, later: true }
    : { found: quick, ask: trials.firstPulse, later: false };
};

/** Peak current of a cold start. */
export const studyPeakCurrent = (trials: Trials): Studied & { found: WorstCase } => {
  const { limits, cautionBelow } = trials.scenario;
  const { found, ask } = searchPulse(trials, (run) => run.figures.peakCurrent);
  const finding = findingOf(trials, found, (one) => ask(one).figures.peakCurrent);
  return { check: peakCurrentCheck(finding, limits.peakCurrent, cautionBelow), situation: found.worst, found };
};

/** A²s of the heaviest half cycle; the first pulse where it is the heaviest. */
const pulseI2t = ({ figures }: Run, halfPeriod: number | null): number | null =>
  halfPeriod === null || figures.highestHalfPeriodRms === null
    ? figures.firstPulseI2t
    : Math.max(figures.firstPulseI2t ?? 0, figures.highestHalfPeriodRms ** 2 * halfPeriod);

/** s; null for DC. */
const halfPeriodAt = (trials: Trials, { levels }: Situation): number | null => {
  const frequency = frequencyAt(trials.scenario, levelOf(levels, 'frequency'));
  return frequency > 0 ? 1 / (2 * frequency) : null;
};

const studySurge = (trials: Trials, surge: Surge | undefined): Studied => {
  const widthIn = (run: Run): number | null => run.figures.pulseWidthTenth;
  const use: Measure = (run) => {
    const [peak, width] = [run.figures.peakCurrent, widthIn(run)];
    return surge && peak !== null && width !== null ? peak / surgeRating(surge, width) : peak;
  };
  const { found, ask, later } = searchPulse(trials, use);
  // The width of a later pulse is not reported: the whole half period stands for it.
  const widthAt = (one: Situation) => (later ? halfPeriodAt(trials, one) : null) ?? widthIn(ask(one));
  const finding = findingOf(trials, found, (one) => ask(one).figures.peakCurrent);
  const width = { worst: widthAt(found.worst), nominal: widthAt(found.nominal) };
  return { check: diodeSurgeCheck(finding, surge, width, trials.scenario.cautionBelow), situation: found.worst };
};

const studyDiodeI2t = (trials: Trials, surge: Surge | undefined): Studied => {
  const measure: Measure = (run, one) => pulseI2t(run, halfPeriodAt(trials, one));
  const { found, ask } = searchPulse(trials, measure);
  const finding = findingOf(trials, found, (one) => measure(ask(one), one));
  return { check: diodeI2tCheck(finding, surge, trials.scenario.cautionBelow), situation: found.worst };
};

/** Surge current and I²t of the rectifier; without one there is nothing to check. */
export const studyDiodes = (trials: Trials): Studied[] => {
  const { rectifier } = trials.scenario;
  return rectifier.kind === 'none' ? [] : [studySurge(trials, rectifier.surge), studyDiodeI2t(trials, rectifier.surge)];
};
