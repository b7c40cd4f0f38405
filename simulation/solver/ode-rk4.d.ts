declare module 'ode-rk4' {
  interface Integrator {
    y: Float64Array;
    t: number;
    dt: number;
    step(): Integrator;
  }
  const integrator: (
    y0: Float64Array,
    derivative: (dydt: Float64Array, y: Float64Array, t: number) => void,
    t0: number,
    dt: number,
  ) => Integrator;
  export default integrator;
}
