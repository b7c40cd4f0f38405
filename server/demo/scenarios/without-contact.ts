import type { DemoScenario } from '../types';
import { bridge, fromLibrary, wallSocket } from './common';

/** Low line, the coldest morning: the limiter has many times its resistance and the capacitor is tired. */
export const COLD_START: DemoScenario = {
  id: '87b0b125-ec1d-4da0-a6eb-8c9ebd69fe29',
  scenario: {
    name: 'Outdoor lamp driver, cold start',
    notes: 'At −40 °C and low line the load starts, pulls the bus below its stop voltage and starts again.',
    source: wallSocket('230 V'),
    limiter: [{ part: fromLibrary('Holmgarth Starwick') }],
    rectifier: bridge('150 A', '110 A²s'),
    bulk: { capacitance: '100 µF ±20 %', esr: '400 mΩ', atLowAmbient: { capacitanceFactor: '60 %', esrFactor: 15 } },
    load: { kind: 'constant-power', power: '75 W', startVoltage: '170 V', stopVoltage: '120 V', startDelay: '100 ms', rampTime: '20 ms' },
    ambient: { nominal: '10 °C', min: '-40 °C', max: '45 °C' },
    limits: { peakCurrent: '100 A peak' },
  },
};

/** Enough at nominal line, too little for the highest. */
export const OVER_ENERGY: DemoScenario = {
  id: 'c6a53877-7733-4bdb-9721-0dff076ce2ef',
  scenario: {
    name: 'Tool charger, energy at high line',
    notes: 'One pulse at high line with the largest capacitance puts more energy into the limiter than its rating.',
    source: wallSocket('230 V'),
    limiter: [{ part: fromLibrary('Thornquay Siskin') }],
    rectifier: bridge('200 A', '200 A²s'),
    bulk: { capacitance: '330 µF ±20 %', esr: '150 mΩ' },
    load: { kind: 'constant-power', power: '50 W', startVoltage: '180 V', startDelay: '100 ms', rampTime: '20 ms' },
    ambient: { nominal: '25 °C', min: '0 °C', max: '45 °C' },
    limits: { peakCurrent: '150 A peak', limiterLoss: '4 W' },
  },
};

export const WITHIN_RATINGS: DemoScenario = {
  id: '0d464138-a623-4255-bfc1-ea36f17fd374',
  scenario: {
    name: 'Door controller, 40 W',
    notes: 'Every check is within its rating with room to spare.',
    source: wallSocket('230 V', ['50 Hz', '60 Hz']),
    fuse: {
      ratedCurrent: '2 A',
      preArcing: [
        { time: '1 ms', i2t: '45 A²s' },
        { time: '10 ms', i2t: '52 A²s' },
        { time: '100 ms', i2t: '80 A²s' },
      ],
      pulseFactor: '30 %',
      deratedCurrent: '1.6 A rms',
      breakingCapacity: '1.5 kA rms',
      resistance: '60 mΩ',
    },
    limiter: [{ part: fromLibrary('Aldersyke Whimbrel') }],
    rectifier: bridge('100 A', '50 A²s'),
    bulk: { capacitance: '100 µF ±20 %', esr: '300 mΩ', bleeder: '220k' },
    load: { kind: 'constant-power', power: '40 W', startVoltage: '180 V', stopVoltage: '120 V', startDelay: '100 ms', rampTime: '20 ms' },
    ambient: { nominal: '25 °C', min: '5 °C', max: '40 °C' },
    limits: { peakCurrent: '60 A peak', limiterLoss: '3 W' },
  },
};

export const RATING_MISSING: DemoScenario = {
  id: '3fd42359-92ed-4f45-9a1a-fe878b33e968',
  scenario: {
    name: 'Meter supply, rating not found',
    notes: 'The record of the limiter has no energy rating yet; what cannot be assessed is not passed.',
    source: wallSocket('120 V', ['60 Hz']),
    limiter: [{ part: fromLibrary('Thornquay Twite') }],
    rectifier: bridge('50 A', '12 A²s'),
    bulk: { capacitance: '47 µF ±20 %', esr: '500 mΩ' },
    load: { kind: 'constant-power', power: '5 W', startVoltage: '90 V', rampTime: '10 ms' },
    ambient: { nominal: '25 °C', min: '5 °C', max: '40 °C' },
    limits: { peakCurrent: '20 A peak', limiterLoss: '1 W' },
  },
};

/** A resettable fuse in a rail, with a fault across the bus. */
export const RAIL_FAULT: DemoScenario = {
  id: '5f2dd97f-1cfb-40f6-a827-688de6a16a3b',
  scenario: {
    name: 'Camera rail, 24 V DC with a fault',
    notes: 'The polymer PTC holds the camera in a warm housing and trips in time on a fault after half a minute.',
    source: { kind: 'dc', voltage: '24 V ±5 %', impedance: { resistance: '1 Ω ±20 %', inductance: '10 µH' } },
    limiter: [{ part: fromLibrary('Wrenfold Garthmoor') }],
    rectifier: { kind: 'none' },
    bulk: { capacitance: '220 µF ±20 %', esr: '60 mΩ' },
    load: { kind: 'resistance', resistance: '24 Ω' },
    fault: { kind: 'resistance', at: '30 s', resistance: '500 mΩ' },
    ambient: { nominal: '23 °C', min: '-10 °C', max: '50 °C' },
    duration: '120 s',
    limits: { peakCurrent: '30 A peak', timeToTrip: '10 s', voltageDrop: '300 mV', steadyCurrent: '1.1 A rms', limiterLoss: '1 W' },
  },
};
