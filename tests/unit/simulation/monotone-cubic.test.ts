import fc from 'fast-check';

import { monotoneCubic } from '../../../simulation/laws/monotone-cubic';

const step = fc.double({ min: 1e-3, max: 10, noNaN: true });
const points = fc.array(fc.tuple(step, fc.double({ min: -100, max: 100, noNaN: true })), { minLength: 2, maxLength: 20 }).map((rows) => {
  let at = 0;
  return { x: rows.map(([width]) => (at += width)), y: rows.map(([, value]) => value) };
});

describe('the monotone cubic', () => {
  it('passes its points and never leaves the band between two neighbours', () => {
    fc.assert(
      fc.property(points, ({ x, y }) => {
        const curve = monotoneCubic(x, y);
        x.forEach((at, k) => expect(Math.abs(curve.value(at) - y[k]!)).toBeLessThan(1e-9));
        for (let k = 1; k < x.length; k += 1) {
          const [low, high] = [Math.min(y[k - 1]!, y[k]!), Math.max(y[k - 1]!, y[k]!)];
          for (const share of [0.1, 0.3, 0.5, 0.7, 0.9]) {
            const value = curve.value(x[k - 1]! + share * (x[k]! - x[k - 1]!));
            expect(value).toBeGreaterThan(low - 1e-9);
            expect(value).toBeLessThan(high + 1e-9);
          }
        }
      }),
    );
  });

  it('has the slope that its values show, and runs on straight beyond its ends', () => {
    const curve = monotoneCubic([0, 1, 3, 4], [0, 2, 3, 7]);
    for (const at of [-2, 0.4, 1.7, 3.3, 6]) expect(curve.slope(at)).toBeCloseTo((curve.value(at + 1e-6) - curve.value(at - 1e-6)) / 2e-6, 6);
    expect(curve.slope(-1)).toBe(curve.slope(-5));
    expect(curve.value(6) - curve.value(5)).toBeCloseTo(curve.slope(5), 10);
  });
});
