import { resultOf } from '../../../server/bin/simulate/result';
import type { Check } from '../../../shared/model/check';
import type { Assessment } from '../../../shared/model/result';

const check = (more: Partial<Check>): Check => ({
  id: 'peak-current', element: null, title: 'Peak current', status: 'pass', dimension: 'current', kind: 'peak', sense: 'at-most',
  value: 1, nominal: 1, rating: 2, ratio: 0.5, nominalRatio: 0.5, margin: 0.5, corner: null, phase: null, offTime: null, basis: '', remark: null, setAside: null,
  ...more,
});

const assessment = (checks: Check[], run: Partial<Assessment['run']> = {}) =>
  ({ engineVersion: '1', verdict: {}, checks, corners: [], restart: null, envelope: null, run: { stopped: null, audit: { clean: true }, ...run } }) as unknown as Assessment;

const because = (checks: Check[], accepted: Check['id'][] = [], run: Partial<Assessment['run']> = {}) => {
  const { withinRatings, because: reasons } = resultOf('sample', assessment(checks, run), new Set(accepted));
  expect(withinRatings).toBe(reasons.length === 0);
  return reasons;
};

describe('a design is within ratings when nothing speaks against it', () => {
  it('passes and cautions are within', () => expect(because([check({}), check({ status: 'caution' })])).toEqual([]));
  it('a failed check is named', () => expect(because([check({ status: 'fail' })])).toEqual(['peak-current: fails']));
  it('so is the element that it is about', () => expect(because([check({ id: 'limiter-energy', status: 'fail', element: 1 })])).toEqual(['limiter-energy, element 1: fails']));
  it('what is not assessed counts against it, with what is missing', () =>
    expect(because([check({ status: 'not-assessed', remark: 'no limit given' })])).toEqual(['peak-current: not assessed, no limit given']));
  it('unless it is accepted by name', () => expect(because([check({ status: 'not-assessed' })], ['peak-current'])).toEqual([]));
  it('but a failed check is never accepted', () => expect(because([check({ status: 'fail' })], ['peak-current'])).toEqual(['peak-current: fails']));
  it('a check that a person set aside does not count', () => expect(because([check({ status: 'fail', setAside: 'covered by report 7' })])).toEqual([]));
  it('a run that stopped early is not within', () =>
    expect(because([], [], { stopped: { reason: 'step-budget', at: 2, place: 'load', advice: 'shorten the run' } })).toEqual(['the run stopped at 2 s: shorten the run']));
  it('nor is one whose audit is not clean', () => expect(because([], [], { audit: { clean: false } as Assessment['run']['audit'] })).toEqual(['the self-audit is not clean: see audit']));
});
