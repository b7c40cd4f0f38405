import type { DemoScenario } from '../types';
import { bridge, fromLibrary, wallSocket } from './common';

/** Switches on cold without a fault; back after a short loss of mains the contact is still closed. */
export const HOT_RESTART: DemoScenario = {
  id: '5bc8fbbc-bde5-4099-8164-d8399f767c45',
  scenario: {
    name: 'Instrument supply, 300 W',
    notes: 'Cold switch-on is within every rating. After a short loss of mains the bus is empty while the contact has not let go: the whole surge passes beside the limiter.',
    source: wallSocket('230 V'),
    fuse: {
      ratedCurrent: '6A3',
      preArcing: [
        { time: '1 ms', i2t: '190 A²s' },
        { time: '10 ms', i2t: '240 A²s' },
        { time: '100 ms', i2t: '420 A²s' },
      ],
      pulseFactor: '30 %',
      deratedCurrent: '5 A rms',
      breakingCapacity: '1.5 kA rms',
      resistance: '15 mΩ',
    },
    limiter: [
      {
        part: fromLibrary('Thornquay Redpoll'),
        bypass: { closes: { when: 'time', at: '400 ms' }, releaseTime: '300 ms', contactResistance: '15 mΩ', makingCurrent: '80 A peak' },
      },
    ],
    rectifier: bridge('250 A', '310 A²s'),
    bulk: { capacitance: '470 µF ±20 %', esr: '120 mΩ', bleeder: '150k', atLowAmbient: { capacitanceFactor: '85 %', esrFactor: 4 } },
    load: { kind: 'constant-power', power: '300 W', startVoltage: '220 V', stopVoltage: '150 V', startDelay: '600 ms', rampTime: '20 ms' },
    ambient: { nominal: '25 °C', min: '0 °C', max: '40 °C' },
    limits: { peakCurrent: '100 A peak', limiterLoss: '3 W' },
  },
};

/** The contact is there to keep the body cool; when it fails open the body carries the load current. */
export const CONTACT_FAILS_OPEN: DemoScenario = {
  id: 'd76d4330-f144-4bea-b0c1-1fdecb91ce37',
  scenario: {
    name: 'Bench charger, contact fails open',
    notes: 'With the contact working the body stays cool. Should it never close, the load current heats the body past its highest temperature.',
    source: wallSocket('230 V'),
    limiter: [
      {
        part: fromLibrary('Aldersyke Whimbrel'),
        bypass: { closes: { when: 'time', at: '500 ms' }, releaseTime: 0, contactResistance: '15 mΩ', makingCurrent: '60 A peak' },
      },
    ],
    rectifier: bridge('200 A', '200 A²s'),
    bulk: { capacitance: '330 µF ±20 %', esr: '150 mΩ', bleeder: '150k', atLowAmbient: { capacitanceFactor: '85 %', esrFactor: 4 } },
    load: { kind: 'constant-power', power: '250 W', startVoltage: '200 V', stopVoltage: '140 V', startDelay: '700 ms', rampTime: '20 ms' },
    ambient: { nominal: '25 °C', min: '0 °C', max: '45 °C' },
    limits: { peakCurrent: '60 A peak', limiterLoss: '3 W' },
  },
};

/** A resistor and a contact that follows the bus voltage. */
export const PRECHARGE: DemoScenario = {
  id: '617959ce-3f1f-45a8-9e52-71007814e8a2',
  scenario: {
    name: 'Drive link, precharge from 400 V DC',
    notes: 'A wire-wound resistor charges the link; the contact closes when the bus has come up to 380 V.',
    source: { kind: 'dc', voltage: '400 V ±3 %', impedance: { resistance: '80 mΩ ±25 %', inductance: '20 µH' } },
    limiter: [
      {
        part: fromLibrary('Skellmere Dipper'),
        bypass: { closes: { when: 'bus-voltage', above: '380 V' }, releaseTime: '10 ms', contactResistance: '1 mΩ', makingCurrent: '500 A peak' },
      },
    ],
    rectifier: { kind: 'none' },
    bulk: { capacitance: '1 mF ±10 %', esr: '40 mΩ', bleeder: '47k', atLowAmbient: { capacitanceFactor: '85 %', esrFactor: 4 } },
    load: { kind: 'none' },
    ambient: { nominal: '25 °C', min: '-10 °C', max: '60 °C' },
    duration: '60 s',
    limits: { peakCurrent: '400 A peak', limiterLoss: '2 W' },
    setAside: [{ check: 'bypass-welded', reason: 'The drive tests its contact before the main switch closes: drive manual, chapter 3.' }],
  },
};
