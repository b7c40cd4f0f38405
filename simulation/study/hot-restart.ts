import { restartPeakCurrentCheck } from '../checks/restart-peak-current';
import type { RestartCurve } from '../../shared/model/result';
import { cornerOf } from './factors';
import { restartLevels, searchSoak } from './restart';
import { restartCurve, restartMeter, type CurveStudy } from './restart-curve';
import type { Studied } from './studied';
import type { Trials } from './trials';
import { worstCase } from './worst-case';

const DEGREE = Math.PI / 180;

/** Off-times worth following from corner to corner: the highest point of a curve and its other summits. */
const summits = ({ curve }: CurveStudy): number[] => {
  const { offTime, peakCurrent } = curve;
  const tops = offTime
    .map((time, index) => ({ time, peak: peakCurrent[index] ?? 0, before: peakCurrent[index - 1] ?? 0, after: peakCurrent[index + 1] ?? 0 }))
    .filter(({ peak, before, after }) => peak >= before && peak > after)
    .sort((a, b) => b.peak - a.peak);
  return tops.slice(0, 2).map(({ time }) => time);
};

/** Peak of a restart against the time off, its worst corner, and the curve there. */
export const studyHotRestart = (trials: Trials): { studied: Studied[]; restart: RestartCurve | null } => {
  const { limits, cautionBelow, limiter } = trials.scenario;
  if (limiter.length === 0) return { studied: [], restart: null };
  const nominal = restartCurve(trials, {}, limits.peakCurrent);
  const base = restartLevels(trials, {});
  const first = trials.ranges.length ? restartCurve(trials, base, limits.peakCurrent) : nominal;
  const candidates = [...new Set([first.worst.offTime, ...summits(first)])];
  const { worst } = worstCase({
    ranges: trials.ranges.filter(({ factor }) => factor !== 'line'),
    phase: first.worst.phase,
    objective: (levels, phase) => {
      const at = restartLevels(trials, levels);
      const meter = restartMeter(trials, at, searchSoak(trials, at));
      return Math.max(...candidates.map((offTime) => meter.atPhase(offTime, phase).peak));
    },
  });
  const levels = restartLevels(trials, worst.levels);
  const { curve, worst: top } = trials.ranges.length ? restartCurve(trials, levels, limits.peakCurrent) : nominal;
  const held = limiter.some(({ bypass }) => bypass && top.offTime < bypass.releaseTime);
  const check = restartPeakCurrentCheck(
    {
      value: top.peak,
      nominal: nominal.worst.peak,
      corner: cornerOf(trials.ranges, levels),
      phase: trials.scenario.source.kind === 'ac' ? Math.round((top.phase / DEGREE) * 10) / 10 : null,
      offTime: top.offTime,
    },
    limits.peakCurrent,
    held,
    cautionBelow,
  );
  return { studied: [{ check, situation: { levels, phase: top.phase } }], restart: curve };
};
