import type { DoubledStep } from '../solver/doubled-step';
import { rootBetween } from '../solver/root';

/** Something that happens where a value passes zero in the given direction. */
export interface Watch {
  value: (y: Float64Array, t: number) => number;
  rising: boolean;
  apply: () => void;
}

/** A step that was just taken from `before` at `t` over `h`, still to be accepted. */
export interface TakenStep {
  stepper: DoubledStep;
  before: Float64Array;
  t: number;
  h: number;
}

/** Watches that pass zero within a step at one instant, `at` seconds from its begin. */
export interface Crossing {
  at: number;
  all: (() => void)[];
  /** Right-hand sides that it took to locate them. */
  sides: number;
}

/** s; two instants closer than this are one. */
export const INSTANT = 1e-12;
const SIDES_PER_TRY = 4;

/** The half of the step in which a watch passes zero, or null. */
const bracketOf = ({ value, rising }: Watch, { stepper, before, t, h }: TakenStep): { low: number; high: number } | null => {
  const sign = rising ? 1 : -1;
  const start = sign * value(before, t);
  const middle = sign * value(stepper.middle, t + h / 2);
  // A current that has just begun is zero: it may rise first and end within the step.
  if (start > 0 || (start === 0 && middle >= 0)) return null;
  if (middle >= 0) return { low: 0, high: h / 2 };
  return sign * value(stepper.end, t + h) >= 0 ? { low: h / 2, high: h } : null;
};

/** The earliest instant in a step at which watches pass zero; null where none does. */
export const earliestCrossing = (watches: readonly Watch[], step: TakenStep): Crossing | null => {
  const { stepper, before, t } = step;
  const brackets: { watch: Watch; low: number; high: number }[] = [];
  for (const watch of watches) {
    const bracket = bracketOf(watch, step);
    if (bracket) brackets.push({ watch, ...bracket });
  }
  if (brackets.length === 0) return null;
  let sides = 0;
  const roots = brackets.map(({ watch: { value, apply }, low, high }) => {
    const passes = (h: number): number => {
      if (h <= 0) return value(before, t);
      sides += SIDES_PER_TRY;
      return value(stepper.single(before, t, h), t + h);
    };
    return { apply, at: rootBetween(passes, low, high, Math.max(1e-13, 1e-8 * high)) };
  });
  const at = Math.min(...roots.map((one) => one.at));
  return { at, all: roots.filter((one) => one.at <= at + INSTANT).map(({ apply }) => apply), sides };
};
