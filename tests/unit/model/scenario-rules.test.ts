import { samplePart, sampleScenario } from '../../support/sample-scenario';
import { issuesOf } from './input';

const source = (more: object) => ({ source: { ...sampleScenario().source, ...more } });
const withPart = (more: object) => ({ limiter: [{ part: { ...samplePart(), ...more } }] });
const ntcLaw = (law: object) => withPart({ law });
const ptcLaw = (law: object) => withPart({ kind: 'polymer-ptc', law: { law: 'sigmoid', low: '0.1', high: '100k', midpoint: '125 °C', width: '5 K', ...law } });
const fuse = (more: object) => ({ fuse: { ratedCurrent: '2 A', ...more } });
const load = (more: object) => ({ load: { kind: 'constant-power', power: 100, startVoltage: 200, ...more } });

describe('the sample is valid as it stands', () => {
  it('has no issue', () => expect(issuesOf({})).toEqual([]));
});

describe('a wrong field is named with what to do', () => {
  it.each<[string, object, string]>([
    ['a missing block', { bulk: undefined }, 'bulk: is missing'],
    ['a missing quantity', { bulk: { esr: 0 } }, 'bulk.capacitance: is missing: write a value such as "470u", or an object with nominal and either tolerance, or min and max'],
    ['an unknown field', { colour: 'red' }, 'colour: is not a field here'],
    ['a value outside its range', { bulk: { capacitance: '470 F', esr: 0 } }, 'bulk.capacitance: 470 F is outside 100 nF to 10 F'],
    ['a text that is no quantity', { bulk: { capacitance: 'big', esr: 0 } }, 'bulk.capacitance: "big" is not a value in F; write for example 470u'],
    ['a number that JSON cannot hold', { duration: Number.POSITIVE_INFINITY }, 'duration: write a number in s, or text such as "300m"'],
    ['an impedance in both ways', source({ impedance: { resistance: 1, inductance: 0, prospectiveCurrent: 100 } }), 'source.impedance: give either resistance and inductance, or prospectiveCurrent and reactanceRatio'],
    ['half an impedance', source({ impedance: { resistance: 1 } }), 'source.impedance: give either resistance and inductance, or prospectiveCurrent and reactanceRatio'],
    ['an AC source without a bridge', { rectifier: { kind: 'none' } }, 'rectifier.kind: an AC source needs a bridge ahead of the bulk capacitor'],
    ['a programme that begins with on', source({ programme: [{ at: 0.1, switch: 'on' }] }), 'source.programme.0.switch: must be "off": the supply is on at 0 s and each step changes it'],
    ['a programme out of order', source({ programme: [{ at: 0.2, switch: 'off' }, { at: 0.1, switch: 'on' }] }), 'source.programme.1.at: must be later than the step before it'],
    ['a programme beyond the end', source({ programme: [{ at: 0.7, switch: 'off' }] }), 'source.programme.0.at: must lie before the end of the run'],
    ['a fault beyond the end', { fault: { kind: 'resistance', at: 0.5, resistance: 1 } }, 'fault.at: must lie before the end of the run'],
    ['a stop voltage above the start', load({ stopVoltage: 200 }), 'load.stopVoltage: must be below the start voltage'],
    ['a pre-arcing curve out of order', fuse({ preArcing: [{ time: 0.01, i2t: 5 }, { time: 0.01, i2t: 6 }] }), 'fuse.preArcing.1.time: times must rise along the curve'],
    ['a heat capacity and a time constant', withPart({ thermal: { dissipation: '17m', timeConstant: 60, heatCapacity: 1 } }), 'limiter.0.part.thermal: give either timeConstant or heatCapacity'],
    ['neither of them', withPart({ thermal: { dissipation: '17m' } }), 'limiter.0.part.thermal: give either timeConstant or heatCapacity'],
    ['a body rated below the ambient', { ...withPart({ ratings: { maximumTemperature: '70 °C' } }), ambient: '70 °C' }, 'limiter.0.part.ratings.maximumTemperature: must be above the highest ambient'],
    ['a current rated at the highest body temperature', withPart({ ratings: { maximumTemperature: '100 °C', steadyCurrent: { current: 1, ambient: '100 °C' } } }), 'limiter.0.part.ratings.steadyCurrent.ambient: must be below the highest body temperature'],
    ['an energy rated from the highest body temperature', withPart({ ratings: { maximumTemperature: '100 °C', energy: { energy: 1, basis: 'absorbed', startTemperature: '100 °C' } } }), 'limiter.0.part.ratings.energy.startTemperature: must be below the highest body temperature'],
    ['a derating curve out of order', withPart({ ratings: { steadyCurrent: { current: 1, ambient: '25 °C', derating: [{ ambient: '60 °C', share: 1 }, { ambient: '50 °C', share: 0.5 }] } } }), 'limiter.0.part.ratings.steadyCurrent.derating.1.ambient: ambients must rise along the derating curve'],
    ['a PTC that hardly rises', ptcLaw({ low: 1, high: 10 }), 'limiter.0.part.law.high: must be more than ten times the low resistance'],
    ['Steinhart–Hart coefficients that fit nothing', ntcLaw({ law: 'steinhart-hart', a: 0, b: 0, c: 0 }), 'limiter.0.part.law.b: with these coefficients the resistance does not fall from -40 °C to 150 °C; check their order and units'],
    ['a reason too short', { setAside: [{ check: 'peak-current', reason: ' a ' }] }, 'setAside.0.reason: say why, and which document covers it'],
    ['peak where rms is meant', fuse({ ratedCurrent: '2 A peak' }), 'fuse.ratedCurrent: this field is in A rms, not peak; write for example 16 A rms'],
    ['rms where peak is meant', { limits: { peakCurrent: '20 A rms' } }, 'limits.peakCurrent: this field is in A peak, not rms; write for example 16 A peak'],
    ['rms where neither is meant', load({ startVoltage: '200 V rms' }), 'load.startVoltage: this field takes neither rms nor peak; write it without "rms"'],
  ])('%s', (_, more, issue) => expect(issuesOf(more)).toEqual([issue]));
});

describe('an R–T table of an NTC', () => {
  const table = (...pairs: [number, number][]) => ntcLaw({ law: 'table', points: pairs.map(([temperature, resistance]) => ({ temperature, resistance })) });

  it('falls while the temperature rises', () => expect(issuesOf(table([273, 30], [298, 10], [323, 4]))).toEqual([]));
  it('names the row where the temperature does not rise', () =>
    expect(issuesOf(table([273, 30], [273, 10], [323, 4]))).toEqual(['limiter.0.part.law.points.1.temperature: temperatures must rise down the table']));
  it('names the row where the resistance does not fall', () =>
    expect(issuesOf(table([273, 30], [298, 10], [323, 10]))).toEqual(['limiter.0.part.law.points.2.resistance: the resistance of an NTC must fall down the table']));
  it('has at least three rows', () => expect(issuesOf(table([273, 30], [298, 10]))[0]).toMatch(/^limiter\.0\.part\.law\.points: /));
  it('is not empty', () => expect(issuesOf(table())[0]).toMatch(/^limiter\.0\.part\.law\.points: /));
});
