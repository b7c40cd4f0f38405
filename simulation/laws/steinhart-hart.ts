import type { ResistanceLaw } from '../circuit/path';

/** ln R for 1/T = A + B·x + C·x³ with x = ln R, by Cardano; monotone where B and C are not negative. */
const logResistance = (a: number, b: number, c: number, inverse: number): number => {
  if (c === 0) return (inverse - a) / b;
  const p = b / c / 3;
  const q = (a - inverse) / c / 2;
  const root = Math.sqrt(q * q + p * p * p);
  return Math.cbrt(-q + root) - Math.cbrt(q + root);
};

/**
 * NTC by 1/T = A + B·ln R + C·(ln R)³; R in Ω, T in K. `scale` moves the whole R(T) by a tolerance.
 * Source: Steinhart & Hart, Deep-Sea Research 15 (1968) 497–503.
 */
export const steinhartHartLaw = (a: number, b: number, c: number, scale = 1): ResistanceLaw => {
  const resistance = (temperature: number) => scale * Math.exp(logResistance(a, b, c, 1 / temperature));
  return {
    resistance,
    slope: (temperature) => {
      const ohms = resistance(temperature);
      const x = Math.log(ohms / scale);
      return -ohms / (temperature ** 2 * (b + 3 * c * x * x));
    },
    temperature: (ohms) => {
      const x = Math.log(ohms / scale);
      const inverse = a + b * x + c * x ** 3;
      return inverse > 0 ? 1 / inverse : null;
    },
    valid: { min: 218.15, max: 523.15 },
  };
};

/** A, B and C through three points (K, Ω). Source: Steinhart & Hart, 1968; the linear system solved by divided differences. */
export const steinhartHartFromThree = (points: readonly [Point, Point, Point]): { a: number; b: number; c: number } => {
  const [[x1, y1], [x2, y2], [x3, y3]] = points.map(({ temperature, resistance }) => [Math.log(resistance), 1 / temperature]) as [Pair, Pair, Pair];
  const first = (y2 - y1) / (x2 - x1);
  const second = (y3 - y1) / (x3 - x1);
  const c = (second - first) / (x3 - x2) / (x1 + x2 + x3);
  const b = first - c * (x1 * x1 + x1 * x2 + x2 * x2);
  return { a: y1 - (b + x1 * x1 * c) * x1, b, c };
};

type Pair = [number, number];
interface Point {
  temperature: number;
  resistance: number;
}
