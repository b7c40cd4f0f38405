import { uniformFloat64 } from 'pure-rand/distribution/uniformFloat64';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';

import type { ResistanceLaw } from '../../simulation/circuit/path';
import { bValueLaw } from '../../simulation/laws/b-value';
import { fitBValue, fitSteinhartHart } from '../../simulation/laws/fit';
import { steinhartHartLaw } from '../../simulation/laws/steinhart-hart';

const SEED = 20_261_201;
const relative = (value: number, expected: number) => Math.abs(value / expected - 1);

/** A table every 5 K from −40 to 150 °C, each resistance off by up to `noise`, from a seed. */
const table = ({ resistance }: ResistanceLaw, noise: number) => {
  const random = xoroshiro128plus(SEED);
  return Array.from({ length: 39 }, (_, k) => 233.15 + 5 * k).map((temperature) => ({ temperature, resistance: resistance(temperature) * (1 + noise * (2 * uniformFloat64(random) - 1)) }));
};
const largest = (values: readonly number[]) => Math.max(...values.map(Math.abs));

// Tables made from the laws themselves (IEC 60539-1, from memory; Steinhart & Hart, 1968), so that the coefficients are known.
describe('fitting a table', () => {
  it('returns R25 and B of the table it was made from', () => {
    const { coefficients, residuals } = fitBValue(table(bValueLaw(10, 3000), 0));
    expect(relative(coefficients.r25, 10)).toBeLessThan(1e-9);
    expect(relative(coefficients.b, 3000)).toBeLessThan(1e-9);
    expect(largest(residuals)).toBeLessThan(1e-6);
  });

  it('returns A, B and C', () => {
    const { coefficients, residuals } = fitSteinhartHart(table(steinhartHartLaw(1.3e-3, 2.4e-4, 1e-7), 0));
    expect(relative(coefficients.a, 1.3e-3)).toBeLessThan(1e-7);
    expect(relative(coefficients.b, 2.4e-4)).toBeLessThan(1e-7);
    expect(relative(coefficients.c, 1e-7)).toBeLessThan(1e-5);
    expect(largest(residuals)).toBeLessThan(1e-6);
  });

  it('comes close to both where every resistance is off by up to 1 %, and says in kelvin what it misses', () => {
    const straight = fitBValue(table(bValueLaw(10, 3000), 0.01));
    expect(relative(straight.coefficients.r25, 10)).toBeLessThan(5e-3);
    expect(relative(straight.coefficients.b, 3000)).toBeLessThan(2e-3);
    // 1 % of resistance is 0.01·T²/B: 0.2 K at −40 °C, 0.6 K at 150 °C.
    expect(largest(straight.residuals)).toBeGreaterThan(0.1);
    expect(largest(straight.residuals)).toBeLessThan(1);
    const curved = fitSteinhartHart(table(steinhartHartLaw(1.3e-3, 2.4e-4, 1e-7), 0.01));
    expect(largest(curved.residuals)).toBeLessThan(1);
  });

  it('shows by its residuals that a B-value does not describe a curved table', () => {
    const points = table(steinhartHartLaw(1.3e-3, 2.4e-4, 1e-7), 0);
    expect(largest(fitBValue(points).residuals)).toBeGreaterThan(10 * largest(fitSteinhartHart(points).residuals) + 0.5);
  });
});
