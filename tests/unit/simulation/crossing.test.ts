import { earliestCrossing, type Watch } from '../../../simulation/run/crossing';
import { DoubledStep } from '../../../simulation/solver/doubled-step';

/** A harmonic oscillator: y₀ = sin t, y₁ = cos t. */
const step = (t: number, h: number) => {
  const stepper = new DoubledStep(2, (slope, y) => { [slope[0], slope[1]] = [y[1]!, -y[0]!]; });
  const before = Float64Array.of(Math.sin(t), Math.cos(t));
  stepper.take(before, t, h);
  return { stepper, before, t, h };
};

const watch = (value: Watch['value'], rising: boolean, apply = () => undefined as void): Watch => ({ value, rising, apply });

describe('events', () => {
  it('are located to a fraction of the error of the step, in the direction asked for', () => {
    const falling = earliestCrossing([watch((y) => y[0]! - 0.5, false)], step(2.5, 0.2));
    expect(Math.abs(2.5 + falling!.at - (5 * Math.PI) / 6)).toBeLessThan(1e-6);
    expect(earliestCrossing([watch((y) => y[0]! - 0.5, true)], step(2.5, 0.2))).toBeNull();
  });

  it('are found in the first half of a step as in the second', () => {
    const at = (level: number) => earliestCrossing([watch((y) => y[0]! - level, true)], step(0, 0.2))!.at;
    expect(at(Math.sin(0.03))).toBeCloseTo(0.03, 6);
    expect(at(Math.sin(0.17))).toBeCloseTo(0.17, 5);
  });

  it('come earliest first, and all of one instant together', () => {
    const done: string[] = [];
    const named = (name: string, level: number) => watch((y) => y[0]! - level, true, () => void done.push(name));
    const found = earliestCrossing([named('late', 0.15), named('one', 0.1), named('other', 0.1)], step(0, 0.2))!;
    found.all.forEach((apply) => apply());
    expect(done).toEqual(['one', 'other']);
    expect(found.at).toBeCloseTo(Math.asin(0.1), 6);
  });

  it('that stand at zero when the step begins are found where they come back, not at the begin', () => {
    const hump = watch((_y, t) => Math.sin(Math.PI * t) * (0.75 - t), false);
    const found = earliestCrossing([hump], step(0, 1));
    expect(found!.at).toBeCloseTo(0.75, 5);
    expect(earliestCrossing([watch((y) => y[0]!, false)], step(0, 0.2))).toBeNull();
  });

  it('that do not happen are not found, and none asked for is none', () => {
    expect(earliestCrossing([watch((y) => y[0]! - 2, true)], step(0, 0.5))).toBeNull();
    expect(earliestCrossing([], step(0, 0.5))).toBeNull();
  });

  it('at an exact time of the line are located to a nanosecond', () => {
    const omega = 100 * Math.PI;
    const found = earliestCrossing([watch((_y, t) => Math.sin(omega * t), false)], step(0.0097, 0.0005));
    expect(Math.abs(0.0097 + found!.at - 0.01)).toBeLessThan(1e-9);
  });
});
