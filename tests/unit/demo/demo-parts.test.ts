import { DEMO_PARTS } from '../../../server/demo/parts';
import { partSchema, type NtcLaw, type Part, type PolymerPtcLaw } from '../../../shared/model/part';

const parts = DEMO_PARTS.map(({ part }) => partSchema.parse(part));
const named = (list: Part[]) => list.map((part) => [part.name, part] as const);
const T25 = 298.15;

const steinhartHart = ({ a, b, c }: { a: number; b: number; c: number }, temperature: number): number => {
  let [low, high] = [Math.log(1e-5), Math.log(1e9)];
  for (let step = 0; step < 200; step += 1) {
    const middle = (low + high) / 2;
    if (a + b * middle + c * middle ** 3 < 1 / temperature) low = middle;
    else high = middle;
  }
  return Math.exp(low);
};

/** Resistances at rising temperatures; the formulas are written out here, apart from the engine's. */
const ntcCurve = (law: NtcLaw): { temperature: number; resistance: number }[] => {
  if (law.law === 'table') return law.points;
  return [-40, 0, 25, 50, 85, 125, 150].map((celsius) => {
    const temperature = celsius + 273.15;
    return { temperature, resistance: law.law === 'b-value' ? law.r25.nominal * Math.exp(law.b.nominal * (1 / temperature - 1 / T25)) : steinhartHart(law, temperature) };
  });
};

const logPtc = ({ low, high, midpoint, width }: PolymerPtcLaw, temperature: number) =>
  Math.log10(low.nominal) + Math.log10(high / low.nominal) / (1 + Math.exp(-(temperature - midpoint) / width));

const heatCapacityOf = ({ thermal }: Part) => ('heatCapacity' in thermal ? thermal.heatCapacity : thermal.dissipation * thermal.timeConstant);

const resistanceAt = (part: Part, temperature: number): number => {
  if (part.kind === 'resistor') return part.law.resistance.nominal;
  if (part.kind === 'polymer-ptc') return 10 ** logPtc(part.law, temperature);
  const { law } = part;
  if (law.law === 'b-value') return law.r25.nominal * Math.exp(law.b.nominal * (1 / temperature - 1 / T25));
  if (law.law === 'steinhart-hart') return steinhartHart(law, temperature);
  const after = Math.max(1, law.points.findIndex((point) => point.temperature >= temperature));
  const [one, other] = [law.points[after - 1]!, law.points[after]!];
  const share = (1 / one.temperature - 1 / temperature) / (1 / one.temperature - 1 / other.temperature);
  return Math.exp(Math.log(one.resistance) + share * Math.log(other.resistance / one.resistance));
};

const ofKind = <Kind extends Part['kind']>(kind: Kind) => parts.filter((part): part is Extract<Part, { kind: Kind }> => part.kind === kind);

describe('the demo library', () => {
  it('has 34 parts or more, of every kind and law, under names of their own', () => {
    expect(parts.length).toBeGreaterThanOrEqual(34);
    expect(new Set(parts.map(({ name }) => name)).size).toBe(parts.length);
    expect(new Set(DEMO_PARTS.map(({ id }) => id)).size).toBe(parts.length);
    expect(new Set(parts.map(({ kind, law }) => `${kind} ${law.law}`))).toEqual(new Set(['ntc b-value', 'ntc steinhart-hart', 'ntc table', 'polymer-ptc sigmoid', 'resistor fixed']));
  });

  it('is plainly invented, and no name encodes a figure', () => {
    for (const { name, maker } of parts) {
      expect(maker).toMatch(/\(invented\)$/);
      expect(name).toMatch(/^[A-Z][a-z]+ [A-Z][a-z]+$/);
    }
  });

  it('says where every figure comes from', () => {
    for (const { part, provenance } of DEMO_PARTS) {
      const figures = [...Object.keys(part.law).filter((key) => !['law', 'tolerance'].includes(key)).map((key) => `law.${key}`), ...Object.keys(part.thermal).map((key) => `thermal.${key}`), ...Object.keys(part.ratings ?? {}).map((key) => `ratings.${key}`)];
      expect(provenance.map(({ figure }) => figure).sort()).toEqual(figures.sort());
      for (const { document, page } of provenance) expect(document && page).toBeTruthy();
    }
  });

  it('has parts with missing ratings, so that "not assessed" is seen', () => {
    expect(parts.filter(({ kind, ratings }) => kind === 'ntc' && !ratings.energy).length).toBeGreaterThan(0);
    expect(parts.filter(({ ratings }) => !ratings.maximumTemperature).length).toBeGreaterThan(0);
    expect(parts.filter(({ kind, ratings }) => kind === 'polymer-ptc' && !ratings.maximumVoltage).length).toBeGreaterThan(0);
  });
});

