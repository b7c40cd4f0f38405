import rk4 from 'ode-rk4';

/** Fills `dydt` with the derivative of `y` at time `t`. */
export type Derivative = (dydt: Float64Array, y: Float64Array, t: number) => void;

/** For a handful of numbers a loop is several times faster than `set`. */
const copy = (from: Float64Array, to: Float64Array): void => {
  for (let k = 0; k < to.length; k += 1) to[k] = from[k]!;
};

/**
 * One fourth-order Runge–Kutta step taken whole and once more in two halves; the difference estimates the error
 * (step doubling: E ≈ (y_halves − y_whole)/15) and is used to extrapolate the end to fifth order.
 */
export class DoubledStep {
  readonly middle: Float64Array;
  readonly end: Float64Array;
  private readonly whole: Float64Array;
  private readonly stepper;

  constructor(
    private readonly size: number,
    derivative: Derivative,
  ) {
    this.middle = new Float64Array(size);
    this.end = new Float64Array(size);
    this.whole = new Float64Array(size);
    this.stepper = rk4(new Float64Array(size), derivative, 0, 0);
  }

  take(from: Float64Array, t: number, h: number): void {
    const { stepper, whole, middle, end } = this;
    copy(from, stepper.y);
    stepper.t = t;
    stepper.dt = h;
    stepper.step();
    copy(stepper.y, whole);
    copy(from, stepper.y);
    stepper.t = t;
    stepper.dt = h / 2;
    stepper.step();
    copy(stepper.y, middle);
    stepper.step();
    copy(stepper.y, end);
  }

  /** One whole step alone, for locating an event inside a step already accepted; overwritten by the next call. */
  single(from: Float64Array, t: number, h: number): Float64Array {
    const { stepper } = this;
    copy(from, stepper.y);
    stepper.t = t;
    stepper.dt = h;
    stepper.step();
    return stepper.y;
  }

  /** Largest error over its allowance `tolerance·(floor + |y − origin|)`; below 1 the step is good. NaN counts as infinite. */
  error(floor: Float64Array, tolerance: number, origin: Float64Array): number {
    let worst = 0;
    for (let k = 0; k < this.size; k += 1) {
      const difference = Math.abs(this.end[k]! - this.whole[k]!) / 15;
      const allowed = tolerance * (floor[k]! + Math.abs(this.end[k]! - origin[k]!));
      const share = difference / allowed;
      if (!(share <= worst)) worst = share;
    }
    return Number.isNaN(worst) ? Infinity : worst;
  }

  /** Adds the error estimate to the end: local extrapolation. */
  extrapolate(): void {
    for (let k = 0; k < this.size; k += 1) this.end[k]! += (this.end[k]! - this.whole[k]!) / 15;
  }
}
