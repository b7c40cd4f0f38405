import { documented } from './provenance';

const MAKER = 'Marrowby (invented)';
const SHEET = 'Marrowby handbook, chapter 6 (invented)';

/** NTC inrush current limiters given by Steinhart–Hart coefficients (1/K, R in Ω). */
export const MARROWBY_NTC = [
  documented('5736b6c1-9f34-4fcd-a669-6d1608d5a175', SHEET, {
    kind: 'ntc',
    name: 'Marrowby Fulmar',
    maker: MAKER,
    law: { law: 'steinhart-hart', a: 0.0024761, b: 0.0003168541, c: 1e-06, tolerance: '15 %' },
    thermal: { dissipation: '17 mW/K', timeConstant: '75 s' },
    ratings: {
      maximumTemperature: '170 °C',
      steadyCurrent: { current: '1.7 A rms', ambient: '65 °C' },
      energy: { energy: '83 J', basis: 'absorbed' },
      capacitance: { capacitance: '1400u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('1ecf2f65-7d21-432c-8e63-bdd32d8a1783', SHEET, {
    kind: 'ntc',
    name: 'Marrowby Gannet',
    maker: MAKER,
    law: { law: 'steinhart-hart', a: 0.002695639, b: 0.0003345523, c: 1e-06, tolerance: '20 %' },
    thermal: { dissipation: '28 mW/K', timeConstant: '125 s' },
    ratings: {
      maximumTemperature: '190 °C',
      steadyCurrent: { current: '3.9 A rms', ambient: '65 °C' },
      energy: { energy: '260 J', basis: 'absorbed' },
      capacitance: { capacitance: '4500u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('602c16df-f600-4415-812e-df7b27ebd003', SHEET, {
    kind: 'ntc',
    name: 'Marrowby Petrel',
    maker: MAKER,
    law: { law: 'steinhart-hart', a: 0.002331968, b: 0.0002992404, c: 1e-06, tolerance: '15 %' },
    thermal: { dissipation: '13 mW/K', timeConstant: '48 s' },
    ratings: {
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '1 A rms', ambient: '65 °C' },
      capacitance: { capacitance: '660u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
  documented('ad1215bd-52bf-43fb-afe2-9c02a1dade3b', SHEET, {
    kind: 'ntc',
    name: 'Marrowby Skua',
    maker: MAKER,
    law: { law: 'steinhart-hart', a: 0.002867248, b: 0.0003492073, c: 1e-06, tolerance: '20 %' },
    thermal: { dissipation: '22 mW/K', timeConstant: '98 s' },
    ratings: {
      maximumTemperature: '180 °C',
      steadyCurrent: { current: '3.8 A rms', ambient: '65 °C' },
      energy: { energy: '150 J', basis: 'absorbed' },
      capacitance: { capacitance: '2600u', voltage: '240 V', voltageIs: 'rms' },
    },
  }),
];
