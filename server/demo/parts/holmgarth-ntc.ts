import { documented } from './provenance';

const MAKER = 'Holmgarth (invented)';
const SHEET = 'Holmgarth tables, second printing (invented)';

/** NTC inrush current limiters given by an R–T table. */
export const HOLMGARTH_NTC = [
  documented('2e3e153a-de8d-4e69-a5b0-1fcea82244d1', SHEET, {
    kind: 'ntc',
    name: 'Holmgarth Coldbeck',
    maker: MAKER,
    law: {
      law: 'table',
      tolerance: '15 %',
      points: [
        { temperature: '-40 °C', resistance: 152.6 },
        { temperature: '-20 °C', resistance: 57.21 },
        { temperature: '0 °C', resistance: 24.63 },
        { temperature: '25 °C', resistance: 10 },
        { temperature: '50 °C', resistance: 4.635 },
        { temperature: '75 °C', resistance: 2.383 },
        { temperature: '100 °C', resistance: 1.331 },
        { temperature: '125 °C', resistance: 0.7955 },
        { temperature: '150 °C', resistance: 0.5024 },
        { temperature: '175 °C', resistance: 0.3323 },
      ],
    },
    thermal: { dissipation: '16 mW/K', timeConstant: '70 s' },
    ratings: {
      maximumTemperature: '175 °C',
      steadyCurrent: { current: '2.1 A rms', ambient: '65 °C' },
      energy: { energy: '76 J', basis: 'absorbed', startTemperature: '25 °C' },
      capacitance: { capacitance: '1300u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('e141d4ad-2c08-4f4b-82c8-298b35c73779', SHEET, {
    kind: 'ntc',
    name: 'Holmgarth Hallowmere',
    maker: MAKER,
    law: {
      law: 'table',
      tolerance: '20 %',
      points: [
        { temperature: '-40 °C', resistance: 24.23 },
        { temperature: '-20 °C', resistance: 9.87 },
        { temperature: '0 °C', resistance: 4.564 },
        { temperature: '25 °C', resistance: 2 },
        { temperature: '50 °C', resistance: 0.9894 },
        { temperature: '75 °C', resistance: 0.5382 },
        { temperature: '100 °C', resistance: 0.3159 },
        { temperature: '125 °C', resistance: 0.1972 },
        { temperature: '150 °C', resistance: 0.1295 },
        { temperature: '175 °C', resistance: 0.08873 },
        { temperature: '200 °C', resistance: 0.06299 },
      ],
    },
    thermal: { dissipation: '26 mW/K', timeConstant: '115 s' },
    ratings: {
      maximumTemperature: '190 °C',
      steadyCurrent: { current: '6.3 A rms', ambient: '65 °C' },
      energy: { energy: '220 J', basis: 'absorbed', startTemperature: '25 °C' },
      capacitance: { capacitance: '3800u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('6711600c-a705-4b9d-8512-60fca83e5d8f', SHEET, {
    kind: 'ntc',
    name: 'Holmgarth Starwick',
    maker: MAKER,
    law: {
      law: 'table',
      tolerance: '15 %',
      points: [
        { temperature: '-40 °C', resistance: 715.2 },
        { temperature: '-20 °C', resistance: 251 },
        { temperature: '0 °C', resistance: 102.1 },
        { temperature: '25 °C', resistance: 39 },
        { temperature: '50 °C', resistance: 17.16 },
        { temperature: '75 °C', resistance: 8.43 },
        { temperature: '100 °C', resistance: 4.525 },
        { temperature: '125 °C', resistance: 2.61 },
        { temperature: '150 °C', resistance: 1.597 },
        { temperature: '175 °C', resistance: 1.027 },
      ],
    },
    thermal: { dissipation: '13 mW/K', timeConstant: '47 s' },
    ratings: {
      maximumTemperature: '165 °C',
      steadyCurrent: { current: '0.9 A rms', ambient: '65 °C' },
      energy: { energy: '38 J', basis: 'absorbed', startTemperature: '25 °C' },
    },
  }),
  documented('3b9cd8e7-d868-46e2-a992-9633dd28e219', SHEET, {
    kind: 'ntc',
    name: 'Holmgarth Wanderfell',
    maker: MAKER,
    law: {
      law: 'table',
      tolerance: '20 %',
      points: [
        { temperature: '-40 °C', resistance: 87.89 },
        { temperature: '-20 °C', resistance: 33.4 },
        { temperature: '0 °C', resistance: 14.56 },
        { temperature: '25 °C', resistance: 6 },
        { temperature: '50 °C', resistance: 2.819 },
        { temperature: '75 °C', resistance: 1.468 },
        { temperature: '100 °C', resistance: 0.8303 },
        { temperature: '125 °C', resistance: 0.502 },
        { temperature: '150 °C', resistance: 0.3207 },
        { temperature: '175 °C', resistance: 0.2145 },
        { temperature: '200 °C', resistance: 0.1491 },
      ],
    },
    thermal: { dissipation: '32 mW/K', timeConstant: '140 s' },
    ratings: {
      maximumTemperature: '200 °C',
      steadyCurrent: { current: '5.1 A rms', ambient: '65 °C' },
      energy: { energy: '350 J', basis: 'absorbed', startTemperature: '25 °C' },
      capacitance: { capacitance: '6100u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
];
