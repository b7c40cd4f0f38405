import type { Assessment } from '../../../shared/model/result';
import type { CheckId } from '../../../shared/model/check-id';
import type { Check } from '../../../shared/model/check';
import type { Scenario, ScenarioInput } from '../../../shared/model/scenario';
import { assess } from '../../../simulation';
import { bypassScenario, limiterWith, mainsScenario, railScenario } from '../../support/study-scenarios';

/** Many statements are about the same few scenarios; each is assessed once. */
const assessed = new Map<string, Assessment>();
const verdictOnly = (scenario: Scenario): Assessment => {
  const key = JSON.stringify(scenario);
  const known = assessed.get(key) ?? assess(scenario, { envelope: false });
  assessed.set(key, known);
  return known;
};
const checkOf = ({ checks }: Assessment, id: CheckId): Check | undefined => checks.find((check) => check.id === id);
const idsOf = ({ checks }: Assessment): CheckId[] => checks.map(({ id }) => id);

describe('the checks of a scenario', () => {
  it('follow the blocks of the path: what is not there makes no check', () => {
    const bare = verdictOnly(mainsScenario({ fuse: undefined, limiter: [], load: { kind: 'none' } }));
    expect(new Set(idsOf(bare))).toEqual(new Set(['peak-current', 'diode-surge', 'diode-i2t']));
    const rail = idsOf(verdictOnly(railScenario()));
    expect(rail).toContain('ptc-hold');
    expect(rail).not.toContain('diode-surge');
    expect(rail).not.toContain('limiter-energy');
    expect(rail).not.toContain('cold-start-reach');
  });

  it('come most pressing first, and the verdict is that of the first', () => {
    const { checks, verdict } = verdictOnly(bypassScenario());
    const order = ['fail', 'not-assessed', 'caution', 'pass'];
    const ranks = checks.map(({ status }) => order.indexOf(status));
    expect(ranks).toEqual([...ranks].sort());
    expect(verdict.status).toBe(checks[0]!.status);
  });

  it('each carry value, corner and basis, and a margin of 1 − ratio', () => {
    for (const check of verdictOnly(mainsScenario()).checks) {
      expect(check.basis.length).toBeGreaterThan(10);
      expect(check.corner).not.toBeNull();
      expect(Number.isFinite(check.value)).toBe(true);
      expect(check.margin).toBeCloseTo(1 - check.ratio!, 12);
      expect(check.ratio!).toBeGreaterThanOrEqual(check.nominalRatio! * 0.999);
    }
  });

  it('keep what a person set aside, with the reason, and leave it out of the verdict', () => {
    const failing = { limits: { peakCurrent: 5 } };
    const setAside = [
      { check: 'peak-current', reason: 'measured on the bench' },
      { check: 'restart-peak-current', reason: 'measured on the bench' },
    ] as const;
    expect(verdictOnly(mainsScenario(failing)).verdict.status).toBe('fail');
    const after = verdictOnly(mainsScenario({ ...failing, setAside: [...setAside] }));
    expect(after.verdict.counts['set-aside']).toBe(2);
    expect(after.verdict.status).not.toBe('fail');
    expect(checkOf(after, 'peak-current')).toMatchObject({ status: 'fail', setAside: 'measured on the bench' });
  });
});

describe('a design over the energy rating of its part', () => {
  it('is flagged as a failure, with the corner of the highest line and capacitance', () => {
    const assessment = verdictOnly(mainsScenario({ limiter: limiterWith({ ratings: { maximumTemperature: '220 °C', energy: { energy: 15, basis: 'absorbed' } } }) }));
    const check = checkOf(assessment, 'limiter-energy')!;
    expect(check.status).toBe('fail');
    expect(assessment.verdict.status).toBe('fail');
    const levelOf = (factor: string) => check.corner!.factors.find((one) => one.factor === factor)!.level;
    expect(levelOf('line')).toBe('high');
    expect(levelOf('capacitance')).toBe('high');
  });

  it('keeps its one-node peak temperature at a caution', () => {
    const assessment = verdictOnly(mainsScenario({ limiter: limiterWith({ ratings: { maximumTemperature: '220 °C', energy: { energy: 15, basis: 'absorbed' } } }) }));
    expect(checkOf(assessment, 'limiter-peak-temperature')!.status).toBe('caution');
  });
});

const noRatings = { limiter: limiterWith({ ratings: {} }) };
const bareFuse: ScenarioInput['fuse'] = { ratedCurrent: 6.3 };
const bareBridge: ScenarioInput['rectifier'] = { kind: 'bridge', forwardVoltage: 0.9, slopeResistance: 0.02 };

