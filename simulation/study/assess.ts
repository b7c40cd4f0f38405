import { inOrder, setAsideIn, verdictOf } from '../checks/verdict';
import type { Assessment, Run } from '../../shared/model/result';
import type { Scenario } from '../../shared/model/scenario';
import { ENGINE_VERSION } from '../engine-version';
import { studyBypass } from './bypass';
import { studyChargingHeat } from './charging-heat';
import { studySecondPeaks } from './closing-instant';
import { studyColdStart } from './cold-start';
import { envelopeOf } from './envelope';
import { cornerOf } from './factors';
import { studyFusePulse } from './fuse-pulse';
import { studyHotRestart } from './hot-restart';
import { keyOf, NOMINAL } from './levels';
import { studyBreakingCapacity } from './prospective';
import { studyPtc } from './ptc';
import { studyRestartEnergy } from './restart-energy';
import { studySteady } from './steady';
import { givenPhase, searchWorst, orNever } from './studied';
import { studyDiodes, studyPeakCurrent } from './switch-on';
import { AS_DESCRIBED, trialsOf, type Trials } from './trials';
import type { Situation } from './worst-case';

export interface AssessOptions {
  /** The envelope takes whole runs of every governing corner; a verdict alone does without. Default true. */
  envelope?: boolean;
}

/** Runs that the envelope is drawn over: one for each corner and angle that governs a check. */
const distinct = (situations: readonly (Situation | null)[]): Situation[] => {
  const seen = new Map<string, Situation>();
  for (const one of situations) if (one) seen.set(`${keyOf(one.levels)}|${one.phase.toFixed(2)}`, one);
  return [...seen.values()];
};

/** Switch-on angles whose first cycles are added at the corner of the highest peak: the contact of a switch knows none. */
const ANGLES = [0, 1, 2, 3].map((quarter) => (quarter * Math.PI) / 4);

const envelopeFor = (trials: Trials, nominal: Run, situations: readonly Situation[], highest: Situation) => {
  if (trials.ranges.length === 0) return { envelope: null, corners: [] };
  const corners = new Map(situations.map(({ levels }) => [keyOf(levels), cornerOf(trials.ranges, levels)]));
  const searched = givenPhase(trials.scenario) === null;
  const traces = [
    ...situations.map((one) => trials.traced(one, AS_DESCRIBED).run.traces),
    ...(searched ? ANGLES.map((phase) => trials.opening({ levels: highest.levels, phase }).traces) : []),
  ];
  return { envelope: envelopeOf(nominal.traces, traces, trials.scenario.source.kind === 'ac'), corners: [...corners.values()] };
};

/** Everything computed for one scenario: nominal run, checks in the order of the verdict, envelope, restart curve. */
export const assess = (scenario: Scenario, { envelope: wanted = true }: AssessOptions = {}): Assessment => {
  const trials = trialsOf(scenario);
  const peak = studyPeakCurrent(trials);
  const { studied: hotRestart, restart } = studyHotRestart(trials);
  const contacts = studySecondPeaks(trials);
  const studied = [
    peak,
    ...studyDiodes(trials),
    ...studyFusePulse(trials, contacts),
    ...studyBreakingCapacity(trials),
    ...studyChargingHeat(trials),
    ...studySteady(trials),
    ...studyColdStart(trials),
    ...hotRestart,
    ...studyRestartEnergy(trials),
    ...contacts.map(({ studied: one }) => one),
    ...studyBypass(trials),
    ...studyPtc(trials),
  ];
  const checks = inOrder(setAsideIn(studied.map(({ check }) => check), scenario.setAside));
  const { run } = trials.traced(peak.found.nominal, AS_DESCRIBED);
  const band = wanted ? envelopeFor(trials, run, distinct(studied.map(({ situation }) => situation)), peak.found.worst) : { envelope: null, corners: [] };
  return { engineVersion: ENGINE_VERSION, verdict: verdictOf(checks), checks, run, restart, ...band };
};

/** The nominal run of a scenario as it is described, from its worst switch-on angle where that is asked for. */
export const simulate = (scenario: Scenario): Run => {
  const trials = trialsOf(scenario);
  const nominalOnly = { ...trials, ranges: [] };
  const phase =
    givenPhase(scenario) ??
    searchWorst(nominalOnly, (levels, angle) => orNever(trials.firstPulse({ levels, phase: angle }).figures.peakCurrent)).nominal.phase;
  return trials.traced({ levels: NOMINAL, phase }, AS_DESCRIBED).run;
};
