import { diodeI2tCheck } from '../../../simulation/checks/diode-i2t';
import { diodeSurgeCheck, surgeRating } from '../../../simulation/checks/diode-surge';
import { finding } from '../../../simulation/checks/judge';

// Rescaling at constant I²t from 10 ms to 1 ms, held below: common practice, no source.
describe('the surge current of a diode', () => {
  const surge = { current: 200, pulseWidth: 0.01 };

  it('is as stated at the width that it is stated for', () => {
    expect(surgeRating(surge, 0.01)).toBeCloseTo(200, 10);
  });

  it('rises at constant I²t down to 1 ms', () => {
    expect(surgeRating(surge, 0.0025)).toBeCloseTo(400, 10);
    expect(surgeRating(surge, 0.001)).toBeCloseTo(200 * Math.sqrt(10), 10);
  });

  it('is held below 1 ms', () => {
    expect(surgeRating(surge, 1e-4)).toBe(surgeRating(surge, 1e-3));
  });

  it('falls for a pulse that is wider than the stated one', () => {
    expect(surgeRating(surge, 0.04)).toBeCloseTo(100, 10);
  });

  it('is never raised for a rating that is stated below 1 ms', () => {
    expect(surgeRating({ current: 200, pulseWidth: 5e-4 }, 1e-4)).toBeCloseTo(200, 10);
  });

  it('is compared at the width of the pulse', () => {
    const check = diodeSurgeCheck(finding(100, 80), surge, { worst: 0.0025, nominal: 0.01 }, 0.1);
    expect(check).toMatchObject({ status: 'pass', rating: 400 });
    expect(check.ratio).toBeCloseTo(0.25, 12);
    expect(check.nominalRatio).toBeCloseTo(0.4, 12);
  });

  it('is not assessed without the figure', () => {
    const check = diodeSurgeCheck(finding(100, 80), undefined, { worst: 0.0025, nominal: 0.01 }, 0.1);
    expect(check.status).toBe('not-assessed');
    expect(check.remark).toContain('I_FSM');
  });
});

describe('I²t of a diode', () => {
  it('is I_FSM²·t_p/2 where the record has no figure: the I²t of a half sine', () => {
    const check = diodeI2tCheck(finding(100, 50), { current: 200, pulseWidth: 0.01 }, 0.1);
    expect(check).toMatchObject({ rating: 200, ratio: 0.5 });
  });

  it('is the figure of the record where there is one', () => {
    expect(diodeI2tCheck(finding(100, 50), { current: 200, pulseWidth: 0.01, i2t: 125 }, 0.1)).toMatchObject({ rating: 125, ratio: 0.8 });
  });

  it('is not assessed without either', () => {
    expect(diodeI2tCheck(finding(100, 50), undefined, 0.1).status).toBe('not-assessed');
  });
});
