import { finding, judge } from '../../../simulation/checks/judge';
import { inOrder, setAsideIn, verdictOf } from '../../../simulation/checks/verdict';
import type { CheckId } from '../../../shared/model/check-id';

const check = (id: CheckId, value: number | null, rating: number | null) =>
  judge(
    { id, dimension: 'current', sense: 'at-most', finding: finding(value, null), rating, basis: 'by hand', missing: rating === null ? ['it'] : [] },
    0.1,
  );

const pass = check('diode-surge', 1, 10);
const narrow = check('fuse-steady-current', 5, 10);
const caution = check('diode-i2t', 9.5, 10);
const unknown = check('fuse-breaking-capacity', 1, null);
const fail = check('peak-current', 11, 10);
const worse = check('limiter-energy', 20, 10);

describe('the order of the verdict', () => {
  it('is fail, not assessed, caution, pass, and the smallest margin first', () => {
    const ids = inOrder([pass, narrow, unknown, caution, fail, worse]).map(({ id }) => id);
    expect(ids).toEqual(['limiter-energy', 'peak-current', 'fuse-breaking-capacity', 'diode-i2t', 'fuse-steady-current', 'diode-surge']);
  });
});

describe('the status of the verdict', () => {
  it('is the worst of its checks', () => {
    expect(verdictOf([pass, caution]).status).toBe('caution');
    expect(verdictOf([pass, caution, unknown]).status).toBe('not-assessed');
    expect(verdictOf([pass, caution, unknown, fail]).status).toBe('fail');
    expect(verdictOf([pass])).toEqual({ status: 'pass', counts: { fail: 0, 'not-assessed': 0, caution: 0, pass: 1, 'set-aside': 0 } });
  });

  it('does not count what a person set aside, but lists and numbers it', () => {
    const checks = setAsideIn([fail, pass], [{ check: 'peak-current', reason: 'covered by the bench record' }]);
    expect(inOrder(checks).map(({ id, setAside }) => [id, setAside])).toEqual([
      ['diode-surge', null],
      ['peak-current', 'covered by the bench record'],
    ]);
    expect(verdictOf(checks)).toEqual({ status: 'pass', counts: { fail: 0, 'not-assessed': 0, caution: 0, pass: 1, 'set-aside': 1 } });
  });

  it('is not assessed where everything is set aside', () => {
    const checks = setAsideIn([fail], [{ check: 'peak-current', reason: 'covered elsewhere' }]);
    expect(verdictOf(checks).status).toBe('not-assessed');
  });
});
