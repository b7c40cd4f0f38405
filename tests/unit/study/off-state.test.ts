import type { PathElement, PathLoad } from '../../../simulation/circuit/path';
import { cooled, dischargedBus } from '../../../simulation/study/off-state';

const converter: PathLoad = {
  kind: 'constant-power', power: 100, startVoltage: 250, stopVoltage: 60, startDelay: 0, rampTime: 0, clampVoltage: 90,
};

type Converter = Extract<PathLoad, { kind: 'constant-power' }>;
type Bulk = { capacitance: number; bleeder: number | null };

/** Independent of the closed form: C dv/dt = −draw(v) by many small midpoint steps. */
const byIntegration = (load: Converter, bulk: Bulk, from: number, time: number): number => {
  const steps = 100_000;
  let [v, runs] = [from, true];
  const slope = (at: number) => {
    const drawn = runs ? load.power / Math.max(at, load.clampVoltage) : 0;
    return -(drawn + (bulk.bleeder === null ? 0 : at / bulk.bleeder)) / bulk.capacitance;
  };
  for (let index = 0; index < steps; index += 1) {
    v += (time / steps) * slope(v + (time / steps / 2) * slope(v));
    runs = runs && v > load.stopVoltage;
  }
  return v;
};

describe('a bus without supply', () => {
  const bulk = { capacitance: 470e-6, bleeder: 47e3 };

  it('gives constant power until the load stops, then runs down its bleeder', () => {
    for (const time of [0.02, 0.1, 0.2, 0.24, 0.3, 5]) {
      expect(Math.abs(dischargedBus(bulk, converter, true, 320, time) - byIntegration(converter, bulk, 320, time))).toBeLessThan(0.2);
    }
  });

  it('without a bleeder loses P·t of its ½CV²', () => {
    const left = dischargedBus({ capacitance: 470e-6, bleeder: null }, converter, true, 320, 0.1);
    expect(0.5 * 470e-6 * (320 ** 2 - left ** 2)).toBeCloseTo(10, 9);
  });

  it('without a bleeder stays where the load stopped', () => {
    expect(dischargedBus({ capacitance: 470e-6, bleeder: null }, converter, true, 320, 60)).toBeCloseTo(60, 9);
  });

  it('is not drawn on by a load that does not run', () => {
    expect(dischargedBus(bulk, converter, false, 320, 10)).toBeCloseTo(320 * Math.exp(-10 / (47e3 * 470e-6)), 9);
  });

  it('runs down exponentially into resistances', () => {
    const load: PathLoad = { kind: 'resistance', resistance: 1000 };
    const parallel = 1 / (1 / 1000 + 1 / 47e3);
    expect(dischargedBus(bulk, load, true, 320, 0.3)).toBeCloseTo(320 * Math.exp(-0.3 / (parallel * 470e-6)), 9);
  });
});

describe('a body without current', () => {
  it('cools to 1/e of its rise in one time constant', () => {
    // IEC 60539-1 (from memory): τ at 63.2 %; 85 → 25 °C reaches 47.072766 °C after τ.
    const element = { dissipation: 0.02, heatCapacity: 1.2 } as PathElement;
    expect(cooled(element, 358.15, 298.15, 60) - 273.15).toBeCloseTo(47.072766, 5);
  });
});
