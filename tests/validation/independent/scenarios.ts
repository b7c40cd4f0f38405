import type { Setup } from './setup';

const NTC = { law: { r25: 10, b: 3000 }, dissipation: 0.017, heatCapacity: 1.1 };
const BRIDGE = { drop: 0.9, slope: 0.01 };

const mains = (name: string, more: Partial<Setup>): Setup => ({
  name, duration: 0.3,
  source: { kind: 'ac', amplitude: 325, frequency: 50, degrees: 90, resistance: 0.35, inductance: 100e-6 },
  switches: [], bodies: [NTC], diodes: BRIDGE, capacitance: 470e-6, esr: 0.1, bleeder: 220e3, load: null, fault: null, ambient: 298.15,
  ...more,
});

const direct = (name: string, volts: number, more: Partial<Setup>): Setup => ({
  ...mains(name, more),
  source: { kind: 'dc', amplitude: volts, frequency: 0, degrees: 0, resistance: 0.05, inductance: 0 },
  diodes: null,
  ...more,
});

const AC = mains('', {}).source;
const DC = direct('', 48, {}).source;

/** Plainly invented paths that between them use every block of the engine. */
export const SETUPS: Setup[] = [
  mains('an NTC behind an inductance, switched on at the crest', {}),
  mains('an NTC without inductance, switched on at 60°', { source: { ...AC, degrees: 60, inductance: 0 } }),
  mains('an NTC behind 2 mH, switched on at zero', { source: { ...AC, degrees: 0, inductance: 2e-3 } }),
  mains('a light NTC at 60 Hz until it is in balance', {
    duration: 3, source: { ...AC, frequency: 60, amplitude: 170, degrees: 35, inductance: 0 }, capacitance: 200e-6, load: { ohms: 400 }, bodies: [{ law: { r25: 22, b: 2800 }, dissipation: 0.012, heatCapacity: 0.008 }],
  }),
  direct('an NTC and a ringing DC line', 48, { duration: 0.05, source: { ...DC, inductance: 20e-6 }, bodies: [{ law: { r25: 0.2, b: 2600 }, dissipation: 0.01, heatCapacity: 0.3 }], capacitance: 2e-3, esr: 0.01 }),
  direct('an NTC on DC through diodes, without inductance', 400, { duration: 0.2, diodes: BRIDGE, capacitance: 1e-3, bodies: [{ law: { r25: 22, b: 3300 }, dissipation: 0.02, heatCapacity: 0.6 }] }),
  mains('a resistor with a contact that closes by time', {
    duration: 0.6, source: { ...AC, inductance: 0 }, capacitance: 680e-6, bodies: [{ law: { ohms: 47 }, dissipation: 0.03, heatCapacity: 2, contact: { closesAt: 0.247, resistance: 0.02, release: 0.01 } }],
  }),
  mains('an NTC and a resistor in series, whose contact closes at a bus voltage', {
    duration: 0.5, source: { ...AC, inductance: 1e-3 },
    bodies: [NTC, { law: { ohms: 33 }, dissipation: 0.03, heatCapacity: 2, contact: { closesAbove: 290, resistance: 0.02, release: 0.01 } }],
  }),
  mains('a converter that starts with a ramp', { duration: 1.2, load: { power: 150, start: 250, stop: 175, delay: 0.06, ramp: 0.1, clamp: 97 } }),
  direct('a converter that starts and stops without end', 48, {
    duration: 0.9, bodies: [{ law: { ohms: 30 }, dissipation: 0.05, heatCapacity: 3 }], capacitance: 2.2e-3, load: { power: 40, start: 42, stop: 29, delay: 0.05, ramp: 0, clamp: 14 },
  }),
  direct('a polymer PTC that trips on a fault', 24, {
    duration: 3, bodies: [{ law: { low: 0.08, high: 8e4, midpoint: 398.15, width: 4 }, dissipation: 0.01, heatCapacity: 0.15 }],
    capacitance: 470e-6, esr: 0.02, load: { ohms: 60 }, fault: { at: 0.5, ohms: 1.5 },
  }),
  mains('an NTC that is switched off and on again while hot', {
    duration: 2.5, source: { ...AC, inductance: 500e-6 }, switches: [{ at: 1.503, on: false }, { at: 2.1075, on: true }], load: { ohms: 900 }, bodies: [{ ...NTC, heatCapacity: 0.3 }],
  }),
];
