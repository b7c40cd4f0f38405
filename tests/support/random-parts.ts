import fc, { type Arbitrary } from 'fast-check';

import type { PartInput } from '../../shared/model/part';

export type Span = readonly [low: number, high: number];
/** A quantity, mostly from its usual span, now and then from the whole one. */
export type Draw = (usual: Span, whole: Span) => Arbitrary<number>;

const tolerance = fc.constantFrom(0, 0.05, 0.2);
const KELVIN_AT_25 = 298.15;

const thermal = (draw: Draw) =>
  fc.oneof(
    fc.record({ dissipation: draw([5e-3, 0.06], [1e-4, 10]), timeConstant: draw([15, 200], [0.1, 1e4]) }),
    fc.record({ dissipation: draw([5e-3, 0.06], [1e-4, 10]), heatCapacity: draw([0.1, 6], [1e-3, 1e4]) }),
  );

const ratings = (draw: Draw) =>
  fc.record(
    {
      maximumTemperature: fc.constantFrom(423.15, 443.15, 473.15),
      steadyCurrent: fc.record({ current: draw([0.3, 8], [1e-3, 1000]), ambient: fc.constantFrom(298.15, 338.15) }),
      energy: fc.record({ energy: draw([5, 400], [1e-3, 1e6]), basis: fc.constantFrom('absorbed' as const, 'half-cv2-rms' as const, 'half-cv2-peak' as const, 'unknown' as const) }),
      capacitance: fc.record({ capacitance: draw([100e-6, 5e-3], [1e-8, 10]), voltage: fc.constantFrom(120, 240), voltageIs: fc.constantFrom('rms' as const, 'peak' as const) }),
    },
    { requiredKeys: [] },
  );

const byBValue = (draw: Draw) =>
  fc.record({
    law: fc.constant('b-value' as const),
    r25: fc.record({ nominal: draw([1, 120], [1e-2, 1e5]), tolerance }),
    b: fc.record({ nominal: draw([2500, 3600], [600, 7000]), tolerance: fc.constantFrom(0, 0.03) }),
  });

/** A falling table by a B-value, as a maker would print it. */
const byTable = (draw: Draw) =>
  fc.tuple(draw([1, 120], [1e-2, 1e5]), draw([2500, 3600], [1000, 5000]), tolerance).map(([r25, b, spread]) => ({
    law: 'table' as const,
    tolerance: spread,
    points: [-40, -20, 0, 25, 50, 75, 100, 125, 150, 175].map((celsius) => ({
      temperature: celsius + 273.15,
      resistance: r25 * Math.exp(b * (1 / (celsius + 273.15) - 1 / KELVIN_AT_25)),
    })),
  }));

/** Coefficients through R25 with the slope of a B-value, bent a little by C. */
const bySteinhartHart = (draw: Draw) =>
  fc.tuple(draw([1, 120], [0.1, 1e4]), draw([2500, 3600], [2000, 5000]), tolerance).map(([r25, b, spread]) => {
    const c = 1e-7;
    const logarithm = Math.log(r25);
    const slope = 1 / b - 3 * c * logarithm ** 2;
    return { law: 'steinhart-hart' as const, a: 1 / KELVIN_AT_25 - slope * logarithm - c * logarithm ** 3, b: slope, c, tolerance: spread };
  });

const ntc = (draw: Draw): Arbitrary<PartInput> =>
  fc.record({
    kind: fc.constant('ntc' as const),
    name: fc.constant('Generated NTC'),
    law: fc.oneof({ weight: 3, arbitrary: byBValue(draw) }, { weight: 1, arbitrary: byTable(draw) }, { weight: 1, arbitrary: bySteinhartHart(draw) }),
    thermal: thermal(draw),
    ratings: ratings(draw),
  });

const polymerPtc = (draw: Draw): Arbitrary<PartInput> =>
  fc.record({
    kind: fc.constant('polymer-ptc' as const),
    name: fc.constant('Generated polymer PTC'),
    law: fc.tuple(draw([0.02, 20], [1e-3, 1e3]), fc.constantFrom(0, 0.3), draw([1e4, 1e7], [200, 1e8]), draw([3, 8], [0.5, 30])).map(([nominal, spread, rise, width]) => ({
      law: 'sigmoid' as const,
      low: { nominal, tolerance: spread },
      high: Math.max(1, nominal * rise),
      midpoint: 273.15 + 122,
      width,
    })),
    thermal: thermal(draw),
    ratings: fc.record({ maximumVoltage: draw([16, 265], [1, 2000]), maximumCurrent: draw([3, 100], [0.01, 10e3]), maximumTemperature: fc.constant(433.15) }, { requiredKeys: [] }),
  });

const resistor = (draw: Draw): Arbitrary<PartInput> =>
  fc.record({
    kind: fc.constant('resistor' as const),
    name: fc.constant('Generated resistor'),
    law: fc.record({ law: fc.constant('fixed' as const), resistance: fc.record({ nominal: draw([1, 220], [1e-3, 1e5]), tolerance }) }),
    thermal: thermal(draw),
    ratings: ratings(draw),
  });

export const realisticParts = (draw: Draw): Arbitrary<PartInput> =>
  fc.oneof({ weight: 5, arbitrary: ntc(draw) }, { weight: 2, arbitrary: polymerPtc(draw) }, { weight: 2, arbitrary: resistor(draw) });
