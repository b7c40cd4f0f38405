import { Circuit } from '../../../simulation/circuit/circuit';
import { Tally } from '../../../simulation/run/tally';
import { directPath, resistor } from '../../validation/paths';
import { observedOrder } from './adaptive';

const [volts, ohms, farads] = [100, 10, 1e-3];
const [tau, end] = [ohms * farads, 0.02];
/** v_C of a step into R–C; textbooks. */
const state = (t: number) => Float64Array.of(volts * -Math.expm1(-t / tau), 298.15, 0);

const tallied = (steps: number): Tally => {
  const circuit = new Circuit(directPath(volts, farads, [resistor(ohms)]));
  circuit.conduction = 1;
  const tally = new Tally(circuit);
  const h = end / steps;
  for (let k = 0; k < steps; k += 1) tally.add(h, state(k * h), state((k + 0.5) * h), state((k + 1) * h), k * h);
  return tally;
};

describe('running integrals', () => {
  const heat = ((volts ** 2 * farads) / 2) * -Math.expm1((-2 * end) / tau);
  const charge = volts * farads * -Math.expm1(-end / tau);

  it('give ∫i²dt, the heat of the element and the energy of the source of a step into R–C', () => {
    const tally = tallied(200);
    expect(tally.i2t).toBeCloseTo(heat / ohms, 8);
    expect(tally.body[0]).toBeCloseTo(heat, 8);
    expect(tally.dissipated).toBeCloseTo(heat, 8);
    expect(tally.source).toBeCloseTo(volts * charge, 8);
  });

  it('are of fourth order, as the rule of Simpson is', () => {
    const counts = [5, 10, 20, 40];
    const order = observedOrder(counts.map((count) => end / count), counts.map((count) => Math.abs(tallied(count).i2t - heat / ohms)));
    expect(order).toBeGreaterThan(3.8);
    expect(order).toBeLessThan(4.3);
  });
});
