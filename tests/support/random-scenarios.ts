import fc, { type Arbitrary } from 'fast-check';

import type { PartInput } from '../../shared/model/part';
import type { ScenarioInput } from '../../shared/model/scenario';
import { realisticParts, type Span } from './random-parts';

/** One in this many draws of a quantity comes from the schema's whole range, not the usual one. */
const USUAL_WEIGHT = 12;

const STEPS = 100_000;
/** Evenly over the logarithm, without the library's bias to ends and small floats; rounded to what a person would type. */
const logarithmic = ([low, high]: Span): Arbitrary<number> =>
  fc.noBias(fc.integer({ min: 0, max: STEPS })).map((step) => Math.min(high, Math.max(low, Number((low * (high / low) ** (step / STEPS)).toPrecision(4)))));

const share = (low: number, high: number): Arbitrary<number> => fc.noBias(fc.integer({ min: 0, max: 100 })).map((step) => low + ((high - low) * step) / 100);

const drawn = (usual: Span, whole: Span): Arbitrary<number> =>
  fc.oneof({ weight: USUAL_WEIGHT, arbitrary: logarithmic(usual) }, { weight: 1, arbitrary: logarithmic(whole) });

/** A value with a tolerance that keeps its band inside the whole range. */
const banded = (usual: Span, whole: Span, tolerances: number[]) =>
  fc.tuple(drawn(usual, whole), fc.constantFrom(...tolerances)).map(([nominal, tolerance]) => {
    const fits = nominal * (1 - tolerance) >= whole[0] && nominal * (1 + tolerance) <= whole[1];
    return { nominal, tolerance: fits ? tolerance : 0 };
  });

const orZero = (arbitrary: Arbitrary<number>) => fc.oneof({ weight: 4, arbitrary }, { weight: 1, arbitrary: fc.constant(0) });

const impedance = fc.oneof(
  { weight: 3, arbitrary: fc.record({ resistance: banded([0.02, 2], [1e-3, 1e4], [0, 0.3]), inductance: orZero(drawn([1e-6, 2e-3], [1e-9, 10e-3])) }) },
  { weight: 1, arbitrary: fc.record({ prospectiveCurrent: banded([50, 6000], [1, 200e3], [0, 0.4]), reactanceRatio: orZero(drawn([0.1, 5], [0.01, 50])) }) },
);

/** Off and on again, in the order of time and before the end. */
const programme = (duration: number) =>
  fc.uniqueArray(fc.integer({ min: 1, max: 19 }), { maxLength: 4 }).map((shares) =>
    shares.sort((one, other) => one - other).map((share, index) => ({ at: (share / 20) * duration, switch: index % 2 === 0 ? ('off' as const) : ('on' as const) })),
  );

const acSource = (duration: number) =>
  fc.record({
    kind: fc.constant('ac' as const),
    voltage: banded([90, 260], [1, 1000], [0, 0.1, 0.15]),
    frequencies: fc.constantFrom<number[]>([50], [60], [50, 60], [400], [16.7], [1000], [10]),
    phase: fc.oneof({ weight: 2, arbitrary: fc.constant('worst' as const) }, { weight: 1, arbitrary: fc.integer({ min: 0, max: 360 }) }),
    impedance,
    programme: fc.oneof({ weight: 3, arbitrary: fc.constant<{ at: number; switch: 'off' | 'on' }[]>([]) }, { weight: 1, arbitrary: programme(duration) }),
  });

const dcSource = (duration: number) =>
  fc.record({
    kind: fc.constant('dc' as const),
    voltage: banded([5, 400], [0.5, 1500], [0, 0.05]),
    impedance,
    programme: fc.oneof({ weight: 3, arbitrary: fc.constant<{ at: number; switch: 'off' | 'on' }[]>([]) }, { weight: 1, arbitrary: programme(duration) }),
  });

const closing = fc.oneof(
  fc.record({ when: fc.constant('time' as const), at: drawn([0.02, 2], [1e-4, 3600]) }),
  fc.record({ when: fc.constant('bus-voltage' as const), above: drawn([5, 350], [0.1, 1500]) }),
);

const bypass = fc.record(
  {
    closes: closing,
    releaseTime: orZero(drawn([5e-3, 0.5], [1e-4, 60])),
    contactResistance: drawn([1e-3, 0.05], [1e-5, 10]),
    makingCurrent: drawn([5, 200], [0.1, 10e3]),
    behaviour: fc.oneof({ weight: 6, arbitrary: fc.constant('works' as const) }, { weight: 1, arbitrary: fc.constantFrom('never-closes' as const, 'welded' as const) }),
  },
  { requiredKeys: ['closes', 'releaseTime', 'contactResistance'] },
);

const element = (part: Arbitrary<PartInput>) =>
  fc.record({ part, bypass: fc.oneof({ weight: 2, arbitrary: fc.constant(undefined) }, { weight: 1, arbitrary: bypass }) });

