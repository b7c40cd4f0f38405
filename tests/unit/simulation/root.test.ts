import { rootBetween } from '../../../simulation/solver/root';

describe('the root finder', () => {
  it.each<[string, (x: number) => number, number, number, number]>([
    ['a line', (x) => x - 0.3, 0, 1, 0.3],
    ['a falling cosine', Math.cos, 0, 3, Math.PI / 2],
    ['a cube, flat at its root', (x) => (x - 0.7) ** 3, 0, 1, 0.7],
    ['an exponential that false position alone crawls on', (x) => Math.exp(20 * x) - 2, -1, 1, Math.LN2 / 20],
    ['a jump', (x) => (x < 0.123456 ? -1 : 1), 0, 1, 0.123456],
  ])('finds the root of %s', (_name, f, low, high, expected) => {
    expect(Math.abs(rootBetween(f, low, high, 1e-12) - expected)).toBeLessThan(_name.startsWith('a cube') ? 1e-4 : 1e-9);
  });

  it('takes a root at either end', () => {
    expect(rootBetween((x) => x, 0, 1, 1e-12)).toBe(0);
    expect(Math.abs(rootBetween((x) => x - 1, 0, 1, 1e-12) - 1)).toBeLessThan(1e-9);
  });

  it('needs no more than 60 looks', () => {
    let looks = 0;
    rootBetween((x) => { looks += 1; return Math.atan(1e6 * (x - 0.1)); }, -1, 1, 1e-15);
    expect(looks).toBeLessThanOrEqual(62);
  });
});
