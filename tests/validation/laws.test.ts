import { bFromTwoPoints, bValueLaw } from '../../simulation/laws/b-value';
import { polymerPtcLaw } from '../../simulation/laws/polymer-ptc';
import { steinhartHartFromThree, steinhartHartLaw } from '../../simulation/laws/steinhart-hart';
import { tableLaw } from '../../simulation/laws/table';

const kelvin = (celsius: number) => celsius + 273.15;
const relative = (value: number, expected: number) => Math.abs(value / expected - 1);

describe('NTC by B-value', () => {
  // R = R25·exp(B(1/T − 1/T0)); IEC 60539-1, from memory. Figures computed from the formula to nine digits.
  it.each([[-40, 165.304401], [0, 25.1161779], [50, 4.59124032], [85, 1.85320098], [150, 0.511821319]])('10 Ω, 3000 K has at %d °C %d Ω', (celsius, ohms) => {
    expect(relative(bValueLaw(10, 3000).resistance(kelvin(celsius)), ohms)).toBeLessThan(1e-8);
  });

  // The same formula solved for B.
  it('follows from two points', () => {
    expect(bFromTwoPoints(kelvin(25), 6, kelvin(85), 1)).toBeCloseTo(3188.806944, 5);
    expect(bFromTwoPoints(kelvin(25), 8, kelvin(100), 1)).toBeCloseTo(3084.634503, 5);
  });

  // α = −B/T², by differentiation.
  it('falls by 3.374828 % a kelvin at 25 °C where B = 3000 K', () => {
    const law = bValueLaw(10, 3000);
    expect((100 * law.slope(298.15)) / law.resistance(298.15)).toBeCloseTo(-3.374828, 6);
  });
});

describe('NTC by Steinhart–Hart', () => {
  // Steinhart & Hart, Deep-Sea Research 15 (1968) 497–503: the equation; figures computed from it.
  const law = steinhartHartLaw(1.3e-3, 2.4e-4, 1e-7);

  it('has 10 kΩ at 278.6591653 K', () => expect(law.temperature(10_000)).toBeCloseTo(278.6591653, 6));

  it.each([[0, 13124.404268], [50, 1501.475903], [100, 291.034228]])('inverts to the resistance at %d °C', (celsius, ohms) => {
    expect(relative(law.resistance(kelvin(celsius)), ohms)).toBeLessThan(1e-8);
  });

  it('returns its coefficients from three of its points', () => {
    const point = (celsius: number) => ({ temperature: kelvin(celsius), resistance: law.resistance(kelvin(celsius)) });
    const { a, b, c } = steinhartHartFromThree([point(0), point(50), point(100)]);
    expect(relative(a, 1.3e-3)).toBeLessThan(1e-6);
    expect(relative(b, 2.4e-4)).toBeLessThan(1e-6);
    expect(relative(c, 1e-7)).toBeLessThan(1e-4);
  });
});

describe('NTC by table', () => {
  it('returns between its points what the law it was made from has, and its inverse', () => {
    const source = bValueLaw(10, 3000);
    const points = [-40, -20, 0, 25, 50, 85, 120, 150, 200].map((celsius) => ({ temperature: kelvin(celsius), resistance: source.resistance(kelvin(celsius)) }));
    const law = tableLaw(points);
    for (const celsius of [-30, 10, 37, 70, 100, 180]) {
      expect(relative(law.resistance(kelvin(celsius)), source.resistance(kelvin(celsius)))).toBeLessThan(1e-3);
      expect(law.temperature(law.resistance(kelvin(celsius)))).toBeCloseTo(kelvin(celsius), 6);
    }
  });
});

describe('polymer PTC', () => {
  it('has the geometric mean of its two resistances in the middle of its rise, and its inverse', () => {
    const law = polymerPtcLaw(0.1, 1e5, 398.15, 6);
    expect(relative(law.resistance(398.15), 100)).toBeLessThan(1e-12);
    expect(law.temperature(law.resistance(405))).toBeCloseTo(405, 8);
  });
});
