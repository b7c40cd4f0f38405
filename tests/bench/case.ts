import { scenarioSchema } from '../../shared/model/scenario';

/** The case that the engine's speed is stated for: 230 V, 470 µF, 100 W, 100 µH, 600 s; an invented limiter. */
export const BENCH_SCENARIO = scenarioSchema.parse({
  name: 'Bench case',
  source: { kind: 'ac', voltage: '230 V', frequencies: [50], phase: 90, impedance: { resistance: '0.35', inductance: '100u' } },
  limiter: [
    {
      part: {
        kind: 'ntc',
        name: 'Bench element',
        law: { law: 'b-value', r25: '10', b: '3k' },
        thermal: { dissipation: '17m', timeConstant: '65' },
      },
    },
  ],
  rectifier: { kind: 'bridge', forwardVoltage: '0.9', slopeResistance: '10m' },
  bulk: { capacitance: '470u', esr: '0.1', bleeder: '220k' },
  load: { kind: 'constant-power', power: '100', startVoltage: '250', stopVoltage: '175', startDelay: '60m' },
  ambient: '25 °C',
  duration: '600',
});
