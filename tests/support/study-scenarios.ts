import { scenarioSchema, type Scenario, type ScenarioInput } from '../../shared/model/scenario';

/** Invented figures throughout; nothing here is a maker's part. */
const ntc = {
  kind: 'ntc',
  name: 'Demo limiter',
  law: { law: 'b-value', r25: '10 ±20 %', b: '3k ±3 %' },
  thermal: { dissipation: '17m', timeConstant: 65 },
  ratings: {
    maximumTemperature: '220 °C',
    steadyCurrent: { current: 4, ambient: '65 °C' },
    energy: { energy: 45, basis: 'absorbed' },
  },
} as const;

const mains: ScenarioInput = {
  name: '230 V supply with an NTC limiter',
  source: { kind: 'ac', voltage: '230 ±10 %', frequencies: [50], impedance: { resistance: { nominal: 0.35, min: 0.25, max: 0.45 }, inductance: '100u' } },
  fuse: { ratedCurrent: 6.3, deratedCurrent: 5, preArcing: [{ time: 0.01, i2t: 89 }], pulseFactor: 0.29, breakingCapacity: 1500 },
  limiter: [{ part: ntc }],
  rectifier: { kind: 'bridge', forwardVoltage: 0.9, slopeResistance: '20m', surge: { current: 210, pulseWidth: '10m', i2t: 180 } },
  bulk: { capacitance: '470u ±20 %', esr: { nominal: 0.15, min: 0.1, max: 0.2 }, bleeder: '100k' },
  load: { kind: 'constant-power', power: 100, startVoltage: 200, stopVoltage: 140, startDelay: '60m' },
  ambient: { nominal: '25 °C', min: '0 °C', max: '50 °C' },
  limits: { peakCurrent: 80 },
};

const bypass = { closes: { when: 'time', at: '300m' }, releaseTime: '180m', contactResistance: '8m', makingCurrent: 100 } as const;

const rail: ScenarioInput = {
  name: '24 V branch with a resettable fuse',
  source: { kind: 'dc', voltage: '24 ±5 %', impedance: { resistance: { nominal: 0.3, min: 0.2, max: 0.4 }, inductance: '2u' } },
  limiter: [
    {
      part: {
        kind: 'polymer-ptc',
        name: 'Demo resettable fuse',
        law: { law: 'sigmoid', low: { nominal: 0.12, min: 0.08, max: 0.16 }, high: '100k', midpoint: '125 °C', width: 4 },
        thermal: { dissipation: '12m', heatCapacity: 0.25 },
        ratings: { maximumVoltage: 60, maximumCurrent: 200 },
      },
    },
  ],
  rectifier: { kind: 'none' },
  bulk: { capacitance: '220u ±20 %', esr: '50m' },
  load: { kind: 'resistance', resistance: 24 },
  fault: { kind: 'resistance', at: 1, resistance: 1.5 },
  ambient: { nominal: '25 °C', min: '-20 °C', max: '60 °C' },
  duration: 60,
  limits: { peakCurrent: 150, timeToTrip: 10, voltageDrop: 0.5, steadyCurrent: 1.2 },
};

const parsed = (base: ScenarioInput, more: Partial<ScenarioInput>): Scenario => scenarioSchema.parse({ ...base, ...more });

export const mainsScenario = (more: Partial<ScenarioInput> = {}): Scenario => parsed(mains, more);
export const bypassScenario = (more: Partial<ScenarioInput> = {}): Scenario =>
  parsed(mains, { limiter: [{ part: ntc, bypass }], load: { kind: 'constant-power', power: 300, startVoltage: 250, stopVoltage: 175, startDelay: '60m' }, ...more });
export const railScenario = (more: Partial<ScenarioInput> = {}): Scenario => parsed(rail, more);

/** The limiter of the mains scenario with other figures. */
export const limiterWith = (more: { law?: object; ratings?: object }): ScenarioInput['limiter'] =>
  [{ part: { ...ntc, ...more } }] as ScenarioInput['limiter'];
