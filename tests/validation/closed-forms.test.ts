import { bValueLaw } from '../../simulation/laws/b-value';
import { polymerPtcLaw } from '../../simulation/laws/polymer-ptc';
import { powerUp } from '../../simulation/run/power-up';
import { directPath, element, mainsPath, resistor } from './paths';

const within = (value: number | null | undefined, expected: number, relative: number) => {
  expect(value).toBeDefined();
  expect(Math.abs(value! / expected - 1)).toBeLessThan(relative);
};

describe('a DC step', () => {
  // RC: i = (V/R)·e^(−t/RC); textbooks.
  it('charges through a resistor by the exponential', () => {
    const { run } = powerUp(directPath(325, 470e-6, [resistor(10)]), { duration: 0.1, waveformOnly: true });
    within(run.figures.peakCurrent, 32.5, 1e-6);
    within(run.figures.pulseWidthHalf, 10 * 470e-6 * Math.LN2, 2e-3);
    within(run.figures.chargedAt, -10 * 470e-6 * Math.log(0.02), 2e-3);
    within(run.figures.totalI2t, (325 ** 2 * 470e-6) / (2 * 10), 1e-4);
  });

  // Series RLC, textbooks: 325 V, 470 µF, 100 µH, 0.5 Ω.
  it('rings through an inductance', () => {
    const path = directPath(325, 470e-6, []);
    const { run } = powerUp({ ...path, source: { ...path.source, resistance: 0.5, inductance: 100e-6 } }, { duration: 0.02, waveformOnly: true });
    within(run.figures.peakCurrent, 370.173862, 1e-3);
    within(run.figures.peakCurrentAt, 257.453457e-6, 5e-3);
    within(run.figures.highestBus, 367.851096, 1e-3);
  });

  // Critical resistance 2·√(L/C) of the series circuit: 0.922531208 Ω; textbooks.
  it.each([[0.9, true], [0.95, false]])('swings over with %d Ω: %s', (ohms, over) => {
    expect(2 * Math.sqrt(100e-6 / 470e-6)).toBeCloseTo(0.922531208, 8);
    const path = directPath(325, 470e-6, []);
    const { run } = powerUp({ ...path, source: { ...path.source, resistance: ohms, inductance: 100e-6 } }, { duration: 0.05, waveformOnly: true, tolerance: 1e-9 });
    expect(run.figures.highestBus! > 325 * (1 + 1e-8)).toBe(over);
  });

  // Only a DC step: the series resistance takes ½CV² whatever its value; textbooks, and by algebra for any R(T).
  it.each([0.1, 1, 10, 100])('loses ½CV² in %d Ω', (ohms) => {
    const { run } = powerUp(directPath(325, 470e-6, [resistor(ohms)]), { duration: 30 * ohms * 470e-6 + 0.02, waveformOnly: true });
    within(run.elements[0]?.energy, 24.821875, 1e-4);
  });

  it('loses ½CV² in any NTC, and heats it by that over its heat capacity', () => {
    const hot = element(bValueLaw(10, 3000), { kind: 'ntc', heatCapacity: 1 });
    const { run } = powerUp(directPath(325, 470e-6, [hot]), { duration: 0.2, waveformOnly: true });
    within(run.elements[0]?.energy, 24.821875, 1e-4);
    // T(v) = T0 + (C/C_th)·(V·v − v²/2) at v = V; by algebra.
    expect(run.elements[0]!.finalTemperature).toBeCloseTo(298.15 + 24.821875, 2);
  });

  // The peak is later than t = 0 where B·C·V²/(C_th·T0²)·(R/(R+R_s))² > 1; by algebra.
  it.each([
    [1.2, true],
    [0.8, false],
  ])('puts the peak later than switch-on where the criterion is %d', (criterion, later) => {
    const heatCapacity = (3000 * 470e-6 * 325 ** 2) / (298.15 ** 2 * criterion);
    const { run } = powerUp(directPath(325, 470e-6, [element(bValueLaw(10, 3000), { kind: 'ntc', heatCapacity })]), { duration: 0.1, waveformOnly: true });
    expect(run.figures.peakCurrentAt! > 1e-6).toBe(later);
  });

  it('follows T(v) at every instant of the trace', () => {
    const heatCapacity = 0.5;
    const { run } = powerUp(directPath(325, 470e-6, [element(bValueLaw(10, 3000), { kind: 'ntc', heatCapacity })]), { duration: 0.05, waveformOnly: true });
    const { bus, temperature } = run.traces.waveform;
    expect(bus.length).toBeGreaterThan(30);
    bus.forEach((v, k) => expect(Math.abs(temperature[0]![k]! - (298.15 + (470e-6 / heatCapacity) * (325 * v - v ** 2 / 2)))).toBeLessThan(0.02));
  });
});

