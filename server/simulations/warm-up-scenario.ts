import { type Scenario, type ScenarioInput, scenarioSchema } from '../../shared/model/scenario';

const warmUp: ScenarioInput = {
  name: 'Warm-up',
  source: {
    kind: 'ac',
    voltage: { nominal: '230 V', tolerance: '10 %' },
    frequencies: ['50 Hz'],
    impedance: { resistance: '0R4', inductance: '100u' },
    programme: [{ at: 5, switch: 'off' }, { at: 7, switch: 'on' }],
  },
  limiter: [
    {
      part: {
        kind: 'ntc',
        name: 'Warm-up',
        law: { law: 'b-value', r25: '10 ±20 %', b: '3k' },
        thermal: { dissipation: '17m', timeConstant: 65 },
        ratings: { maximumTemperature: '170 °C' },
      },
      bypass: { closes: { when: 'time', at: '300m' }, releaseTime: '50m', contactResistance: '20m' },
    },
  ],
  rectifier: { kind: 'bridge', forwardVoltage: '0.8 V', slopeResistance: '20m' },
  bulk: { capacitance: '470u ±20 %', esr: '100m' },
  load: { kind: 'constant-power', power: 100, startVoltage: 200 },
  ambient: { nominal: '25 °C', min: '-10 °C', max: '60 °C' },
  duration: 10,
};

/** Invented; walks through the parts of the engine that most scenarios use. */
export const WARM_UP_SCENARIO: Scenario = scenarioSchema.parse(warmUp);
