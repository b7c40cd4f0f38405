import type { RestartCurve } from '../../shared/model/result';
import { offTimesOf } from './off-times';
import { restartState, soakState, type SoakState } from './restart';
import { givenPhase } from './studied';
import type { Levels } from './levels';
import type { Trials } from './trials';
import { worstPhase } from './worst-phase';

/** Peak (A) of a restart after `offTime` (s), at its worst angle (rad). */
export interface RestartPeak {
  offTime: number;
  peak: number;
  phase: number;
}

const NUDGE = Math.PI / 15;
const PERIOD = Math.PI;

/** Measures the peak after an off-time, at a given angle or at the worst near a hint. */
export const restartMeter = (trials: Trials, levels: Levels, soak: SoakState) => {
  const given = givenPhase(trials.scenario);
  const peakAt = (offTime: number, phase: number): number => {
    const start = restartState(trials, levels, soak, offTime);
    return trials.from({ levels, phase }, start, 'first-pulse').figures.peakCurrent ?? 0;
  };
  const atPhase = (offTime: number, phase: number): RestartPeak => ({ offTime, phase, peak: peakAt(offTime, phase) });
  return {
    /** The angle searched over the half period, or uphill from a hint. */
    searched: (offTime: number, hint?: number): RestartPeak => {
      if (given !== null) return atPhase(offTime, given);
      const { phase, value } = worstPhase((angle) => peakAt(offTime, angle), hint);
      return { offTime, phase, peak: value };
    },
    /** Three angles about the hint and the vertex of the parabola through them. */
    near: (offTime: number, hint: number): RestartPeak => {
      if (given !== null) return atPhase(offTime, given);
      const [before, middle, after] = [hint - NUDGE, hint, hint + NUDGE].map((phase) => atPhase(offTime, (phase + PERIOD) % PERIOD));
      if (!before || !middle || !after) return atPhase(offTime, hint);
      const curvature = before.peak - 2 * middle.peak + after.peak;
      const shift = curvature < 0 ? (NUDGE * (before.peak - after.peak)) / (2 * curvature) : 0;
      const vertex = atPhase(offTime, (hint + Math.max(-2 * NUDGE, Math.min(2 * NUDGE, shift)) + PERIOD) % PERIOD);
      return [before, middle, after, vertex].reduce((a, b) => (b.peak > a.peak ? b : a));
    },
    atPhase,
  };
};

type Meter = ReturnType<typeof restartMeter>;

const highest = (points: readonly RestartPeak[]): RestartPeak => points.reduce((a, b) => (b.peak > a.peak ? b : a));

/** Share of the crest by which the bus may move before the angle is looked for again. */
const BUS_MOVED = 0.03;
const ANGLE_EVERY = 4;

/** Peaks at given off-times, from the longest down; the angle is followed, and looked for anew where the state has moved. */
const pointsAt = (trials: Trials, levels: Levels, soak: SoakState, meter: Meter, offTimes: readonly number[]): RestartPeak[] => {
  const crest = trials.path(levels, 0).source.amplitude;
  const falling = [...offTimes].reverse();
  let hint = meter.searched(falling[0] ?? 1).phase;
  let [bus, contacts] = [NaN, ''];
  const points = falling.map((offTime, index) => {
    const state = restartState(trials, levels, soak, offTime);
    const held = state.contactsClosedFor.join();
    const same = Math.abs(state.busVoltage - bus) < BUS_MOVED * crest && held === contacts && index % ANGLE_EVERY !== 0;
    if (!same) [bus, contacts] = [state.busVoltage, held];
    const point = same ? meter.atPhase(offTime, hint) : meter.near(offTime, hint);
    hint = point.phase;
    return point;
  });
  return points.reverse();
};

const APART = 1.01;

/** Fills in between the neighbours of the highest point, twice. */
const refinedAround = (meter: Meter, points: RestartPeak[]): RestartPeak[] => {
  let all = points;
  for (let round = 0; round < 2; round += 1) {
    const top = highest(all);
    const index = all.indexOf(top);
    const neighbours = [all[index - 1], all[index + 1]].filter((one) => one !== undefined);
    const added = neighbours
      .filter(({ offTime }) => Math.max(offTime / top.offTime, top.offTime / offTime) > APART)
      .map((one) => meter.near(Math.sqrt(one.offTime * top.offTime), top.phase));
    all = [...all, ...added].sort((a, b) => a.offTime - b.offTime);
  }
  return all;
};

const EDGE_ROUNDS = 9;

/** The off-time at which the peak crosses the limit between two neighbours; the side that is within. */
const edgeBetween = (meter: Meter, within: RestartPeak, beyond: RestartPeak, limit: number): number => {
  let [inside, outside] = [within, beyond];
  for (let round = 0; round < EDGE_ROUNDS && Math.abs(outside.offTime / inside.offTime - 1) > 1e-3; round += 1) {
    const middle = meter.atPhase(Math.sqrt(inside.offTime * outside.offTime), outside.phase);
    if (middle.peak > limit) outside = middle;
    else inside = middle;
  }
  return inside.offTime;
};

/** The window of short dips within the limit, and the time from which every longer one is. */
const windowsOf = (meter: Meter, points: readonly RestartPeak[], limit: number | undefined) => {
  if (limit === undefined) return { shortDipsWithin: null, withinAfter: null };
  const beyond = points.map((point, index) => (point.peak > limit ? index : -1)).filter((index) => index >= 0);
  const [first, last] = [beyond[0], beyond.at(-1)];
  if (first === undefined || last === undefined) return { shortDipsWithin: points.at(-1)?.offTime ?? null, withinAfter: 0 };
  const [before, after] = [points[first - 1], points[last + 1]];
  return {
    shortDipsWithin: before ? edgeBetween(meter, before, points[first]!, limit) : 0,
    withinAfter: after ? edgeBetween(meter, after, points[last]!, limit) : null,
  };
};

const EVERY = 3;

/** The summits of the peak against off-time at one corner, highest first, on a coarse set of off-times. */
export const restartSummits = (trials: Trials, levels: Levels): RestartPeak[] => {
  const soak = soakState(trials, levels);
  const path = trials.path(levels, 0);
  const releases = path.elements.map(({ bypass }) => bypass?.releaseTime ?? 0);
  const offTimes = offTimesOf(path).filter((time, index) => index % EVERY === 0 || releases.some((one) => Math.abs(time / one - 1) < 1e-3));
  const points = pointsAt(trials, levels, soak, restartMeter(trials, levels, soak), offTimes);
  return points
    .filter(({ peak }, index) => peak >= (points[index - 1]?.peak ?? 0) && peak >= (points[index + 1]?.peak ?? 0))
    .sort((a, b) => b.peak - a.peak);
};

/** Peak against off-time at one corner: not monotonic, so every off-time is tried and the highest refined. */
export const restartCurve = (trials: Trials, levels: Levels, limit: number | undefined): { curve: RestartCurve; worst: RestartPeak } => {
  const soak = soakState(trials, levels);
  const meter = restartMeter(trials, levels, soak);
  const points = pointsAt(trials, levels, soak, meter, offTimesOf(trials.path(levels, 0)));
  const all = refinedAround(meter, points);
  const top = highest(all);
  const searched = meter.searched(top.offTime, top.phase);
  const worst = searched.peak > top.peak ? searched : top;
  return {
    worst,
    curve: {
      offTime: all.map((point) => point.offTime),
      peakCurrent: all.map((point) => (point === top ? worst.peak : point.peak)),
      worstOffTime: worst.offTime,
      ...windowsOf(meter, all, limit),
    },
  };
};