describe('thermal balance', () => {
  // Static V–I curve of an NTC turns over at T = (B/2)(1 − √(1 − 4T_a/B)); Becker, Green & Pearson, 1946.
  it('has its turnover point at 62.569106 °C for 10 Ω, 3000 K, 20 mW/K', () => {
    const voltageAt = (current: number) => {
      const path = directPath(1e4, 1e-3, [element(bValueLaw(10, 3000), { kind: 'ntc', dissipation: 0.02, heatCapacity: 0.2 })], {
        load: { kind: 'resistance', resistance: 1e4 / current },
      });
      const { run } = powerUp({ ...path, source: { ...path.source, resistance: 0.01 }, bulk: { ...path.bulk, initialVoltage: 1e4 } }, { duration: 600 });
      const { steadyRmsCurrent, finalResistance, finalTemperature } = run.elements[0]!;
      return { voltage: steadyRmsCurrent! * finalResistance, temperature: finalTemperature };
    };
    const [below, at, above] = [0.46, 0.481326562, 0.5].map(voltageAt);
    expect(Math.abs(at!.temperature - 273.15 - 62.569106)).toBeLessThan(0.05);
    within(at!.voltage, 1.56106515, 1e-4);
    expect(at!.voltage).toBeGreaterThan(Math.max(below!.voltage, above!.voltage));
  });

  // Cooling by δ and C_th: 63.2 % after τ; IEC 60539-1, from memory.
  it('is approached by 63.2 % in one time constant', () => {
    const path = directPath(10, 1e-6, [element(bValueLaw(10, 3000), { dissipation: 0.02, heatCapacity: 0.02 * 30 })]);
    const { run } = powerUp(path, { duration: 30, start: { temperatures: [358.15], busVoltage: 10, contactsClosedFor: [null] } });
    expect(Math.abs(run.elements[0]!.finalTemperature - 273.15 - 47.072766)).toBeLessThan(0.02);
  });

  // A tripped PTC holds nearly constant power: twice the voltage, half the current within 5 %; common practice, by δ(T_sw − T_a).
  it('of a tripped PTC halves the current at twice the voltage', () => {
    const currentAt = (volts: number) => {
      const ptc = element(polymerPtcLaw(0.1, 1e6, 398.15, 3), { kind: 'polymer-ptc', dissipation: 0.01, heatCapacity: 0.05 });
      const path = directPath(volts, 100e-6, [ptc], { fault: { at: 0.5, resistance: 0.1 } });
      return powerUp({ ...path, source: { ...path.source, resistance: 0.05 } }, { duration: 60 }).run.figures.trippedCurrent!;
    };
    expect(Math.abs(currentAt(32) / currentAt(16) - 0.5)).toBeLessThan(0.025);
  });
});

describe('a sine closed at an angle', () => {
  // i through R–C from rest: i = A·[sin(ωt+φ+ψ)] + B·e^(−t/RC) with tan ψ = 1/(ωRC); textbooks. First pulse only.
  const [amplitude, ohms, farad, omega] = [325, 10, 470e-6, 2 * Math.PI * 50];
  const current = (phase: number, t: number) => {
    const impedance = Math.hypot(ohms, 1 / (omega * farad));
    const lead = Math.atan2(1 / (omega * farad), ohms);
    const steady = (time: number) => (amplitude / impedance) * Math.sin(omega * time + phase + lead);
    return steady(t) + ((amplitude * Math.sin(phase)) / ohms - steady(0)) * Math.exp(-t / (ohms * farad));
  };

  it.each([5, 20, 45, 60, 79.5, 90, 120, 150])('has at %d° the peak of the closed form', (degrees) => {
    const phase = (degrees * Math.PI) / 180;
    let expected = 0;
    for (let t = 0; t < 0.01; t += 1e-6) {
      const i = current(phase, t);
      if (i <= 0 && t > 0) break;
      expected = Math.max(expected, i);
    }
    const { run } = powerUp(mainsPath(amplitude, phase, farad, [resistor(ohms)]), { duration: 0.02, stopAt: 'first-pulse' });
    within(run.figures.peakCurrent, expected, 1e-3);
  });
});

describe('a capacitor-input filter', () => {
  // Limit ωCR → ∞: tan θ − θ = π·R_s/(n·R_L), V_dc/V_p = cos θ, n = 2 for full wave; Schade, Proc. IRE 31 (1943) treats the filter, the limit by algebra.
  it.each([0.01, 0.05])('reaches the limit of Schade’s curves at R_s/R_L = %d', (ratio) => {
    let theta = 0.5;
    for (let k = 0; k < 100; k += 1) theta -= (Math.tan(theta) - theta - (Math.PI * ratio) / 2) / Math.tan(theta) ** 2;
    const [load, farad] = [100, 0.05];
    const path = mainsPath(100, 0, farad, [resistor(ratio * load)], { load: { kind: 'resistance', resistance: load } });
    const { run } = powerUp({ ...path, bulk: { ...path.bulk, initialVoltage: 100 * Math.cos(theta) * 1.01 } }, { duration: 120 });
    within(run.figures.finalBusLow, 100 * Math.cos(theta), 2e-3);
  });
});
