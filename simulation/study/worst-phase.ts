/** Angle in rad, and the objective there. */
interface Probe {
  phase: number;
  value: number;
}

type Objective = (phase: number) => number;

const COARSE_POINTS = 12;
const STEP = Math.PI / COARSE_POINTS;
const RESOLUTION = (0.3 * Math.PI) / 180;
const REFINEMENTS = 6;

const wrap = (phase: number): number => ((phase % Math.PI) + Math.PI) % Math.PI;
const at = (objective: Objective, phase: number): Probe => ({ phase, value: objective(wrap(phase)) });
const higher = (a: Probe, b: Probe): Probe => (b.value > a.value ? b : a);

/** Between the neighbours of a best point: the vertex of the parabola through the three, or the middle of the wider side. */
const nextAngle = ([left, middle, right]: readonly [Probe, Probe, Probe]): number => {
  const [before, after] = [middle.value - left.value, middle.value - right.value];
  const [a, b] = [middle.phase - left.phase, right.phase - middle.phase];
  const wider = b > a ? middle.phase + 0.4 * b : middle.phase - 0.4 * a;
  const shift = (b * b * before - a * a * after) / (2 * (b * before + a * after));
  if (!Number.isFinite(shift) || shift <= -a || shift >= b || Math.abs(shift) < RESOLUTION / 2) return wider;
  return middle.phase + shift;
};

/** Successive parabolas inside a bracket whose middle is its highest point. */
const refine = (objective: Objective, bracket: readonly [Probe, Probe, Probe]): Probe => {
  let [left, middle, right] = bracket;
  for (let count = 0; count < REFINEMENTS && right.phase - left.phase > RESOLUTION; count += 1) {
    const wanted = nextAngle([left, middle, right]);
    const close = Math.abs(wanted - middle.phase) < 2 * RESOLUTION;
    const probe = at(objective, wanted);
    if (probe.value > middle.value) [left, middle, right] = probe.phase > middle.phase ? [middle, probe, right] : [left, probe, middle];
    else if (probe.phase > middle.phase) right = probe;
    else left = probe;
    if (close && count > 0) break;
  }
  return middle;
};

/** Walks from a known good angle until both neighbours are lower. */
const bracketAround = (objective: Objective, hint: number): readonly [Probe, Probe, Probe] => {
  let middle = at(objective, hint);
  let [left, right] = [at(objective, hint - STEP), at(objective, hint + STEP)];
  for (let count = 0; count < COARSE_POINTS && Math.max(left.value, right.value) > middle.value; count += 1) {
    if (left.value > right.value) [left, middle, right] = [at(objective, left.phase - STEP), left, middle];
    else [left, middle, right] = [middle, right, at(objective, right.phase + STEP)];
  }
  return [left, middle, right];
};

const scan = (objective: Objective): readonly [Probe, Probe, Probe] => {
  const probes = Array.from({ length: COARSE_POINTS }, (_, index) => at(objective, index * STEP));
  const best = probes.reduce(higher);
  const index = probes.indexOf(best);
  const neighbour = (offset: number): Probe => ({
    phase: best.phase + offset * STEP,
    value: probes[(index + offset + COARSE_POINTS) % COARSE_POINTS]?.value ?? -Infinity,
  });
  return [neighbour(-1), best, neighbour(1)];
};

/**
 * The switch-on angle (rad, in [0, π): a bridge makes both half periods alike) at which `objective` is highest:
 * a coarse scan, then parabolas between the neighbours of its best point. A `hint` from a similar case replaces
 * the scan by a walk uphill from there.
 */
export const worstPhase = (objective: Objective, hint?: number): Probe => {
  const { phase, value } = refine(objective, hint === undefined ? scan(objective) : bracketAround(objective, hint));
  return { phase: wrap(phase), value };
};
