import { cornerOf, rangingFactors } from '../../../simulation/study/factors';
import { impedanceAt, magnitudeOf, prospectiveCurrent } from '../../../simulation/study/source-impedance';
import { mainsScenario } from '../../support/study-scenarios';

describe('the factors of a scenario', () => {
  it('are those that have a range, in the order of the contract', () => {
    expect(rangingFactors(mainsScenario()).map(({ factor }) => factor)).toEqual([
      'line', 'ambient', 'elementResistance', 'elementB', 'capacitance', 'esr', 'sourceImpedance',
    ]);
  });

  it('do not include what has one value only', () => {
    const fixed = mainsScenario({ ambient: '25 °C', bulk: { capacitance: '470u', esr: 0.1 }, limiter: [] });
    expect(rangingFactors(fixed).map(({ factor }) => factor)).toEqual(['line', 'sourceImpedance']);
  });

  it('include both frequencies where both are allowed', () => {
    const impedance = { resistance: 0.3, inductance: 0 };
    const [range] = rangingFactors(mainsScenario({ source: { kind: 'ac', voltage: 230, frequencies: [50, 60], impedance } }));
    expect(range).toMatchObject({ factor: 'frequency', values: { low: 50, nominal: 50, high: 60 }, levels: ['nominal', 'high'] });
  });
});

describe('a corner', () => {
  it('names each factor with its level, value and share off nominal; kelvin have no share', () => {
    const ranges = rangingFactors(mainsScenario());
    const { factors } = cornerOf(ranges, { line: 'high', ambient: 'low' });
    expect(factors.find(({ factor }) => factor === 'line')).toEqual({ factor: 'line', level: 'high', value: expect.closeTo(253, 9), change: expect.closeTo(0.1, 9) });
    expect(factors.find(({ factor }) => factor === 'ambient')).toEqual({ factor: 'ambient', level: 'low', value: expect.closeTo(273.15, 9), change: null });
    expect(factors.find(({ factor }) => factor === 'capacitance')).toMatchObject({ level: 'nominal', change: 0 });
  });
});

describe('a source impedance entered as prospective current with X/R', () => {
  const source = mainsScenario({
    source: { kind: 'ac', voltage: 230, frequencies: [50], impedance: { prospectiveCurrent: { nominal: 1000, min: 500, max: 2000 }, reactanceRatio: 0.75 } },
  }).source;

  it('is split into R and L', () => {
    // |Z| = 230 V / 1 kA = 0.23 Ω; X/R = 0.75 makes R = 0.8·|Z| and X = 0.6·|Z|.
    const { resistance, inductance } = impedanceAt(source, 'nominal', 50);
    expect(resistance).toBeCloseTo(0.184, 9);
    expect(2 * Math.PI * 50 * inductance).toBeCloseTo(0.138, 9);
  });

  it('is lowest where the prospective current is highest', () => {
    expect(magnitudeOf(impedanceAt(source, 'low', 50), 50)).toBeCloseTo(0.115, 9);
    expect(magnitudeOf(impedanceAt(source, 'high', 50), 50)).toBeCloseTo(0.46, 9);
    expect(prospectiveCurrent(source, 'low', 253, 50)).toBeCloseTo(2200, 6);
  });

  it('has no finite prospective current where it is zero', () => {
    const ideal = mainsScenario({ source: { kind: 'ac', voltage: 230, frequencies: [50], impedance: { resistance: 0, inductance: 0 } } }).source;
    expect(prospectiveCurrent(ideal, 'low', 253, 50)).toBeNull();
  });
});
