import type { PartInput } from '../../shared/model/part';
import type { ScenarioInput } from '../../shared/model/scenario';

/** An invented part, written as an engineer would. */
export const samplePart = (more: Partial<PartInput> = {}): PartInput =>
  ({
    kind: 'ntc',
    name: 'Aldersyke Heron',
    law: { law: 'b-value', r25: '10 ±20 %', b: '3k' },
    thermal: { dissipation: '17m', timeConstant: 65 },
    ratings: { maximumTemperature: '170 °C' },
    ...more,
  }) as PartInput;

/** A short power-up from the mains through one NTC, valid as it stands. */
export const sampleScenario = (more: Partial<ScenarioInput> = {}): ScenarioInput => ({
  name: 'Sample',
  source: { kind: 'ac', voltage: '230 V', frequencies: [50], phase: 90, impedance: { resistance: 0.4, inductance: '100u' } },
  limiter: [{ part: samplePart() }],
  rectifier: { kind: 'bridge', forwardVoltage: 0.8, slopeResistance: '20m' },
  bulk: { capacitance: '470u', esr: '100m' },
  load: { kind: 'resistance', resistance: '1k' },
  ambient: '25 °C',
  duration: 0.5,
  ...more,
});
