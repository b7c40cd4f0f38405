import type { PathElement, PowerPath, ResistanceLaw } from '../../../simulation/circuit/path';
import { bValueLaw } from '../../../simulation/laws/b-value';
import { fixedLaw } from '../../../simulation/laws/fixed';
import { polymerPtcLaw } from '../../../simulation/laws/polymer-ptc';

export type BodyLaw =
  | { r25: number; b: number }
  | { low: number; high: number; midpoint: number; width: number }
  | { ohms: number };

/** One element as plain numbers; SI. */
export interface Body {
  law: BodyLaw;
  dissipation: number;
  heatCapacity: number;
  contact?: { closesAt?: number; closesAbove?: number; resistance: number; release: number };
}

/** A path as plain numbers, from which the engine and the independent integrator are both set up; SI. */
export interface Setup {
  name: string;
  duration: number;
  source: { kind: 'ac' | 'dc'; amplitude: number; frequency: number; degrees: number; resistance: number; inductance: number };
  switches: { at: number; on: boolean }[];
  bodies: Body[];
  diodes: { drop: number; slope: number } | null;
  capacitance: number;
  esr: number;
  bleeder: number | null;
  load: { power: number; start: number; stop: number; delay: number; ramp: number; clamp: number } | { ohms: number } | null;
  fault: { at: number; ohms: number } | null;
  ambient: number;
}

const engineLaw = (law: BodyLaw): ResistanceLaw => {
  if ('r25' in law) return bValueLaw(law.r25, law.b);
  return 'ohms' in law ? fixedLaw(law.ohms) : polymerPtcLaw(law.low, law.high, law.midpoint, law.width);
};

const engineElement = ({ law, dissipation, heatCapacity, contact }: Body, index: number): PathElement => ({
  name: `body ${index}`,
  kind: 'r25' in law ? 'ntc' : 'ohms' in law ? 'resistor' : 'polymer-ptc',
  law: engineLaw(law),
  dissipation,
  heatCapacity,
  bypass: contact
    ? {
        closes: contact.closesAt === undefined ? { when: 'bus-voltage', above: contact.closesAbove! } : { when: 'time', at: contact.closesAt },
        releaseTime: contact.release,
        contactResistance: contact.resistance,
        behaviour: 'works',
      }
    : null,
});

export const enginePath = ({ source, switches, bodies, diodes, capacitance, esr, bleeder, load, fault, ambient }: Setup): PowerPath => ({
  source: {
    kind: source.kind,
    amplitude: source.amplitude,
    frequency: source.frequency,
    phase: (source.degrees * Math.PI) / 180,
    resistance: source.resistance,
    inductance: source.inductance,
    programme: switches.map(({ at, on }) => ({ at, switch: on ? 'on' : 'off' })),
  },
  elements: bodies.map(engineElement),
  rectifier: diodes ? { kind: 'bridge', forwardVoltage: diodes.drop, slopeResistance: diodes.slope } : { kind: 'none' },
  bulk: { capacitance, esr, initialVoltage: 0, bleeder },
  load:
    load === null
      ? { kind: 'none' }
      : 'ohms' in load
        ? { kind: 'resistance', resistance: load.ohms }
        : {
            kind: 'constant-power', power: load.power, startVoltage: load.start, stopVoltage: load.stop, startDelay: load.delay,
            rampTime: load.ramp, clampVoltage: load.clamp,
          },
  fault: fault ? { at: fault.at, resistance: fault.ohms } : null,
  ambient,
});
