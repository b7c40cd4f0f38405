import type { PathElement } from '../../simulation/circuit/path';
import { bValueLaw } from '../../simulation/laws/b-value';
import { fixedLaw } from '../../simulation/laws/fixed';
import { polymerPtcLaw } from '../../simulation/laws/polymer-ptc';
import { powerUp } from '../../simulation/run/power-up';
import { DoubledStep } from '../../simulation/solver/doubled-step';
import { directPath, element } from './paths';

const [VOLTS, FARADS, HEAT_CAPACITY, T0] = [325, 470e-6, 0.25, 298.15];
const ntc = bValueLaw(10, 3000);

const integral = (f: (x: number) => number, from: number, to: number, pieces = 20_000): number => {
  const h = (to - from) / pieces;
  let sum = 0;
  for (let k = 0; k < pieces; k += 1) sum += (h / 6) * (f(from + k * h) + 4 * f(from + (k + 0.5) * h) + f(from + (k + 1) * h));
  return sum;
};

const within = (value: number | null | undefined, expected: number, relative: number) => expect(Math.abs((value ?? NaN) / expected - 1)).toBeLessThan(relative);

/** A megavolt and a resistance to match next to the body, across a capacitor too small to tell: a constant current. */
const constantCurrent = (amperes: number, body: PathElement, duration: number, ambient = T0) => {
  const path = directPath(1e6, 1e-9, [body], { load: { kind: 'resistance', resistance: 1e6 / amperes }, ambient });
  return powerUp({ ...path, source: { ...path.source, resistance: 1e-3 }, bulk: { ...path.bulk, initialVoltage: 1e6 } }, { duration, waveformOnly: true }).run;
};

describe('a DC step into an NTC without heat loss', () => {
  // T(v) = T0 + (C/C_th)(V·v − v²/2) whatever R(T); t = ∫R·C/(V − v) dv; by algebra. Peak, time and I²t by quadrature.
  const temperature = (v: number) => T0 + (FARADS / HEAT_CAPACITY) * (VOLTS * v - (v * v) / 2);
  const resistance = (v: number) => ntc.resistance(temperature(v));
  const current = (v: number) => (VOLTS - v) / resistance(v);
  const { run } = powerUp(directPath(VOLTS, FARADS, [element(ntc, { kind: 'ntc', heatCapacity: HEAT_CAPACITY })]), { duration: 0.1, waveformOnly: true });

  it('has the peak and the time of the peak of the quadrature', () => {
    let peakAt = 0;
    for (let v = 0; v < VOLTS; v += 0.01) if (current(v) > current(peakAt)) peakAt = v;
    within(run.figures.peakCurrent, current(peakAt), 2e-4);
    within(run.figures.peakCurrentAt, integral((v) => (resistance(v) * FARADS) / (VOLTS - v), 0, peakAt), 5e-3);
  });

  it('has its charging time and its I²t', () => {
    within(run.figures.chargedAt, integral((v) => (resistance(v) * FARADS) / (VOLTS - v), 0, 0.98 * VOLTS), 5e-3);
    within(run.figures.chargeI2t, integral((v) => FARADS * current(v), 0, 0.98 * VOLTS), 5e-3);
    within(run.figures.totalI2t, integral((v) => FARADS * current(v), 0, VOLTS), 1e-3);
  });

  it('heats the body by ½CV² over its heat capacity', () => within(run.elements[0]!.finalTemperature - T0, 24.821875 / HEAT_CAPACITY, 1e-4));
});

