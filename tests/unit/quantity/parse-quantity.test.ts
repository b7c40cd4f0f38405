import type { Dimension } from '../../../shared/quantity/dimension';
import { parseQuantity, parseTolerancedText } from '../../../shared/quantity/parse';

const valueOf = (text: string, dimension: Dimension) => {
  const parsed = parseQuantity(text, dimension);
  return parsed.ok ? parsed.value : parsed.message;
};

describe('a quantity is read as an engineer types it', () => {
  it.each<[string, Dimension, number]>([
    ['470u', 'capacitance', 470e-6],
    ['470 \u00b5F', 'capacitance', 470e-6], // micro sign
    ['470 \u03bcF', 'capacitance', 470e-6], // Greek mu
    ['470uF', 'capacitance', 470e-6],
    ['0.47 mF', 'capacitance', 470e-6],
    ['500mA', 'current', 0.5],
    ['100 mA', 'current', 0.1],
    ['1.5e-9', 'capacitance', 1.5e-9],
    ['1,5e-9 F', 'capacitance', 1.5e-9],
    ['4,7 k\u03a9', 'resistance', 4700],
    ['4.7 k\u2126', 'resistance', 4700], // ohm sign
    ['4.7 kOhm', 'resistance', 4700],
    ['4.7 KOHM', 'resistance', 4700],
    ['4.7 kiloohm', 'resistance', 4700],
    ['47 ohms', 'resistance', 47],
    ['10 000', 'resistance', 10_000],
    ['10\u202f000 \u03a9', 'resistance', 10_000],
    ['1\u2009000\u2009000,5', 'resistance', 1_000_000.5],
    ['.5', 'resistance', 0.5],
    ['5.', 'resistance', 5],
    ['+5', 'resistance', 5],
    ['\u221240 \u00b0C', 'temperature', 233.15],
    ['-40', 'temperature', 233.15],
    ['85 C', 'temperature', 358.15],
    ['85 \u2103', 'temperature', 358.15],
    ['85\u00b0C', 'temperature', 358.15],
    ['298.15 K', 'temperature', 298.15],
    ['20 %', 'ratio', 0.2],
    ['20%', 'ratio', 0.2],
    ['12,5', 'ratio', 0.125],
    ['90\u00b0', 'angle', 90],
    ['90 deg', 'angle', 90],
    ['3k', 'temperatureInterval', 3000],
    ['3435 K', 'temperatureInterval', 3435],
    ['3.4 kK', 'temperatureInterval', 3400],
    ['17 mW/K', 'dissipation', 0.017],
    ['17m', 'dissipation', 0.017],
    ['17 mW/\u00b0C', 'dissipation', 0.017],
    ['1.1 J/K', 'heatCapacity', 1.1],
    ['850 mJ/K', 'heatCapacity', 0.85],
    ['89 A\u00b2s', 'i2t', 89],
    ['89 A\u00b2\u00b7s', 'i2t', 89],
    ['89 A^2 s', 'i2t', 89],
    ['2.5 min', 'time', 150],
    ['1 h', 'time', 3600],
    ['300 ms', 'time', 0.3],
    ['100 \u00b5H', 'inductance', 1e-4],
    ['10 kW', 'power', 10_000],
    ['1 Wh', 'energy', 3600],
    ['60 Hz', 'frequency', 60],
    ['10k', 'count', 10_000],
    ['100 000', 'count', 100_000],
  ])('%s as %s', (text, dimension, expected) => {
    const value = valueOf(text, dimension);
    expect(typeof value).toBe('number');
    expect(Math.abs((value as number) / expected - 1)).toBeLessThan(1e-15);
  });

  it('90 degrees may be written in radian', () => {
    expect(valueOf('1.5707963267948966 rad', 'angle')).toBeCloseTo(90, 10);
  });
});

describe('a letter stands in place of the decimal point (IEC 60062)', () => {
  it.each<[string, Dimension, number]>([
    ['4k7', 'resistance', 4700],
    ['4K7', 'resistance', 4700],
    ['2R5', 'resistance', 2.5],
    ['R47', 'resistance', 0.47],
    ['470R', 'resistance', 470],
    ['2.2R', 'resistance', 2.2],
    ['1M0', 'resistance', 1e6],
    ['2L5', 'resistance', 2.5e-3],
    ['4k7 \u03a9', 'resistance', 4700],
    ['4k7\u03a9', 'resistance', 4700],
    ['4n7', 'capacitance', 4.7e-9],
    ['p33', 'capacitance', 0.33e-12],
    ['4n7F', 'capacitance', 4.7e-9],
    ['m47', 'capacitance', 470e-6],
    ['3V3', 'voltage', 3.3],
    ['2A5', 'current', 2.5],
    ['3k5', 'temperatureInterval', 3500],
  ])('%s as %s', (text, dimension, expected) => expect(valueOf(text, dimension)).toBe(expected));

  it('and a tolerance letter may follow it', () => {
    expect(parseTolerancedText('4K7J', 'resistance')).toEqual({ ok: true, value: 4700, halfWidth: 235, qualifier: null });
    expect(parseTolerancedText('R47K', 'resistance')).toEqual({ ok: true, value: 0.47, halfWidth: 0.047, qualifier: null });
  });

  it('but F after a capacitance is the farad', () => {
    expect(parseTolerancedText('4n7F', 'capacitance')).toEqual({ ok: true, value: 4.7e-9, halfWidth: 0, qualifier: null });
  });

  it('a value that has no tolerance refuses the letter', () => expect(valueOf('4K7J', 'resistance')).toMatch(/not a value/));
});

