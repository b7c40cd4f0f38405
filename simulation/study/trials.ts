import type { Scenario } from '../../shared/model/scenario';
import type { Run } from '../../shared/model/result';
import type { PathBypass, PowerPath } from '../circuit/path';
import type { RunOptions, StartState } from '../run/options';
import { powerUp, type PowerUp } from '../run/power-up';
import { rangingFactors, type FactorRange } from './factors';
import { keyOf, type Levels } from './levels';
import { resolvePath } from './resolve-path';
import type { Situation } from './worst-case';

/** A path changed in one respect, under a name that tells it apart. */
export interface Variant {
  name: string;
  change: (path: PowerPath) => PowerPath;
}

/** The path as drawn, without what a check of an undisturbed power-up must not meet: interruptions and the fault. */
export const UNDISTURBED: Variant = {
  name: 'undisturbed',
  change: (path) => ({ ...path, fault: null, source: { ...path.source, programme: [] } }),
};

/** The fault included, interruptions left out. */
export const FAULTED: Variant = {
  name: 'faulted',
  change: (path) => ({ ...path, source: { ...path.source, programme: [] } }),
};

export const AS_DESCRIBED: Variant = { name: 'as-described', change: (path) => path };

export const UNLOADED: Variant = {
  name: 'unloaded',
  change: (path) => ({ ...UNDISTURBED.change(path), load: { kind: 'none' } }),
};

/** The contact of one element behaves otherwise. */
export const contactThat = (behaviour: PathBypass['behaviour'], element: number): Variant => ({
  name: `${behaviour}-${element}`,
  change: (path) => {
    const elements = path.elements.map((one, index) =>
      index === element && one.bypass ? { ...one, bypass: { ...one.bypass, behaviour } } : one,
    );
    return { ...UNDISTURBED.change(path), elements };
  },
});

/** Runs of one scenario, each computed once. */
export interface Trials {
  scenario: Scenario;
  ranges: readonly FactorRange[];
  path(levels: Levels, phase: number, variant?: Variant): PowerPath;
  /** Ends with the first conduction; no traces. */
  firstPulse(situation: Situation, variant?: Variant): Run;
  /** Ends when the bus is charged; no traces. */
  charge(situation: Situation, variant?: Variant): Run;
  /** Follows the first `duration` seconds; no traces. */
  until(duration: number, situation: Situation, variant?: Variant): Run;
  /** To the end of the scenario, at thermal balance where it gets there; no traces. */
  whole(situation: Situation, variant?: Variant): PowerUp;
  /** As `whole`, with traces. */
  traced(situation: Situation, variant?: Variant): PowerUp;
  /** The first cycles, with traces. */
  opening(situation: Situation, variant?: Variant): Run;
  /** From another state than cold; not kept. */
  from(situation: Situation, start: StartState, stopAt: 'first-pulse' | 'charged', variant?: Variant): Run;
}

/** Longer than any pulse takes to begin and end, s. */
const QUICK = 0.5;
/** Some cycles at any line frequency, s. */
const OPENING = 0.1;

export const trialsOf = (scenario: Scenario): Trials => {
  const kept = new Map<string, PowerUp>();
  const path = (levels: Levels, phase: number, variant = UNDISTURBED): PowerPath => variant.change(resolvePath(scenario, levels, phase));
  const disturbed = scenario.fault !== undefined || scenario.source.programme.length > 0;
  // Without a fault and without interruptions the three ways to take the path are one.
  const nameOf = (variant: Variant): string => (!disturbed && (variant === AS_DESCRIBED || variant === FAULTED) ? UNDISTURBED.name : variant.name);
  const once = (question: string, { levels, phase }: Situation, variant: Variant, options: RunOptions): PowerUp => {
    const key = `${question}|${nameOf(variant)}|${keyOf(levels)}|${phase.toFixed(5)}`;
    const known = kept.get(key);
    if (known) return known;
    const result = powerUp(path(levels, phase, variant), options);
    kept.set(key, result);
    return result;
  };
  const { duration } = scenario;
  return {
    scenario,
    ranges: rangingFactors(scenario),
    path,
    firstPulse: (situation, variant = UNDISTURBED) =>
      once('first-pulse', situation, variant, { duration: Math.min(duration, QUICK), stopAt: 'first-pulse', traces: false }).run,
    charge: (situation, variant = UNDISTURBED) => once('charged', situation, variant, { duration, stopAt: 'charged', traces: false }).run,
    until: (seconds, situation, variant = UNDISTURBED) => {
      const followed = Math.min(duration, seconds);
      return once(`until-${followed}`, situation, variant, { duration: followed, traces: false }).run;
    },
    whole: (situation, variant = UNDISTURBED) => once('whole', situation, variant, { duration, traces: false }),
    traced: (situation, variant = UNDISTURBED) => once('traced', situation, variant, { duration }),
    opening: (situation, variant = UNDISTURBED) => once('opening', situation, variant, { duration: Math.min(duration, OPENING) }).run,
    from: ({ levels, phase }, start, stopAt, variant = UNDISTURBED) =>
      powerUp(path(levels, phase, variant), { duration: Math.min(duration, QUICK), stopAt, traces: false, start }).run,
  };
};
