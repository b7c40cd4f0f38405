import type { PowerPath } from '../../../simulation/circuit/path';
import { bValueLaw } from '../../../simulation/laws/b-value';
import { CycleMap } from '../../../simulation/run/cycle-map';
import { powerUp } from '../../../simulation/run/power-up';
import { steadyCycle } from '../../../simulation/run/steady-cycle';
import { element, mainsPath, resistor } from '../../validation/paths';

const near = (value: number | null | undefined, expected: number, relative: number) => expect(Math.abs((value ?? NaN) / expected - 1)).toBeLessThan(relative);

const POWER = { kind: 'constant-power', power: 100, startVoltage: 250, stopVoltage: 175, startDelay: 0.06, rampTime: 0, clampVoltage: 97 } as const;
const loaded = (inductance: number, load: PowerPath['load'], elements: PowerPath['elements']): PowerPath => {
  const path = mainsPath(325, Math.PI / 2, 470e-6, elements, { load });
  return { ...path, source: { ...path.source, resistance: 0.35, inductance }, rectifier: { kind: 'bridge', forwardVoltage: 0.9, slopeResistance: 0.01 }, bulk: { ...path.bulk, esr: 0.1 } };
};

describe('the repeating line cycle', () => {
  it.each([
    ['no inductance, a resistive load', 0, { kind: 'resistance', resistance: 900 } as const, 2],
    ['100 µH, a converter', 100e-6, POWER, 1],
    ['5 mH, a converter', 5e-3, POWER, 0.5],
    ['no load at all but a bleeder of 20 kΩ', 100e-6, { kind: 'resistance', resistance: 20e3 } as const, 10],
  ])('is what a long run comes to: %s', (_name, inductance, load, ohms) => {
    const path = loaded(inductance, load, [resistor(ohms)]);
    const { run } = powerUp(path, { duration: 3.2, waveformOnly: true });
    const cycle = steadyCycle({ path, loadRuns: load.kind === 'constant-power', faulted: false, tolerance: 1e-6 }, ohms, 310)!;
    near(cycle.rms, run.figures.steadyRmsCurrent!, 2e-3);
    near(cycle.peak, run.figures.steadyPeakCurrent!, 1e-2);
    near(cycle.lowestBus, run.figures.finalBusLow!, 1e-3);
  });

  it('is the same from a guess far away', () => {
    const options = { path: loaded(100e-6, POWER, [resistor(1)]), loadRuns: true, faulted: false, tolerance: 1e-6 };
    near(steadyCycle(options, 1, 200)!.rms, steadyCycle(options, 1, 320)!.rms, 1e-3);
  });

  it('does not exist where the load asks for more than the path can give', () => {
    const options = { path: loaded(100e-6, { ...POWER, power: 5000 }, [resistor(100)]), loadRuns: true, faulted: false, tolerance: 1e-5 };
    expect(steadyCycle(options, 100, 310)?.lowestBus ?? 0).toBeLessThan(POWER.stopVoltage);
  });

  it('between the resistances it was solved at is interpolated to within 0.2 %', () => {
    const options = { path: loaded(100e-6, POWER, [resistor(1)]), loadRuns: true, faulted: false, tolerance: 1e-6 };
    const map = new CycleMap(options, 4, 310);
    map.at(4);
    for (const ohms of [4.9, 3.1, 1.3, 0.7]) near(map.at(ohms)!.rms, steadyCycle(options, ohms, 310)!.rms, 2e-3);
  });
});

describe('the soak', () => {
  const ntc = element(bValueLaw(10, 3000), { kind: 'ntc', dissipation: 0.017, heatCapacity: 0.11 });
  it.each([
    ['an NTC that warms for 20 s', loaded(100e-6, POWER, [ntc])],
    ['an NTC without inductance', loaded(0, { kind: 'resistance', resistance: 700 }, [ntc])],
    ['two elements of different pace', loaded(100e-6, POWER, [ntc, resistor(2, { dissipation: 0.02, heatCapacity: 0.4 })])],
  ])('ends where the whole waveform ends: %s', (_name, path) => {
    const [soaked, whole] = [powerUp(path, { duration: 20 }), powerUp(path, { duration: 20, waveformOnly: true })];
    expect(soaked.sides).toBeLessThan(whole.sides / 5);
    soaked.run.elements.forEach((figures, k) => {
      expect(Math.abs(figures.finalTemperature - whole.run.elements[k]!.finalTemperature)).toBeLessThan(0.1);
      near(figures.energy, whole.run.elements[k]!.energy, 1e-3);
    });
    near(soaked.run.figures.totalI2t, whole.run.figures.totalI2t!, 1e-3);
    near(soaked.run.figures.sourceEnergy, whole.run.figures.sourceEnergy!, 1e-3);
    near(soaked.run.figures.steadyRmsCurrent, whole.run.figures.steadyRmsCurrent!, 2e-3);
    near(soaked.run.figures.finalBusLow, whole.run.figures.finalBusLow!, 1e-3);
  });
});
