import type { PowerPath } from '../circuit/path';

const PER_DECADE = 7;
/** Where DC has no half cycle to start from, s. */
const SHORTEST_DC = 1e-3;
const BODIES_COOL_IN = 6;
const LONGEST = 3600;

/** Times (s) that a study of restarts tries: log-spaced from a half cycle until every body is cold, and both sides of each release. */
export const offTimesOf = ({ source, elements, bulk }: PowerPath): number[] => {
  const from = source.frequency > 0 ? 1 / (2 * source.frequency) : SHORTEST_DC;
  const slowest = Math.max(0, ...elements.map(({ heatCapacity, dissipation }) => heatCapacity / dissipation));
  const empties = bulk.bleeder === null ? 0 : bulk.bleeder * bulk.capacitance;
  const to = Math.min(LONGEST, Math.max(60, BODIES_COOL_IN * Math.max(slowest, empties)));
  const count = Math.ceil(Math.log10(to / from) * PER_DECADE);
  const spaced = Array.from({ length: count + 1 }, (_, index) => from * (to / from) ** (index / count));
  const releases = elements.flatMap(({ bypass }) => (bypass && bypass.releaseTime > from ? [bypass.releaseTime * (1 - 1e-6), bypass.releaseTime] : []));
  return [...new Set([...spaced, ...releases])].sort((a, b) => a - b);
};
