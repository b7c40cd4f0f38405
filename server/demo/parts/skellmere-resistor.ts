import { documented } from './provenance';

const MAKER = 'Skellmere (invented)';
const SHEET = 'Skellmere list 8, 2025 (invented)';

/** Wire-wound resistors for precharge. */
export const SKELLMERE_RESISTOR = [
  documented('87d85b45-52de-4db1-9004-72c1b5dced55', SHEET, {
    kind: 'resistor',
    name: 'Skellmere Dipper',
    maker: MAKER,
    law: { law: 'fixed', resistance: '47 ±5 %' },
    thermal: { dissipation: '30 mW/K', timeConstant: '180 s' },
    ratings: {
      maximumTemperature: '300 °C',
      steadyCurrent: { current: '0.36 A rms', ambient: '70 °C' },
      energy: { energy: '740 J', basis: 'absorbed' },
    },
  }),
  documented('53ff23e4-1a52-4cf3-950f-775031e0ba09', SHEET, {
    kind: 'resistor',
    name: 'Skellmere Ouzel',
    maker: MAKER,
    law: { law: 'fixed', resistance: '100 ±5 %' },
    thermal: { dissipation: '22 mW/K', timeConstant: '140 s' },
    ratings: {
      maximumTemperature: '300 °C',
      steadyCurrent: { current: '0.21 A rms', ambient: '70 °C' },
      energy: { energy: '420 J', basis: 'absorbed' },
    },
  }),
  documented('1d714b41-92bd-42cc-b841-9c35b4d6c2b7', SHEET, {
    kind: 'resistor',
    name: 'Skellmere Fieldfare',
    maker: MAKER,
    law: { law: 'fixed', resistance: '10 ±5 %' },
    thermal: { dissipation: '45 mW/K', timeConstant: '300 s' },
    ratings: {
      maximumTemperature: '275 °C',
      steadyCurrent: { current: '0.91 A rms', ambient: '70 °C' },
    },
  }),
  documented('861be350-4153-4b10-bea3-0fd8717b24e3', SHEET, {
    kind: 'resistor',
    name: 'Skellmere Crake',
    maker: MAKER,
    law: { law: 'fixed', resistance: '22 ±10 %' },
    thermal: { dissipation: '60 mW/K', timeConstant: '420 s' },
    ratings: {
      maximumTemperature: '300 °C',
      steadyCurrent: { current: '0.75 A rms', ambient: '70 °C' },
      energy: { energy: '3500 J', basis: 'absorbed' },
    },
  }),
  documented('f295b572-361a-4ec3-b3ec-00d892c46915', SHEET, {
    kind: 'resistor',
    name: 'Skellmere Nightjar',
    maker: MAKER,
    law: { law: 'fixed', resistance: '4R7 ±5 %' },
    thermal: { dissipation: '18 mW/K', timeConstant: '95 s' },
    ratings: {
      maximumTemperature: '250 °C',
      steadyCurrent: { current: '0.78 A rms', ambient: '70 °C' },
      energy: { energy: '190 J', basis: 'absorbed' },
    },
  }),
  documented('3cf37a22-736e-49a1-b090-70dab4697936', SHEET, {
    kind: 'resistor',
    name: 'Skellmere Wryneck',
    maker: MAKER,
    law: { law: 'fixed', resistance: '220 ±5 %' },
    thermal: { dissipation: '14 mW/K', timeConstant: '80 s' },
    ratings: {
      maximumTemperature: '300 °C',
      energy: { energy: '150 J', basis: 'absorbed' },
    },
  }),
];