const rectifier = fc.record({
  kind: fc.constant('bridge' as const),
  forwardVoltage: orZero(drawn([0.4, 1.2], [1e-3, 5])),
  slopeResistance: orZero(drawn([5e-3, 0.1], [1e-5, 10])),
  surge: fc.option(fc.record({ current: drawn([30, 500], [0.1, 100e3]), pulseWidth: drawn([5e-3, 0.01], [1e-4, 0.02]) }), { nil: undefined }),
});

const bulk = fc.record(
  {
    capacitance: banded([22e-6, 2.2e-3], [1e-7, 10], [0, 0.2]),
    esr: orZero(drawn([0.01, 1], [1e-5, 100])),
    initialVoltage: orZero(drawn([1, 200], [1e-3, 1500])),
    bleeder: drawn([10e3, 1e6], [1, 1e9]),
    atLowAmbient: fc.record({ capacitanceFactor: drawn([0.3, 1], [0.05, 1]), esrFactor: drawn([1, 20], [1, 100]) }),
  },
  { requiredKeys: ['capacitance', 'esr'] },
);

/** Power and thresholds that belong to the supply's crest, so that most loads start. */
const load = (crest: number) =>
  fc.oneof(
    {
      weight: 4,
      arbitrary: fc
        .record({ power: drawn([2, 500], [1e-3, 100e3]), start: share(0.3, 1.1), stop: fc.option(share(0.3, 0.95), { nil: undefined }), startDelay: orZero(drawn([0.01, 0.5], [1e-4, 60])), rampTime: orZero(drawn([1e-3, 0.1], [1e-4, 60])) })
        .map(({ start, stop, ...rest }) => {
          const startVoltage = Math.min(1500, Math.max(0.2, Number((start * crest).toPrecision(4))));
          return { kind: 'constant-power' as const, startVoltage, ...(stop !== undefined && { stopVoltage: startVoltage * stop }), ...rest };
        }),
    },
    { weight: 2, arbitrary: fc.record({ kind: fc.constant('resistance' as const), resistance: drawn([20, 5000], [1e-3, 1e9]) }) },
    { weight: 1, arbitrary: fc.constant({ kind: 'none' as const }) },
  );

const fault = (duration: number) =>
  fc.record({ kind: fc.constant('resistance' as const), at: fc.integer({ min: 0, max: 18 }).map((share) => (share / 20) * duration), resistance: drawn([0.05, 50], [1e-4, 1e6]) });

const ambient = fc.tuple(fc.integer({ min: -40, max: 85 }), fc.constantFrom(0, 15, 40)).map(([celsius, halfWidth]) => ({ nominal: celsius + 273.15, tolerance: halfWidth }));

const limits = fc.record(
  { peakCurrent: drawn([10, 200], [0.01, 100e3]), limiterLoss: drawn([0.5, 10], [1e-3, 1e4]), timeToTrip: drawn([0.5, 20], [1e-3, 3600]), voltageDrop: drawn([0.05, 2], [1e-3, 100]), steadyCurrent: drawn([0.1, 5], [1e-3, 1000]) },
  { requiredKeys: [] },
);

const scenarioOn = (kind: 'ac' | 'dc', duration: number): Arbitrary<ScenarioInput> =>
  (kind === 'ac' ? acSource(duration) : dcSource(duration)).chain((source) => {
    const crest = source.voltage.nominal * (source.kind === 'ac' ? Math.SQRT2 : 1);
    return fc.record(
      {
        name: fc.constant(`Generated, ${kind}`),
        source: fc.constant(source),
        limiter: fc.array(element(realisticParts(drawn)), { maxLength: 2 }),
        rectifier: source.kind === 'ac' ? rectifier : fc.oneof(rectifier, fc.constant({ kind: 'none' as const })),
        bulk,
        load: load(crest),
        fault: fc.oneof({ weight: 5, arbitrary: fc.constant(undefined) }, { weight: 1, arbitrary: fault(duration) }),
        ambient,
        duration: fc.constant(duration),
        limits,
      },
      { requiredKeys: ['name', 'source', 'limiter', 'rectifier', 'bulk', 'load', 'ambient', 'duration'] },
    );
  });

/** Valid scenarios over the whole range of the schema, mostly such as a designer would enter. */
export const anyScenario: Arbitrary<ScenarioInput> = fc
  .tuple(fc.constantFrom('ac' as const, 'ac' as const, 'ac' as const, 'dc' as const), fc.oneof({ weight: 3, arbitrary: fc.constantFrom(0.02, 0.5, 5, 60, 600) }, { weight: 1, arbitrary: logarithmic([0.02, 3600]) }))
  .chain(([kind, duration]) => scenarioOn(kind, duration));

/** The same scenarios for the same seed, on any machine. */
export const randomScenarios = (count: number, seed: number): ScenarioInput[] => fc.sample(anyScenario, { numRuns: count, seed });
