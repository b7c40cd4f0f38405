import type { Dimension } from '../../../shared/quantity/dimension';
import { formatQuantity, quantityText } from '../../../shared/quantity/format';

describe('a quantity is shown in normal notation', () => {
  it.each<[number, Dimension, string]>([
    [470e-6, 'capacitance', '470 \u00b5F'],
    [4700, 'resistance', '4.7 k\u03a9'],
    [0, 'resistance', '0 \u03a9'],
    [-0, 'voltage', '0 V'],
    [999.94, 'resistance', '999.9 \u03a9'],
    [999.96, 'resistance', '1 k\u03a9'],
    [999_960, 'resistance', '1 M\u03a9'],
    [0.000_999_96, 'current', '1 mA'],
    [-12.5, 'voltage', '\u221212.5 V'],
    [-999.96, 'voltage', '\u22121 kV'],
    [1e-18, 'capacitance', '0.001 fF'],
    [3e15, 'resistance', '3000 T\u03a9'],
    [298.15, 'temperature', '25 \u00b0C'],
    [233.15, 'temperature', '\u221240 \u00b0C'],
    [273.15, 'temperature', '0 \u00b0C'],
    [273.15 + 5.7e-14, 'temperature', '0 \u00b0C'],
    [0.2, 'ratio', '20 %'],
    [0.07, 'ratio', '7 %'],
    [90, 'angle', '90\u00b0'],
    [10_000, 'count', '10000'],
    [3435, 'temperatureInterval', '3435 K'],
    [0.017, 'dissipation', '17 mW/K'],
    [89, 'i2t', '89 A\u00b2s'],
    [Number.NaN, 'resistance', '\u2013 \u03a9'],
    [Infinity, 'temperature', '\u2013 \u00b0C'],
  ])('%d as %s', (value, dimension, text) => expect(formatQuantity(value, dimension)).toBe(text));

  it('digits and unit come apart', () => expect(quantityText(470e-6, 'capacitance')).toEqual({ number: '470', unit: '\u00b5F' }));

  it('rounds to the digits asked for', () => expect(formatQuantity(1234.5, 'power', 3)).toBe('1.23 kW'));
});