describe('a missing figure is never a silent pass', () => {
  it.each<[CheckId, Scenario, string]>([
    ['peak-current', mainsScenario({ limits: {} }), 'peak current limit'],
    ['restart-peak-current', mainsScenario({ limits: {} }), 'peak current limit'],
    ['diode-surge', mainsScenario({ rectifier: bareBridge }), 'I_FSM'],
    ['diode-i2t', mainsScenario({ rectifier: bareBridge }), 'I²t'],
    ['fuse-running-i2t', mainsScenario({ fuse: bareFuse }), 'pre-arcing'],
    ['fuse-breaking-capacity', mainsScenario({ fuse: bareFuse }), 'breaking capacity'],
    ['limiter-energy', mainsScenario(noRatings), 'energy rating'],
    ['limiter-restart-energy', mainsScenario(noRatings), 'energy rating'],
    ['limiter-capacitance', mainsScenario(noRatings), 'capacitance rating'],
    ['limiter-peak-temperature', mainsScenario(noRatings), 'maximum body temperature'],
    ['limiter-steady-temperature', mainsScenario(noRatings), 'maximum body temperature'],
    ['limiter-steady-current', mainsScenario(noRatings), 'steady current rating'],
    ['ptc-time-to-trip', railScenario({ fault: undefined }), 'fault'],
    ['ptc-time-to-trip', railScenario({ limits: {} }), 'time allowed'],
  ])('%s', (id, scenario, words) => {
    const check = checkOf(verdictOnly(scenario), id)!;
    expect(check.status).toBe('not-assessed');
    expect(check.remark).toContain(words);
  });

  it('leaves out the checks of limits that a person may or may not set: loss and voltage drop', () => {
    expect(idsOf(verdictOnly(mainsScenario()))).not.toContain('limiter-loss');
    expect(idsOf(verdictOnly(mainsScenario({ limits: { peakCurrent: 80, limiterLoss: 20 } })))).toContain('limiter-loss');
    expect(idsOf(verdictOnly(railScenario({ limits: {} })))).not.toContain('ptc-voltage-drop');
  });

  it('is at best a caution where the fuse has no rating at the highest ambient', () => {
    expect(checkOf(verdictOnly(mainsScenario({ fuse: bareFuse })), 'fuse-steady-current')!.status).toBe('caution');
  });

  it('is at best a caution for a cold start below 0 °C without cold figures of the bulk capacitor', () => {
    const ambient = { nominal: '25 °C', min: '-20 °C', max: '40 °C' };
    const cold = verdictOnly(mainsScenario({ ambient, load: { kind: 'constant-power', power: 20, startVoltage: 150, stopVoltage: 60 } }));
    expect(checkOf(cold, 'cold-start-reach')!.status).toBe('caution');
  });
});

describe('a wider tolerance', () => {
  const band = (nominal: number, share: number) => ({ nominal, min: nominal * (1 - share), max: nominal * (1 + share) });
  const scenarioWith = (share: number): Scenario =>
    mainsScenario({
      source: { kind: 'ac', voltage: band(230, share / 2), frequencies: [50], impedance: { resistance: band(0.35, share), inductance: '100u' } },
      bulk: { capacitance: band(470e-6, share), esr: band(0.15, share), bleeder: '100k' },
      limiter: limiterWith({ law: { law: 'b-value', r25: band(10, share), b: band(3000, share / 5) } }),
    });

  it('never improves a margin', () => {
    const margins = [0, 0.1, 0.2].map((share) => new Map(verdictOnly(scenarioWith(share)).checks.map(({ id, margin }) => [id, margin!])));
    for (const [id, narrow] of margins[0]!) {
      expect(margins[1]!.get(id)!).toBeLessThanOrEqual(narrow + 2e-3);
      expect(margins[2]!.get(id)!).toBeLessThanOrEqual(margins[1]!.get(id)! + 2e-3);
    }
  });
});

describe('a hot restart', () => {
  it('with a bypass contact is not monotonic in the time off: harmless, worst just before the release, harmless again', () => {
    const { restart } = verdictOnly(bypassScenario({ limits: { peakCurrent: 110 } }));
    const { offTime, peakCurrent, worstOffTime, withinAfter } = restart!;
    const peakNear = (time: number) => peakCurrent[offTime.findIndex((one) => one >= time)]!;
    expect(worstOffTime).toBeLessThan(0.18);
    expect(Math.max(...peakCurrent)).toBeGreaterThan(1.5 * peakNear(0.18));
    expect(peakNear(0.01)).toBeLessThan(Math.max(...peakCurrent));
    expect(withinAfter).toBeCloseTo(0.18, 3);
  });

  it('without a contact is worst after the bus has run down and before the body has cooled', () => {
    const { restart } = verdictOnly(mainsScenario());
    expect(restart!.worstOffTime).toBeGreaterThan(0.1);
    expect(restart!.worstOffTime).toBeLessThan(60);
    expect(restart!.peakCurrent.at(-1)!).toBeLessThan(0.9 * Math.max(...restart!.peakCurrent));
  });
});

describe('the envelope', () => {
  it('holds the nominal run and the governing peak of every corner', () => {
    const { envelope, run, checks, corners } = assess(mainsScenario());
    expect(corners.length).toBeGreaterThan(2);
    const { low, high } = envelope!.waveform.current;
    run.traces.waveform.current.forEach((current, index) => {
      expect(current).toBeLessThanOrEqual(high[index]! + 1e-9);
      expect(current).toBeGreaterThanOrEqual(low[index]! - 1e-9);
    });
    const peak = checks.find(({ id }) => id === 'peak-current')!.value!;
    expect(Math.max(...high)).toBeGreaterThan(0.99 * peak);
  });

  it('is absent where nothing has a range, and where only the verdict is asked for', () => {
    expect(verdictOnly(mainsScenario()).envelope).toBeNull();
    const fixed = mainsScenario({
      source: { kind: 'ac', voltage: 230, frequencies: [50], impedance: { resistance: 0.35, inductance: 0 } },
      limiter: limiterWith({ law: { law: 'b-value', r25: 10, b: 3000 } }),
      bulk: { capacitance: '470u', esr: 0.1 },
      ambient: '25 °C',
    });
    const { envelope, checks } = assess(fixed);
    expect(envelope).toBeNull();
    expect(checks.every(({ corner }) => corner?.factors.length === 0)).toBe(true);
  });
});
