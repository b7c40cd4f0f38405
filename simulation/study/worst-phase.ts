const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** Scans a half period and refines around the highest point; a bridge makes both half periods alike. */
export const COARSE_POINTS = 12;
const RESOLUTION = (0.4 * Math.PI) / 180;

const better = (a: number, b: number): boolean => a > b || Number.isNaN(b);

/**
 * The switch-on angle (rad, in [0, π)) at which `objective` is highest: a coarse scan, then a golden section
 * between the neighbours of its best point. `hint` replaces the scan by a bracket around a known good angle.
 */
export const worstPhase = (objective: (phase: number) => number, hint?: number): { phase: number; value: number } => {
  const step = Math.PI / COARSE_POINTS;
  let best = { phase: hint ?? 0, value: objective(hint ?? 0) };
  if (hint === undefined) {
    for (let index = 1; index < COARSE_POINTS; index += 1) {
      const value = objective(index * step);
      if (better(value, best.value)) best = { phase: index * step, value };
    }
  }
  return refine(objective, best, step);
};

const refine = (objective: (phase: number) => number, start: { phase: number; value: number }, reach: number) => {
  let best = start;
  const probe = (phase: number): number => {
    const value = objective(wrap(phase));
    if (better(value, best.value)) best = { phase: wrap(phase), value };
    return value;
  };
  let [low, high] = [start.phase - reach, start.phase + reach];
  let [left, right] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)];
  let [atLeft, atRight] = [probe(left), probe(right)];
  while (high - low > RESOLUTION) {
    if (atLeft >= atRight) {
      [high, right, atRight] = [right, left, atLeft];
      left = high - GOLDEN * (high - low);
      atLeft = probe(left);
    } else {
      [low, left, atLeft] = [left, right, atRight];
      right = low + GOLDEN * (high - low);
      atRight = probe(right);
    }
  }
  return best;
};

const wrap = (phase: number): number => ((phase % Math.PI) + Math.PI) % Math.PI;
