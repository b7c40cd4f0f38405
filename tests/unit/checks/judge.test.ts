import { finding, judge, type Judgement } from '../../../simulation/checks/judge';

const current = (more: Partial<Judgement>): Judgement => ({
  id: 'peak-current',
  dimension: 'current',
  kind: 'peak',
  sense: 'at-most',
  finding: finding(40, 20),
  rating: 80,
  basis: 'by hand',
  ...more,
});

describe('a value held against an upper limit', () => {
  it('has the margin 1 − value/rating', () => {
    expect(judge(current({}), 0.1)).toMatchObject({ status: 'pass', ratio: 0.5, nominalRatio: 0.25, margin: 0.5, remark: null });
  });

  it('is a caution where the margin is below the team setting, and passes exactly at it', () => {
    expect(judge(current({ finding: finding(73, null) }), 0.1).status).toBe('caution');
    expect(judge(current({ finding: finding(60, null) }), 0.25).status).toBe('pass');
    expect(judge(current({ finding: finding(60.1, null) }), 0.25).status).toBe('caution');
  });

  it('fails beyond the rating and not at it', () => {
    expect(judge(current({ finding: finding(80, null) }), 0).status).toBe('pass');
    const beyond = judge(current({ finding: finding(100, null) }), 0.1);
    expect(beyond).toMatchObject({ status: 'fail', ratio: 1.25, margin: -0.25 });
  });
});

describe('a value held against a lower limit', () => {
  it('has the margin 1 − rating/value', () => {
    const check = judge(current({ sense: 'at-least', finding: finding(200, 250), rating: 150 }), 0.1);
    expect(check).toMatchObject({ status: 'pass', ratio: 0.75, nominalRatio: 0.6, margin: 0.25 });
  });

  it('fails below the rating', () => {
    expect(judge(current({ sense: 'at-least', finding: finding(100, null), rating: 150 }), 0.1)).toMatchObject({ status: 'fail', margin: -0.5 });
  });
});

describe('a use without bound', () => {
  it('fails in words instead of a number that no one can read', () => {
    const nothingLeft = judge(current({ sense: 'at-least', finding: finding(0, null), rating: 150 }), 0.1);
    expect(nothingLeft).toMatchObject({ status: 'fail', ratio: null, margin: null });
    expect(nothingLeft.remark).toContain('nothing at all is left');
    expect(judge(current({ rating: 0 }), 0.1)).toMatchObject({ status: 'fail', ratio: null });
    expect(judge(current({ finding: finding(0, null), rating: 0 }), 0.1)).toMatchObject({ status: 'pass', ratio: 0 });
  });
});

describe('a temperature', () => {
  it('is compared as rise over the ambient of its own case', () => {
    const check = judge(
      current({ dimension: 'temperature', finding: finding(433.15, 373.15), rating: 493.15, above: { worst: 313.15, nominal: 298.15 } }),
      0.1,
    );
    expect(check.ratio).toBeCloseTo(120 / 180, 12);
    expect(check.nominalRatio).toBeCloseTo(75 / 195, 12);
  });
});

describe('what is missing or assumed', () => {
  it('is never a silent pass: an absent rating names the figure', () => {
    const check = judge(current({ rating: null, missing: ['the peak limit'] }), 0.1);
    expect(check).toMatchObject({ status: 'not-assessed', ratio: null, margin: null, remark: 'Missing: the peak limit.' });
  });

  it('does not hide a failure that is known already', () => {
    expect(judge(current({ finding: finding(90, null), missing: ['the pulse factor'] }), 0.1).status).toBe('fail');
    expect(judge(current({ finding: finding(10, null), missing: ['the pulse factor'] }), 0.1).status).toBe('not-assessed');
  });

  it('turns a pass into a caution where a figure is assumed', () => {
    expect(judge(current({ cautions: ['Assumed.'] }), 0.1)).toMatchObject({ status: 'caution', remark: 'Assumed.' });
  });

  it('leaves a pass a pass where there is only a note', () => {
    expect(judge(current({ notes: ['By the way.'] }), 0.1)).toMatchObject({ status: 'pass', remark: 'By the way.' });
  });

  it('is not assessed where the run gave no value', () => {
    const check = judge(current({ finding: finding(null, null) }), 0.1);
    expect(check.status).toBe('not-assessed');
    expect(check.remark).toContain('ended before');
  });

  it('fails in words whatever the numbers', () => {
    expect(judge(current({ finding: finding(null, null), failure: 'Never starts.' }), 0.1)).toMatchObject({ status: 'fail', remark: 'Never starts.' });
  });
});