// Common practice, no source: the resistance of an NTC falls with temperature along a flattening curve.
describe.each(named(ofKind('ntc')))('%s', (_, part) => {
  const curve = ntcCurve((part as Extract<Part, { kind: 'ntc' }>).law);
  const slopes = curve.slice(1).map((point, index) => (point.resistance - curve[index]!.resistance) / (point.temperature - curve[index]!.temperature));

  it('falls with temperature', () => slopes.forEach((slope) => expect(slope).toBeLessThan(0)));
  it('flattens on the way', () => slopes.slice(1).forEach((slope, index) => expect(Math.abs(slope)).toBeLessThan(Math.abs(slopes[index]!))));
});

// Common practice, no source: a switching PTC rises steeply above its switching temperature.
describe.each(named(ofKind('polymer-ptc')))('%s', (_, part) => {
  const { law } = part as Extract<Part, { kind: 'polymer-ptc' }>;
  const steepness = (celsius: number) => logPtc(law, celsius + 274.15) - logPtc(law, celsius + 273.15);

  it('rises, ever steeper up to its knee', () => {
    const steps = [25, 60, 85, 100, 110].map(steepness);
    steps.forEach((step, index) => {
      expect(step).toBeGreaterThan(0);
      if (index > 0) expect(step).toBeGreaterThan(steps[index - 1]!);
    });
    expect(steepness(law.midpoint - 273.15 - 0.5)).toBeGreaterThan(0.15);
  });

  it('rises by a hundred thousand times or more', () => expect(law.high / law.low.max).toBeGreaterThan(1e5));
});

describe.each(named(parts))('%s agrees with itself', (_, part) => {
  const { ratings, thermal } = part as Part;

  it('its heat capacity and time constant are those of such a body', () => {
    const timeConstant = heatCapacityOf(part as Part) / thermal.dissipation;
    expect(timeConstant).toBeGreaterThan(10);
    expect(timeConstant).toBeLessThan(500);
  });

  it('its energy rating would not heat it past its highest temperature, were no heat lost', () => {
    if (!ratings.energy || !ratings.maximumTemperature) return expect(ratings.energy && ratings.maximumTemperature).toBeUndefined();
    return expect(heatCapacityOf(part as Part) * (ratings.maximumTemperature - T25)).toBeGreaterThanOrEqual(ratings.energy.energy);
  });

  it('its steady current keeps it at or below its highest temperature at the rated ambient', () => {
    const { steadyCurrent, maximumTemperature } = ratings;
    if (!steadyCurrent || !maximumTemperature) return expect(steadyCurrent && maximumTemperature).toBeUndefined();
    const heat = steadyCurrent.current ** 2 * resistanceAt(part as Part, maximumTemperature);
    const loss = thermal.dissipation * (maximumTemperature - steadyCurrent.ambient);
    // A polymer PTC holds on the low branch: its balance lies at the fold, well below its highest temperature.
    if ((part as Part).kind === 'polymer-ptc') return expect(steadyCurrent.current ** 2 * resistanceAt(part as Part, 365)).toBeLessThan(thermal.dissipation * (365 - steadyCurrent.ambient));
    return expect(heat).toBeLessThanOrEqual(loss);
  });
});
