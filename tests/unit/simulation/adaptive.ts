import { DoubledStep, type Derivative } from '../../../simulation/solver/doubled-step';

/** Integrates with steps chosen by the error that step doubling estimates; the end alone. */
export const adaptive = (derivative: Derivative, from: readonly number[], t0: number, t1: number, tolerance: number): Float64Array => {
  const stepper = new DoubledStep(from.length, derivative);
  const y = Float64Array.from(from);
  const floor = new Float64Array(y.length).fill(1e-3);
  const origin = new Float64Array(y.length);
  let [t, h] = [t0, (t1 - t0) / 1000];
  while (t < t1) {
    h = Math.min(h, t1 - t);
    stepper.take(y, t, h);
    const error = stepper.error(floor, tolerance, origin);
    if (error <= 1) {
      stepper.extrapolate();
      y.set(stepper.end);
      t += h;
    }
    h *= Math.min(3, Math.max(0.2, 0.9 * Math.max(error, 1e-9) ** -0.2));
  }
  return y;
};

/** Slope of log(error) over log(step) by least squares. */
export const observedOrder = (steps: readonly number[], errors: readonly number[]): number => {
  const mean = (values: readonly number[]) => values.reduce((sum, one) => sum + one, 0) / values.length;
  const [x, z] = [steps.map(Math.log), errors.map(Math.log)];
  const [mx, mz] = [mean(x), mean(z)];
  return mean(x.map((one, k) => (one - mx) * (z[k]! - mz))) / mean(x.map((one) => (one - mx) ** 2));
};