describe('a body under constant current', () => {
  // t = (C_th/(I²R0))·e^(B/T0)·[T·e^(−B/T) − B·E1(B/T)] from 25 to 100 °C; by algebra: 0.130371400442 s for 0.5 J/K and 10 A.
  const seconds = 0.130371400442;

  it('without heat loss reaches 100 °C when the closed form says, by law and step alone', () => {
    const stepper = new DoubledStep(1, (slope, y) => { slope[0] = (10 ** 2 * ntc.resistance(y[0]!)) / 0.5; });
    const y = Float64Array.of(T0);
    for (let k = 0; k < 1000; k += 1) {
      stepper.take(y, (k * seconds) / 1000, seconds / 1000);
      y.set(stepper.end);
    }
    expect(Math.abs(y[0]! - 373.15)).toBeLessThan(1e-6);
  });

  it('does so through the engine', () => {
    const run = constantCurrent(10, element(ntc, { kind: 'ntc', heatCapacity: 0.5 }), seconds);
    expect(Math.abs(run.elements[0]!.finalTemperature - 373.15)).toBeLessThan(0.05);
  });

  // −(C_th/δ)·ln(1 − δΔT/(I²R)) by algebra: 0.05 J/K, 0.1 Ω, 10 mW/K, from 23 to 125 °C; hold current 3.193743885 A.
  it.each([[2, 1.438410362], [5, 0.204109973]])('with heat loss reaches the temperature of trip at %d times its hold current after %d s', (times, expected) => {
    const hold = Math.sqrt((0.01 * 102) / 0.1);
    expect(hold).toBeCloseTo(3.193743885, 8);
    const run = constantCurrent(times * hold, element(fixedLaw(0.1), { dissipation: 0.01, heatCapacity: 0.05 }), expected, 296.15);
    expect(Math.abs(run.elements[0]!.finalTemperature - 398.15)).toBeLessThan(0.1);
  });
});

describe('the static curve of an NTC', () => {
  // It turns over at T = (B/2)(1 − √(1 − 4T_a/B)), which exists for B ≥ 4T_a; Becker, Green & Pearson, 1946.
  const voltageAt = (b: number, amperes: number) => {
    const path = directPath(1e4, 1e-3, [element(bValueLaw(10, b), { kind: 'ntc', dissipation: 0.02, heatCapacity: 0.2 })], { load: { kind: 'resistance', resistance: 1e4 / amperes } });
    const { run } = powerUp({ ...path, source: { ...path.source, resistance: 0.01 }, bulk: { ...path.bulk, initialVoltage: 1e4 } }, { duration: 600 });
    const { steadyRmsCurrent, finalResistance } = run.elements[0]!;
    return steadyRmsCurrent! * finalResistance;
  };
  const currents = [0.1, 0.2, 0.4, 0.6, 0.9, 1.4, 2];

  it('turns over where B = 3000', () => {
    const volts = currents.map((amperes) => voltageAt(3000, amperes));
    expect(volts.indexOf(Math.max(...volts))).toBeGreaterThan(1);
    expect(volts[6]!).toBeLessThan(volts[3]!);
  });

  it('rises throughout where B = 1000', () => {
    const volts = currents.map((amperes) => voltageAt(1000, amperes));
    volts.slice(1).forEach((one, k) => expect(one).toBeGreaterThan(volts[k]!));
  });
});

describe('a polymer PTC', () => {
  const ptc = polymerPtcLaw(0.1, 1e5, 398.15, 6);

  it('rises symmetrically about its midpoint on a logarithmic scale, without end to end below or above', () => {
    for (const away of [2, 5, 12, 40]) {
      const product = ptc.resistance(398.15 - away) * ptc.resistance(398.15 + away);
      within(product, 0.1 * 1e5, 1e-9);
    }
    within(ptc.resistance(233.15), 0.1, 1e-6);
    within(ptc.resistance(600), 1e5, 1e-6);
  });

  it('has the slope that its values show, steepest at the midpoint', () => {
    const share = (t: number) => ptc.slope(t) / ptc.resistance(t);
    for (const t of [350, 390, 398.15, 410]) within(ptc.slope(t), (ptc.resistance(t + 1e-4) - ptc.resistance(t - 1e-4)) / 2e-4, 1e-5);
    expect(share(398.15)).toBeGreaterThan(Math.max(share(395), share(401)));
  });
});
