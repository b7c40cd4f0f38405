import { restartPeakCurrentCheck } from '../checks/restart-peak-current';
import type { RestartCurve } from '../../shared/model/result';
import { cornerOf } from './factors';
import type { Levels } from './levels';
import { restartLevels, searchSoak } from './restart';
import { restartCurve, restartMeter, restartSummits } from './restart-curve';
import { roundedDegrees, type Studied } from './studied';
import type { Trials } from './trials';
import { worstCase } from './worst-case';

const FOLLOWED_SUMMITS = 2;

/** The worst corner: the highest of the nominal curve's summits followed from corner to corner. */
const worstLevels = (trials: Trials): Levels => {
  const summits = restartSummits(trials, restartLevels(trials, {})).slice(0, FOLLOWED_SUMMITS);
  const { worst } = worstCase({
    ranges: trials.ranges.filter(({ factor }) => factor !== 'line'),
    phase: summits[0]?.phase ?? 0,
    objective: (levels) => {
      const at = restartLevels(trials, levels);
      const meter = restartMeter(trials, at, searchSoak(trials, at));
      return Math.max(...summits.map(({ offTime, phase }) => meter.atPhase(offTime, phase).peak));
    },
  });
  return restartLevels(trials, worst.levels);
};

/** Peak of a restart against the time off, its worst corner, and the curve there. */
export const studyHotRestart = (trials: Trials): { studied: Studied[]; restart: RestartCurve | null } => {
  const { limits, cautionBelow, limiter, source } = trials.scenario;
  if (limiter.length === 0) return { studied: [], restart: null };
  const levels = trials.ranges.length ? worstLevels(trials) : {};
  const { curve, worst } = restartCurve(trials, levels, limits.peakCurrent);
  const nominal = trials.ranges.length ? restartSummits(trials, {})[0]?.peak : worst.peak;
  const held = limiter.some(({ bypass }) => bypass && worst.offTime < bypass.releaseTime);
  const finding = {
    value: worst.peak,
    nominal: nominal ?? null,
    corner: cornerOf(trials.ranges, levels),
    phase: source.kind === 'ac' ? roundedDegrees(worst.phase) : null,
    offTime: worst.offTime,
  };
  const check = restartPeakCurrentCheck(finding, limits.peakCurrent, held, cautionBelow);
  return { studied: [{ check, situation: { levels, phase: worst.phase } }], restart: curve };
};
