import { bypassNeverClosesCheck } from '../../../simulation/checks/bypass-never-closes';
import { finding } from '../../../simulation/checks/judge';
import { limiterLossCheck } from '../../../simulation/checks/limiter-loss';
import { limiterPeakTemperatureCheck } from '../../../simulation/checks/limiter-peak-temperature';
import { deratedCurrent, limiterSteadyCurrentCheck } from '../../../simulation/checks/limiter-steady-current';
import { limiterSteadyTemperatureCheck } from '../../../simulation/checks/limiter-steady-temperature';
import type { TemperatureCase } from '../../../simulation/checks/temperature-check';
import { ratingsSchema } from '../../../shared/model/part';

const body = (more: Partial<TemperatureCase> = {}): TemperatureCase => ({
  element: 0,
  finding: finding(413.15, 373.15),
  ambient: { worst: 313.15, nominal: 293.15 },
  maximum: 513.15,
  extrapolated: false,
  ...more,
});

describe('a body temperature', () => {
  it('is held as rise over ambient', () => {
    const check = limiterSteadyTemperatureCheck(body(), 0.1);
    expect(check.status).toBe('pass');
    expect(check.ratio).toBeCloseTo(0.5, 12);
    expect(check.nominalRatio).toBeCloseTo(80 / 220, 12);
    expect(check.remark).toContain('Hot surface');
  });

  it('at its peak is at best a caution unless the energy check passes', () => {
    expect(limiterPeakTemperatureCheck(body(), true, 0.1).status).toBe('pass');
    expect(limiterPeakTemperatureCheck(body(), false, 0.1).status).toBe('caution');
    expect(limiterPeakTemperatureCheck(body({ finding: finding(600, 600) }), true, 0.1).status).toBe('fail');
  });

  it('beyond the range of the resistance law is at best a caution', () => {
    expect(limiterSteadyTemperatureCheck(body({ extrapolated: true }), 0.1).status).toBe('caution');
  });

  it('is not assessed without a maximum', () => {
    for (const check of [limiterSteadyTemperatureCheck, bypassNeverClosesCheck]) {
      expect(check(body({ maximum: undefined }), 0.1)).toMatchObject({ status: 'not-assessed', margin: null });
    }
    expect(limiterPeakTemperatureCheck(body({ maximum: undefined }), true, 0.1).status).toBe('not-assessed');
  });

  it('with a contact that never closes fails above the maximum', () => {
    expect(bypassNeverClosesCheck(body({ finding: finding(533.15, 400) }), 0.1).status).toBe('fail');
  });
});

const steady = (more: object = {}) => ratingsSchema.parse({ steadyCurrent: { current: 4, ambient: 338.15, ...more } }).steadyCurrent!;

describe('a steady current rating', () => {
  // Flat to its ambient, then linear to zero at T_max: common practice, no source.
  it('without a curve is flat to its ambient, then falls to zero at T_max', () => {
    expect(deratedCurrent(steady(), 313.15, 438.15).current).toBe(4);
    expect(deratedCurrent(steady(), 388.15, 438.15).current).toBeCloseTo(2, 12);
    expect(deratedCurrent(steady(), 440, 438.15).current).toBe(0);
  });

  it('without a curve and T_max is unknown above its ambient', () => {
    expect(deratedCurrent(steady(), 338.15, undefined).current).toBe(4);
    expect(deratedCurrent(steady(), 339, undefined).current).toBeNull();
  });

  it('follows its curve', () => {
    const curve = steady({ derating: [{ ambient: 333.15, share: 1 }, { ambient: 373.15, share: 0.5 }] });
    expect(deratedCurrent(curve, 300, undefined).current).toBe(4);
    expect(deratedCurrent(curve, 353.15, undefined).current).toBeCloseTo(3, 12);
    expect(deratedCurrent(curve, 398.15, 423.15)).toEqual({ current: 1, beyondCurve: true });
    expect(deratedCurrent(curve, 398.15, undefined)).toEqual({ current: 0, beyondCurve: true });
  });

  it('is compared at the ambient of the corner', () => {
    const ratings = ratingsSchema.parse({ maximumTemperature: 438.15, steadyCurrent: { current: 4, ambient: 338.15 } });
    const check = limiterSteadyCurrentCheck({ element: 0, finding: finding(1.5, 1), ambient: { worst: 388.15, nominal: 298.15 }, ratings }, 0.1);
    expect(check.ratio).toBeCloseTo(0.75, 12);
    expect(check.nominalRatio).toBeCloseTo(0.25, 12);
  });

  it('is not assessed without the figure, nor where T_max is needed and absent', () => {
    const at = (given: object) =>
      limiterSteadyCurrentCheck({ element: 0, finding: finding(1, 1), ambient: { worst: 350, nominal: 298 }, ratings: ratingsSchema.parse(given) }, 0.1);
    expect(at({}).remark).toContain('steady current rating');
    expect(at({ steadyCurrent: { current: 4, ambient: 338.15 } })).toMatchObject({ status: 'not-assessed' });
  });
});

describe('the loss in the limiter', () => {
  it('is held against the limit, and without one there is no check', () => {
    expect(limiterLossCheck(finding(3, 2), 4, 0.1)[0]).toMatchObject({ status: 'pass', ratio: 0.75 });
    expect(limiterLossCheck(finding(3, 2), undefined, 0.1)).toEqual([]);
  });
});
