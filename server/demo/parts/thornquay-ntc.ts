import { documented } from './provenance';

const MAKER = 'Thornquay (invented)';
const SHEET = 'Thornquay folder 11, 2024 edition (invented)';

/** NTC inrush current limiters given by R25 and B-value. */
export const THORNQUAY_NTC = [
  documented('a5ea88f7-f530-4958-8e82-2f9a9b04393e', SHEET, {
    kind: 'ntc',
    name: 'Thornquay Siskin',
    maker: MAKER,
    law: { law: 'b-value', r25: '10 ±15 %', b: '3050 K ±3 %' },
    thermal: { dissipation: '9 mW/K', timeConstant: '32 s' },
    ratings: {
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '1.6 A rms', ambient: '25 °C' },
      energy: { energy: '17 J', basis: 'absorbed' },
      capacitance: { capacitance: '350u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('d755df98-8d89-40a3-9903-f4cb5455eb3a', SHEET, {
    kind: 'ntc',
    name: 'Thornquay Linnet',
    maker: MAKER,
    law: { law: 'b-value', r25: '16 ±20 %', b: '3000 K ±3 %' },
    thermal: { dissipation: '15 mW/K', timeConstant: '60 s' },
    ratings: {
      maximumTemperature: '170 °C',
      steadyCurrent: { current: '1.8 A rms', ambient: '25 °C' },
      energy: { energy: '59 J', basis: 'unknown' },
      capacitance: { capacitance: '1000u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('65304a98-4082-47b0-b802-c47fd7a878c1', SHEET, {
    kind: 'ntc',
    name: 'Thornquay Twite',
    maker: MAKER,
    law: { law: 'b-value', r25: '120 ±15 %', b: '3300 K ±2 %' },
    thermal: { dissipation: '9 mW/K', timeConstant: '34 s' },
    ratings: {
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '0.5 A rms', ambient: '25 °C' },
      capacitance: { capacitance: '330u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('9476c36e-9cfc-48d0-b792-5b84ebd65788', SHEET, {
    kind: 'ntc',
    name: 'Thornquay Brambling',
    maker: MAKER,
    law: { law: 'b-value', r25: '1R0 ±20 %', b: '2600 K ±4 %' },
    thermal: { dissipation: '26 mW/K', timeConstant: '120 s' },
    ratings: {
      maximumTemperature: '200 °C',
      steadyCurrent: { current: '8.9 A rms', ambient: '65 °C' },
      energy: { energy: '250 J', basis: 'absorbed' },
      capacitance: { capacitance: '4300u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('5d5428b3-82da-4138-9b1b-a5b4960e55ce', SHEET, {
    kind: 'ntc',
    name: 'Thornquay Wheatear',
    maker: MAKER,
    law: { law: 'b-value', r25: '6R8 ±20 %', b: '2900 K ±3 %' },
    thermal: { dissipation: '20 mW/K', timeConstant: '90 s' },
    ratings: {
      steadyCurrent: { current: '2.9 A rms', ambient: '65 °C' },
      energy: { energy: '130 J', basis: 'absorbed' },
      capacitance: { capacitance: '2300u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('b8cb8842-070c-48d8-b0aa-eecb8cef8130', SHEET, {
    kind: 'ntc',
    name: 'Thornquay Whinchat',
    maker: MAKER,
    law: { law: 'b-value', r25: '60 ±20 %', b: '3300 K ±3 %' },
    thermal: { dissipation: '20 mW/K', timeConstant: '88 s' },
    ratings: {
      maximumTemperature: '180 °C',
      steadyCurrent: { current: '1.2 A rms', ambient: '65 °C' },
      energy: { energy: '120 J', basis: 'half-cv2-peak' },
      capacitance: { capacitance: '2100u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('f49456e1-4fc0-4b38-8408-f08bbb156634', SHEET, {
    kind: 'ntc',
    name: 'Thornquay Redpoll',
    maker: MAKER,
    law: { law: 'b-value', r25: '12 ±20 %', b: '3000 K ±3 %' },
    thermal: { dissipation: '30 mW/K', timeConstant: '135 s' },
    ratings: {
      maximumTemperature: '190 °C',
      steadyCurrent: { current: '3.1 A rms', ambient: '65 °C', derating: [{ ambient: '65 °C', share: '100 %' }, { ambient: '127 °C', share: '64 %' }, { ambient: '190 °C', share: '0 %' }] },
      energy: { energy: '300 J', basis: 'absorbed' },
      capacitance: { capacitance: '5200u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('6c903f6b-e38b-41e7-ae89-e9f2dd288687', SHEET, {
    kind: 'ntc',
    name: 'Thornquay Serin',
    maker: MAKER,
    law: { law: 'b-value', r25: '3R3 ±20 %', b: '2800 K ±3 %' },
    thermal: { dissipation: '16 mW/K', timeConstant: '70 s' },
    ratings: {
      maximumTemperature: '170 °C',
      steadyCurrent: { current: '3.1 A rms', ambient: '65 °C' },
      energy: { energy: '73 J', basis: 'absorbed' },
    },
  }),
];
