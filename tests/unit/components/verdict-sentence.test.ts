import { placeOfPath } from '@/components/scenario/place-of-path';
import { convertedImpedance } from '@/components/scenario/editor/impedance';
import { spokenSentence, verdictSentence } from '@/components/scenario/result/verdict-sentence';
import { signInHref, wantedHref } from '@/components/session/wanted-address';
import type { Check, Status } from '@/shared/model/check';
import type { Verdict } from '@/shared/model/result';

import { readScenario, sampleCheck } from '../../support/sample-record';

const verdict = (status: Status): Verdict => ({ status, counts: { fail: 0, 'not-assessed': 0, caution: 0, pass: 0, 'set-aside': 0 } });
const sentence = (status: Status, checks: Check[], scenario = readScenario()) => spokenSentence(verdictSentence(verdict(status), checks, scenario));
const restart = sampleCheck({ id: 'restart-peak-current', title: 'Peak current, hot restart', status: 'fail', value: 195.7, offTime: 0.178 });

describe('the verdict in words', () => {
  it('says what is over its limit, and when', () => {
    expect(sentence('fail', [restart])).toBe('Hot restart draws 195.7 A peak, limit 80 A: power back after 178 ms.');
  });

  it('says that power back meets a contact that has not opened yet', () => {
    const [element] = readScenario().limiter;
    const scenario = { ...readScenario(), limiter: [{ ...element!, bypass: { closes: { when: 'time' as const, at: 0.3 }, releaseTime: 0.18, contactResistance: 0.01, behaviour: 'works' as const } }] };
    expect(sentence('fail', [restart], scenario)).toContain('meets a contact still closed');
  });

  it('names the check closest to its rating when all are within', () => {
    expect(sentence('pass', [sampleCheck()])).toBe('Closest to its rating: A cold start draws 40 A peak, limit 80 A.');
  });

  it('says what is missing when a check could not be made', () => {
    expect(sentence('not-assessed', [sampleCheck({ status: 'not-assessed', value: null, remark: 'no limit is given' })])).toBe('Peak current, cold start is not assessed: no limit is given.');
  });

  it('does not lead with a check that was set aside', () => {
    expect(sentence('pass', [{ ...restart, setAside: 'covered by report 12' }, sampleCheck()])).toContain('A cold start draws');
  });

  it('says what is needed where more is better', () => {
    const reach = sampleCheck({ id: 'cold-start-reach', status: 'fail', dimension: 'voltage', kind: null, sense: 'at-least', value: 196, rating: 250 });
    expect(sentence('fail', [reach])).toBe('Started cold, the bus reaches 196 V, at least 250 V needed.');
  });
});

describe('an impedance told the other way', () => {
  const source = readScenario({ source: { kind: 'ac', voltage: 230, frequencies: [50], impedance: { prospectiveCurrent: 460, reactanceRatio: 0 } } }).source;

  it('comes to R = V/I where it has no reactance', () => {
    expect(convertedImpedance(source)).toMatchObject({ resistance: { nominal: 0.5 }, inductance: { nominal: 0 } });
  });

  it('leaves X/R to be filled in where there is no resistance to divide by', () => {
    const pure = readScenario({ source: { kind: 'ac', voltage: 230, frequencies: [50], impedance: { resistance: 0, inductance: '1m' } } }).source;
    expect(convertedImpedance(pure)).toMatchObject({ reactanceRatio: '' });
  });
});

describe('the place of a field', () => {
  it.each([
    ['limiter.1.part.thermal', { page: 'block', block: 'limiter.1' }],
    ['bulk.esr.nominal', { page: 'block', block: 'bulk' }],
    ['fault.at', { page: 'block', block: 'load' }],
    ['limits.peakCurrent', { page: 'limits', block: 'source' }],
    ['ambient.min', { page: 'conditions', block: 'source' }],
  ])('%s', (path, place) => expect(placeOfPath(path)).toEqual(place));
});

describe('the address wanted before sign-in', () => {
  it('is gone back to', () => {
    expect(signInHref('/scenarios/7', 'a b')).toBe('/sign-in?to=%2Fscenarios%2F7%3Fselected%3Da%2520b');
    expect(wantedHref('/scenarios/7')).toBe('/scenarios/7');
  });

  it.each(['//elsewhere.example', 'https://elsewhere.example', '/\\elsewhere.example', 'javascript:alert(1)', '/sign-in?to=/x', undefined])('is the start page instead of %s', (to) => {
    expect(wantedHref(to)).toBe('/');
  });
});
