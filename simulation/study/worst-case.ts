import type { Level } from '../../shared/model/corner';
import type { FactorRange } from './factors';
import { keyOf, levelOf, moved, NOMINAL, type Levels } from './levels';
import { worstPhase } from './worst-phase';

/** Higher is worse; −Infinity where the question has no answer. */
export type Objective = (levels: Levels, phase: number) => number;

export interface Situation {
  levels: Levels;
  /** rad */
  phase: number;
}

export interface Search {
  ranges: readonly FactorRange[];
  objective: Objective;
  /** The angle (rad) to use as given, or null to search it. */
  phase: number | null;
}

export interface WorstCase {
  nominal: Situation;
  worst: Situation;
}

const MAX_MOVES = 12;

/** Each factor flipped once from `levels`, the others held; the worst level of each. */
const vertexBySigns = ({ ranges, objective }: Search, from: Situation): Levels => {
  const base = objective(from.levels, from.phase);
  return ranges.reduce<Levels>((vertex, { factor, levels }) => {
    let [worst, value] = [levelOf(from.levels, factor), base];
    for (const level of levels) {
      const flipped = objective(moved(from.levels, factor, level), from.phase);
      if (flipped > value) [worst, value] = [level, flipped];
    }
    return moved(vertex, factor, worst);
  }, NOMINAL);
};

/** The levels to try against the one a factor stands at; from one end of a range the other end. */
const opposites = ({ factor, levels: all }: FactorRange, levels: Levels): Level[] => {
  const current = levelOf(levels, factor);
  const ends = all.filter((level) => level !== current && level !== 'nominal');
  return ends.length > 0 ? ends : all.filter((level) => level !== current);
};

/** Moves to the worst one-flip neighbour until none is worse: proves that the vertex is a local worst. */
const climb = ({ ranges, objective }: Search, { levels: start, phase }: Situation): Situation => {
  let levels = start;
  let value = objective(levels, phase);
  for (let count = 0; count < MAX_MOVES; count += 1) {
    let best = levels;
    for (const range of ranges) {
      for (const level of opposites(range, levels)) {
        const neighbour = moved(levels, range.factor, level);
        const flipped = objective(neighbour, phase);
        if (flipped > value) [best, value] = [neighbour, flipped];
      }
    }
    if (best === levels) break;
    levels = best;
  }
  return { levels, phase };
};

/**
 * The worst corner and switch-on angle of one question: each factor flipped once at the nominal worst
 * angle, the vertex by the signs, its one-flip neighbours verified, and the angle searched anew there. The
 * angle follows when the neighbours move the corner.
 */
export const worstCase = (search: Search): WorstCase => {
  const { objective, phase } = search;
  const phaseAt = (levels: Levels, hint?: number): number =>
    phase ?? worstPhase((angle) => objective(levels, angle), hint).phase;
  const nominal: Situation = { levels: NOMINAL, phase: phaseAt(NOMINAL) };
  if (search.ranges.length === 0) return { nominal, worst: nominal };
  const vertex = vertexBySigns(search, nominal);
  let worst = climb(search, { levels: vertex, phase: phaseAt(vertex, nominal.phase) });
  for (let round = 0; round < 2 && keyOf(worst.levels) !== keyOf(vertex) && phase === null; round += 1) {
    const { levels } = worst;
    worst = climb(search, { levels, phase: phaseAt(levels, worst.phase) });
    if (worst.levels === levels) break;
  }
  return { nominal, worst };
};