describe('m and M are never confused', () => {
  it.each<[string, Dimension, number]>([
    ['10 m\u03a9', 'resistance', 0.01],
    ['10 M\u03a9', 'resistance', 1e7],
    ['10m', 'resistance', 0.01],
    ['10M', 'resistance', 1e7],
    ['10 mOhm', 'resistance', 0.01],
    ['10 MOhm', 'resistance', 1e7],
    ['1m5', 'resistance', 0.0015],
    ['1M5', 'resistance', 1.5e6],
    ['500 MA', 'current', 5e8],
  ])('%s', (text, dimension, expected) => expect(valueOf(text, dimension)).toBe(expected));
});

describe('rms and peak are told apart', () => {
  it.each([
    ['10 A', null],
    ['10 A rms', 'rms'],
    ['10 Arms', 'rms'],
    ['10 A RMS', 'rms'],
    ['10 A peak', 'peak'],
    ['10 Apk', 'peak'],
    ['10 pk', 'peak'],
    ['10 peak', 'peak'],
  ])('%s is %s', (text, qualifier) => expect(parseQuantity(text, 'current')).toEqual({ ok: true, value: 10, qualifier }));

  it('a resistance is neither', () => expect(valueOf('10 \u03a9 rms', 'resistance')).toMatch(/not a value/));
});

describe('what is not a quantity is refused with an example', () => {
  it.each<[string, Dimension]>([
    ['', 'resistance'],
    ['   ', 'resistance'],
    ['about 5', 'resistance'],
    ['5 V', 'resistance'],
    ['5 kg', 'power'],
    ['1.2.3', 'resistance'],
    ['1,234,567', 'resistance'],
    ['1 00', 'resistance'],
    ['1 *5 ohm', 'resistance'],
    ['470 m m', 'resistance'],
    ['470 uuF', 'capacitance'],
    ['4k7k', 'resistance'],
    ['1e400', 'resistance'],
    ['Infinity', 'resistance'],
    ['NaN', 'resistance'],
    ['0x10', 'resistance'],
    ['5 \u00b0C', 'temperatureInterval'],
    ['1.5 kA\u00b2s', 'i2t'],
    ['85k', 'temperature'],
    ['5 %', 'count'],
    ['__proto__', 'resistance'],
    ['5 constructor', 'resistance'],
    ['9'.repeat(65), 'resistance'],
  ])('"%s" as %s', (text, dimension) => expect(valueOf(text, dimension)).toMatch(/; write for example \S+/));

  it('names the text and the unit it was read for', () => {
    expect(valueOf('5 V', 'resistance')).toBe('"5 V" is not a value in \u03a9; write for example 4k7');
  });
});

describe('a tolerance follows \u00b1', () => {
  it.each<[string, Dimension, number, number]>([
    ['470u \u00b120 %', 'capacitance', 470e-6, 94e-6],
    ['470u +/-20%', 'capacitance', 470e-6, 94e-6],
    ['470 \u00b5F \u00b1 20', 'capacitance', 470e-6, 94e-6],
    ['10 \u03a9 \u00b12 \u03a9', 'resistance', 10, 2],
    ['25 \u00b0C \u00b115 K', 'temperature', 298.15, 15],
    ['25 \u00b115', 'temperature', 298.15, 15],
    ['470u', 'capacitance', 470e-6, 0],
  ])('%s', (text, dimension, value, halfWidth) => {
    const parsed = parseTolerancedText(text, dimension);
    expect(parsed).toMatchObject({ ok: true, value });
    expect(parsed.ok && parsed.halfWidth).toBeCloseTo(halfWidth, 12);
  });

  it.each<[string, Dimension]>([
    ['470u \u00b1', 'capacitance'],
    ['470u \u00b1120 %', 'capacitance'],
    ['470u \u00b1-5 %', 'capacitance'],
    ['470u \u00b15 \u00b15', 'capacitance'],
    ['25 \u00b0C \u00b110 %', 'temperature'],
    ['25 \u00b0C \u00b110 \u00b0C', 'temperature'],
  ])('%s is refused', (text, dimension) => {
    const parsed = parseTolerancedText(text, dimension);
    expect(parsed.ok ? '' : parsed.message).toMatch(/tolerance .* write for example/);
  });
});
