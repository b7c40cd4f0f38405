import { DoubledStep, type Derivative } from '../../../simulation/solver/doubled-step';
import { adaptive, observedOrder } from './adaptive';

/** y′ = y·cos t: y = e^(sin t). */
const swinging: Derivative = (slope, y, t) => {
  slope[0] = y[0]! * Math.cos(t);
};

const fixedSteps = (count: number, end: number, extrapolated: boolean): number => {
  const stepper = new DoubledStep(1, swinging);
  const y = Float64Array.of(1);
  const h = end / count;
  for (let k = 0; k < count; k += 1) {
    if (extrapolated) {
      stepper.take(y, k * h, h);
      stepper.extrapolate();
      y.set(stepper.end);
    } else y.set(stepper.single(y, k * h, h));
  }
  return y[0]!;
};

describe('the Runge–Kutta step', () => {
  const counts = [40, 80, 160, 320];
  const errors = (extrapolated: boolean) => counts.map((count) => Math.abs(fixedSteps(count, 5, extrapolated) - Math.exp(Math.sin(5))));
  const steps = counts.map((count) => 5 / count);

  it('is of fourth order', () => {
    expect(observedOrder(steps, errors(false))).toBeGreaterThan(3.85);
    expect(observedOrder(steps, errors(false))).toBeLessThan(4.4);
  });

  it('is of fifth order where the two halves extrapolate the whole', () => {
    expect(observedOrder(steps, errors(true))).toBeGreaterThan(4.7);
    expect(observedOrder(steps, errors(true))).toBeLessThan(5.6);
  });

  it('estimates its error: the true one is nowhere much above the estimate, and extrapolation lowers it', () => {
    const stepper = new DoubledStep(1, swinging);
    const looks = Array.from({ length: 60 }, (_, k) => {
      const t = k / 10;
      const exact = Math.exp(Math.sin(t + 0.1));
      stepper.take(Float64Array.of(Math.exp(Math.sin(t))), t, 0.1);
      const estimate = stepper.error(Float64Array.of(1), 1, stepper.end);
      const error = Math.abs(stepper.end[0]! - exact);
      stepper.extrapolate();
      return { estimate, error, extrapolated: Math.abs(stepper.end[0]! - exact) };
    });
    const largest = Math.max(...looks.map(({ estimate }) => estimate));
    // Where the leading term of the error passes zero the next one remains, of a higher order in the step.
    for (const { estimate, error } of looks) expect(error).toBeLessThan(1.2 * estimate + 0.1 * largest);
    const sum = (pick: (look: (typeof looks)[number]) => number) => looks.reduce((total, look) => total + pick(look), 0);
    expect(sum(({ extrapolated }) => extrapolated)).toBeLessThan(sum(({ error }) => error) / 4);
  });

  it('counts what is no number as an error without bound', () => {
    const stepper = new DoubledStep(1, (slope) => slope.fill(NaN));
    stepper.take(Float64Array.of(1), 0, 0.1);
    expect(stepper.error(Float64Array.of(1), 1, Float64Array.of(0))).toBe(Infinity);
  });

  it('leaves the state that it starts from as it is', () => {
    const y = Float64Array.of(1);
    new DoubledStep(1, swinging).take(y, 0, 0.5);
    expect(y[0]).toBe(1);
  });
});

describe('known problems', () => {
  // Hull, Enright, Fellen & Sedgwick, SIAM J. Numer. Anal. 9 (1972) 603–637, problems A1 to A4 at t = 20.
  it.each<[string, Derivative, number, number]>([
    ['A1', (slope, y) => { slope[0] = -y[0]!; }, 1, 2.061153622e-9],
    ['A2', (slope, y) => { slope[0] = -(y[0]! ** 3) / 2; }, 1, 0.2182178902],
    ['A3', swinging, 1, 2.491650272],
    ['A4', (slope, y) => { slope[0] = (y[0]! / 4) * (1 - y[0]! / 20); }, 1, 17.73016648131483],
  ])('%s ends where it should', (_name, derivative, start, expected) => {
    const [end] = adaptive(derivative, [start], 0, 20, 1e-11);
    expect(Math.abs(end! - expected)).toBeLessThan(1e-8 * expected + 1e-13);
  });

  // Hairer, Nørsett & Wanner, Solving Ordinary Differential Equations I, II.0: the orbit of Arenstorf.
  it('the orbit of Arenstorf closes', () => {
    const mu = 0.012277471;
    const orbit: Derivative = (slope, y) => {
      const [x, z, vx, vz] = [y[0]!, y[1]!, y[2]!, y[3]!];
      const [earth, moon] = [((x + mu) ** 2 + z ** 2) ** 1.5, ((x - 1 + mu) ** 2 + z ** 2) ** 1.5];
      slope[0] = vx;
      slope[1] = vz;
      slope[2] = x + 2 * vz - ((1 - mu) * (x + mu)) / earth - (mu * (x - 1 + mu)) / moon;
      slope[3] = z - 2 * vx - ((1 - mu) * z) / earth - (mu * z) / moon;
    };
    const start = [0.994, 0, 0, -2.00158510637908252];
    const end = adaptive(orbit, start, 0, 17.0652165601579626, 1e-12);
    expect(Math.hypot(end[0]! - start[0]!, end[1]! - start[1]!)).toBeLessThan(1e-4);
  });
});
