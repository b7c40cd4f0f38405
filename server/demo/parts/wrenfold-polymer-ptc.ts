import { documented } from './provenance';

const MAKER = 'Wrenfold (invented)';
const SHEET = 'Wrenfold specification 40, issue 5 (invented)';

/** Polymer PTC resettable fuses given by the coefficients of their law; low resistances from R_min to R_1max, in Ω. */
export const WRENFOLD_POLYMER_PTC = [
  documented('94e5e19e-8b2a-42bb-90fc-df45e1defb12', SHEET, {
    kind: 'polymer-ptc',
    name: 'Wrenfold Fellwick',
    maker: MAKER,
    law: { law: 'sigmoid', low: { nominal: 0.028, min: 0.02, max: 0.045 }, high: '50k', midpoint: '125 °C', width: '4.5 K' },
    thermal: { dissipation: '22 mW/K', heatCapacity: '0.55 J/K' },
    ratings: {
      maximumVoltage: '30 V',
      maximumCurrent: '40 A',
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '5.79 A rms', ambient: '23 °C' },
    },
  }),
  documented('e860322f-fc62-416c-89bb-75e420af07e9', SHEET, {
    kind: 'polymer-ptc',
    name: 'Wrenfold Garthmoor',
    maker: MAKER,
    law: { law: 'sigmoid', low: { nominal: 0.085, min: 0.06, max: 0.13 }, high: '150k', midpoint: '122 °C', width: '4.2 K' },
    thermal: { dissipation: '15 mW/K', heatCapacity: '0.3 J/K' },
    ratings: {
      maximumVoltage: '30 V',
      maximumCurrent: '40 A',
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '2.79 A rms', ambient: '23 °C' },
    },
  }),
  documented('fb8d1495-76e4-41bc-a925-64b248e4b43c', SHEET, {
    kind: 'polymer-ptc',
    name: 'Wrenfold Hollinsea',
    maker: MAKER,
    law: { law: 'sigmoid', low: { nominal: 0.22, min: 0.15, max: 0.35 }, high: '400k', midpoint: '124 °C', width: '4.0 K' },
    thermal: { dissipation: '12 mW/K', heatCapacity: '0.22 J/K' },
    ratings: {
      maximumVoltage: '60 V',
      maximumCurrent: '40 A',
      steadyCurrent: { current: '1.55 A rms', ambient: '23 °C' },
    },
  }),
  documented('1db163b0-5071-49dd-b9da-d7930bacb22c', SHEET, {
    kind: 'polymer-ptc',
    name: 'Wrenfold Ravenhythe',
    maker: MAKER,
    law: { law: 'sigmoid', low: { nominal: 0.016, min: 0.012, max: 0.026 }, high: '20k', midpoint: '126 °C', width: '5.0 K' },
    thermal: { dissipation: '28 mW/K', heatCapacity: '0.9 J/K' },
    ratings: {
      maximumVoltage: '16 V',
      maximumCurrent: '100 A',
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '8.51 A rms', ambient: '23 °C' },
    },
  }),
  documented('8736dc08-1417-4d6f-9522-804a9ed13693', SHEET, {
    kind: 'polymer-ptc',
    name: 'Wrenfold Stonemarl',
    maker: MAKER,
    law: { law: 'sigmoid', low: { nominal: 0.8, min: 0.5, max: 1.3 }, high: '2M', midpoint: '123 °C', width: '4.0 K' },
    thermal: { dissipation: '9 mW/K', heatCapacity: '0.14 J/K' },
    ratings: {
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '0.69 A rms', ambient: '23 °C' },
    },
  }),
  documented('f970f477-dcb2-4d29-b4d6-ac2bc13e8d12', SHEET, {
    kind: 'polymer-ptc',
    name: 'Wrenfold Tarnlow',
    maker: MAKER,
    law: { law: 'sigmoid', low: { nominal: 2.6, min: 1.8, max: 4.2 }, high: '5M', midpoint: '121 °C', width: '4.0 K' },
    thermal: { dissipation: '7 mW/K', heatCapacity: '0.1 J/K' },
    ratings: {
      maximumVoltage: '265 V',
      maximumCurrent: '3 A',
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '0.33 A rms', ambient: '23 °C' },
    },
  }),
  documented('ef168842-cb41-42bf-89a8-aa11ae587542', SHEET, {
    kind: 'polymer-ptc',
    name: 'Wrenfold Saltgarth',
    maker: MAKER,
    law: { law: 'sigmoid', low: { nominal: 9, min: 6, max: 14 }, high: '20M', midpoint: '124 °C', width: '4.2 K' },
    thermal: { dissipation: '6 mW/K', heatCapacity: '0.08 J/K' },
    ratings: {
      maximumVoltage: '265 V',
      maximumCurrent: '3 A',
      maximumTemperature: '160 °C',
      steadyCurrent: { current: '0.17 A rms', ambient: '23 °C' },
    },
  }),
];
