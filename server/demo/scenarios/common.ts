import type { PartInput } from '../../../shared/model/part';
import type { ScenarioInput } from '../../../shared/model/scenario';
import { DEMO_PARTS } from '../parts';

/** The library part of that name, embedded as a scenario keeps it. */
export const fromLibrary = (name: string): PartInput => {
  const found = DEMO_PARTS.find(({ part }) => part.name === name);
  if (!found) throw new Error(`no demo part is called ${name}`);
  return { ...found.part, libraryId: found.id };
};

/** A wall socket with ±10 %, near the transformer or at the end of a long cable. */
export const wallSocket = (voltage: string, frequencies: string[] = ['50 Hz']): ScenarioInput['source'] => ({
  kind: 'ac',
  voltage: `${voltage} rms ±10 %`,
  frequencies,
  impedance: { resistance: { nominal: '400 mΩ', min: '250 mΩ', max: '800 mΩ' }, inductance: '200 µH' },
});

export const bridge = (surge: string, i2t: string): ScenarioInput['rectifier'] => ({
  kind: 'bridge',
  forwardVoltage: '0.8 V',
  slopeResistance: '20 mΩ',
  surge: { current: `${surge} peak`, pulseWidth: '10 ms', i2t },
});
