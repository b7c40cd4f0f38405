type Dense = (component: number, x: number) => number;
type Observer = (step: number, from: number, to: number, y: number[], dense?: Dense) => boolean;
/** What is used of the package; its own TypeScript does not pass our checks, so it is not imported as such. */
interface Odex {
  Outcome: { Converged: number };
  Solver: new (size: number) => { solve: (f: (x: number, y: number[]) => number[], x: number, y: number[], end: number, observe: Observer) => { y: number[]; outcome: number; xEnd: number } };
}
const { Outcome, Solver } = jest.requireActual<Odex>('odex');

/** Something that ends a leg where its value rises through zero. */
export interface Guard {
  value: (y: number[], t: number) => number;
  then: () => void;
}

export interface Leg {
  derivative: (y: number[], t: number) => number[];
  guards: readonly Guard[];
  from: number;
  to: number;
  longestStep: number;
  sample: (y: number[], t: number) => void;
}

const SAMPLES = 12;
const BISECTIONS = 45;

/** First instant in (a, b] at which the guard is above zero; the guard is not above it at `a`. */
const locate = ({ value }: Guard, state: (t: number) => number[], a: number, b: number): number => {
  let [low, high] = [a, b];
  for (let k = 0; k < BISECTIONS; k += 1) {
    const middle = (low + high) / 2;
    if (value(state(middle), middle) > 0) high = middle;
    else low = middle;
  }
  return high;
};

/**
 * Integrates to the first guard or to the end by extrapolation of the midpoint rule (Gragg, Bulirsch, Stoer; the code
 * of Hairer & Wanner as the package odex has it); guards are located on its dense output.
 */
export const followLeg = (y0: number[], leg: Leg): { y: number[]; t: number; met: Guard | null } => {
  const solver = new Solver(y0.length);
  Object.assign(solver, { denseOutput: true, maxSteps: 1e7, maxStepSize: Math.min(leg.longestStep, leg.to - leg.from), relativeTolerance: 1e-7, absoluteTolerance: 1e-8 });
  let found: { y: number[]; t: number; met: Guard } | null = null;
  let previous = { t: leg.from, y: y0 };
  const result = solver.solve((t, y) => leg.derivative(y, t), leg.from, y0, leg.to, (_step, from, to, end, dense) => {
    if (!dense) return true;
    const state = (t: number) => (t === to ? end : end.map((_, component) => dense(component, t)));
    for (let k = 1; k <= SAMPLES; k += 1) {
      const t = k === SAMPLES ? to : from + ((to - from) * k) / SAMPLES;
      const y = state(t);
      const last = previous;
      const passed = leg.guards.filter(({ value }) => value(last.y, last.t) <= 0 && value(y, t) > 0);
      const [first] = passed.map((met) => ({ met, t: locate(met, state, last.t, t) })).sort((one, other) => one.t - other.t);
      if (first) {
        found = { ...first, y: state(first.t) };
        leg.sample(found.y, found.t);
        return false;
      }
      leg.sample(y, t);
      previous = { t, y };
    }
    return true;
  });
  if (found) return found;
  if (result.outcome !== Outcome.Converged) throw new Error(`The independent integrator stopped at ${result.xEnd} s`);
  return { y: result.y, t: leg.to, met: null };
};
