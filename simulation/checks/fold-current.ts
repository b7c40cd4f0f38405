import type { PathElement } from '../circuit/path';

type Body = Pick<PathElement, 'law' | 'dissipation'>;

export interface Fold {
  /** A rms */
  current: number;
  /** Body temperature at the fold, K. */
  temperature: number;
}

const STEP = 0.5;
const HIGHEST = 900;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Fold current: the largest I with a stable low-resistance balance I²·R(T) = δ·(T − T_a). It is the first maximum
 * of √(δ·(T − T_a)/R(T)) above the ambient (K); beyond it a body that warms needs less current to warm further.
 */
export const foldCurrent = ({ law, dissipation }: Body, ambient: number): Fold => {
  const balance = (temperature: number): number => Math.sqrt((dissipation * (temperature - ambient)) / law.resistance(temperature));
  let summit = ambient + STEP;
  while (summit < HIGHEST && balance(summit + STEP) > balance(summit)) summit += STEP;
  let [low, high] = [Math.max(ambient, summit - STEP), summit + STEP];
  while (high - low > 1e-6) {
    const [left, right] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)];
    if (balance(left) > balance(right)) high = right;
    else low = left;
  }
  const temperature = (low + high) / 2;
  return { current: balance(temperature), temperature };
};
