import { documented } from './provenance';

const MAKER = 'Aldersyke (invented)';
const SHEET = 'Aldersyke sheet 3, issue B (invented)';

/** NTC inrush current limiters given by R25 and B-value. */
export const ALDERSYKE_NTC = [
  documented('3fcb4b70-f79a-4ffc-a71b-9592244ececa', SHEET, {
    kind: 'ntc',
    name: 'Aldersyke Heron',
    maker: MAKER,
    law: { law: 'b-value', r25: '10 ±20 %', b: '3000 K ±3 %' },
    thermal: { dissipation: '18 mW/K', timeConstant: '82 s' },
    ratings: {
      maximumTemperature: '170 °C',
      steadyCurrent: { current: '2.1 A rms', ambient: '65 °C' },
      energy: { energy: '96 J', basis: 'absorbed' },
      capacitance: { capacitance: '1700u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('2a438f2a-3172-4442-bbce-14ab261db1d4', SHEET, {
    kind: 'ntc',
    name: 'Aldersyke Curlew',
    maker: MAKER,
    law: { law: 'b-value', r25: '5 ±20 %', b: '2900 K ±3 %' },
    thermal: { dissipation: '18 mW/K', timeConstant: '85 s' },
    ratings: {
      maximumTemperature: '170 °C',
      steadyCurrent: { current: '2.8 A rms', ambient: '65 °C' },
      energy: { energy: '100 J', basis: 'absorbed' },
      capacitance: { capacitance: '1700u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('e427f474-114d-4fce-bf3f-3f8cfe53b312', SHEET, {
    kind: 'ntc',
    name: 'Aldersyke Plover',
    maker: MAKER,
    law: { law: 'b-value', r25: '2R5 ±20 %', b: '2750 K ±3 %' },
    thermal: { dissipation: '24 mW/K', timeConstant: '105 s' },
    ratings: {
      maximumTemperature: '180 °C',
      steadyCurrent: { current: '4.8 A rms', ambient: '65 °C' },
      energy: { energy: '180 J', basis: 'absorbed' },
      capacitance: { capacitance: '3100u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('23eb7164-3ac5-4727-95d2-5341edc5fe85', SHEET, {
    kind: 'ntc',
    name: 'Aldersyke Dunlin',
    maker: MAKER,
    law: { law: 'b-value', r25: '22 ±15 %', b: '3100 K ±3 %' },
    thermal: { dissipation: '14 mW/K', timeConstant: '52 s' },
    ratings: {
      maximumTemperature: '170 °C',
      steadyCurrent: { current: '1.5 A rms', ambient: '25 °C', derating: [{ ambient: '25 °C', share: '100 %' }, { ambient: '97 °C', share: '64 %' }, { ambient: '170 °C', share: '0 %' }] },
      energy: { energy: '48 J', basis: 'absorbed' },
      capacitance: { capacitance: '830u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('09c9c31a-e2f9-4909-b4a3-cc3052800e04', SHEET, {
    kind: 'ntc',
    name: 'Aldersyke Whimbrel',
    maker: MAKER,
    law: { law: 'b-value', r25: '47 ±15 %', b: '3200 K ±2 %' },
    thermal: { dissipation: '14 mW/K', timeConstant: '50 s' },
    ratings: {
      maximumTemperature: '170 °C',
      steadyCurrent: { current: '1.1 A rms', ambient: '25 °C' },
      energy: { energy: '46 J', basis: 'absorbed' },
      capacitance: { capacitance: '800u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('2cc9d354-d76f-4970-b440-6663d3e1ec74', SHEET, {
    kind: 'ntc',
    name: 'Aldersyke Godwit',
    maker: MAKER,
    law: { law: 'b-value', r25: '8 ±20 %', b: '3000 K ±3 %' },
    thermal: { dissipation: '25 mW/K', timeConstant: '110 s' },
    ratings: {
      maximumTemperature: '180 °C',
      steadyCurrent: { current: '3.1 A rms', ambient: '65 °C' },
      energy: { energy: '190 J', basis: 'absorbed', pulses: '10k' },
      capacitance: { capacitance: '3300u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('4dfc3c3b-18c1-402b-a946-a04e9ff35ab3', SHEET, {
    kind: 'ntc',
    name: 'Aldersyke Bittern',
    maker: MAKER,
    law: { law: 'b-value', r25: '4R7 ±20 %', b: '2900 K ±3 %' },
    thermal: { dissipation: '36 mW/K', timeConstant: '150 s' },
    ratings: {
      maximumTemperature: '200 °C',
      steadyCurrent: { current: '5.8 A rms', ambient: '65 °C', derating: [{ ambient: '65 °C', share: '100 %' }, { ambient: '132 °C', share: '64 %' }, { ambient: '200 °C', share: '0 %' }] },
      energy: { energy: '430 J', basis: 'absorbed' },
      capacitance: { capacitance: '7500u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('89fb1806-dc3f-4287-aa16-2b8dc835698d', SHEET, {
    kind: 'ntc',
    name: 'Aldersyke Lapwing',
    maker: MAKER,
    law: { law: 'b-value', r25: '33 ±20 %', b: '3150 K ±3 %' },
    thermal: { dissipation: '25 mW/K', timeConstant: '115 s' },
    ratings: {
      maximumTemperature: '180 °C',
      energy: { energy: '200 J', basis: 'absorbed' },
      capacitance: { capacitance: '3500u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
];
