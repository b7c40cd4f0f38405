import { fuseBreakingCapacityCheck } from '../../../simulation/checks/fuse-breaking-capacity';
import { fuseRunningI2tCheck, fuseUse, preArcingAt } from '../../../simulation/checks/fuse-running-i2t';
import { fuseSteadyCurrentCheck } from '../../../simulation/checks/fuse-steady-current';
import { finding } from '../../../simulation/checks/judge';
import { fuseSchema, type Fuse } from '../../../shared/model/protection';

const fuse = (more: object): Fuse => fuseSchema.parse({ ratedCurrent: 5, ...more });

/** A constant current from `from` to `to`, zero before and after; samples every 0.1 ms. */
const block = (current: number, from: number, to: number, end: number) => {
  const time = Array.from({ length: Math.round(end / 1e-4) + 1 }, (_, index) => index * 1e-4);
  return { time, i2t: time.map((at) => current ** 2 * Math.max(0, Math.min(at, to) - from)) };
};

describe('a minimum pre-arcing curve', () => {
  const curve = fuse({ preArcing: [{ time: 1e-3, i2t: 10 }, { time: 1e-1, i2t: 1000 }] }).preArcing;

  it('is straight in log–log between its points', () => {
    expect(preArcingAt(curve, 1e-2)).toBeCloseTo(100, 9);
  });

  it('is constant I²t before its first and after its last point', () => {
    expect(preArcingAt(curve, 1e-5)).toBe(10);
    expect(preArcingAt(curve, 10)).toBe(1000);
  });

  it('is unknown without a point', () => {
    expect(preArcingAt([], 1)).toBeNull();
  });
});

describe('the running I²t of a fuse', () => {
  const single = fuse({ preArcing: [{ time: 0.01, i2t: 50 }], pulseFactor: 0.5 });

  it('uses a single figure as constant I²t, times the pulse factor', () => {
    const use = fuseUse(block(40, 0, 0.01, 0.05), single);
    expect(use?.value).toBeCloseTo(16, 9);
    expect(use?.rating).toBeCloseTo(25, 9);
  });

  it('is not flattered by a pause before the pulse', () => {
    const curve = fuse({ preArcing: [{ time: 1e-3, i2t: 10 }, { time: 1, i2t: 1000 }], pulseFactor: 1 });
    const [early, late] = [fuseUse(block(100, 0, 1e-3, 0.5), curve), fuseUse(block(100, 0.3, 0.301, 0.5), curve)];
    expect(early!.value / early!.rating).toBeCloseTo(1, 3);
    expect(late!.value / late!.rating).toBeCloseTo(early!.value / early!.rating, 3);
  });

  it('may be highest in mid-pulse: a short spike ahead of a long tail', () => {
    const time = [0, 1e-3, 0.1];
    const use = fuseUse({ time, i2t: [0, 8, 12] }, fuse({ preArcing: [{ time: 1e-3, i2t: 10 }, { time: 0.1, i2t: 100 }], pulseFactor: 1 }));
    expect(use!.width).toBeLessThan(2e-3);
    expect(use!.value / use!.rating).toBeCloseTo(0.8, 2);
  });

  it('leaves a steady current below the rating to the steady check, however long it flows', () => {
    const use = fuseUse({ time: [0, 3600], i2t: [0, 4 ** 2 * 3600] }, single);
    expect(use!.value / use!.rating).toBeCloseTo(16 / 25, 6);
  });

  it('counts two pulses that follow each other closely as one', () => {
    const pulses = { time: [0, 0.01, 0.02, 0.03], i2t: [0, 12, 12, 24] };
    expect(fuseUse(pulses, single)?.value).toBeCloseTo(24, 9);
  });

  it('fails above the rating', () => {
    const check = fuseRunningI2tCheck(finding(30, 20), { worst: 25, nominal: 25 }, single, 0.1);
    expect(check).toMatchObject({ status: 'fail' });
    expect(check.margin).toBeCloseTo(-0.2, 12);
  });

  it('is not assessed for repeated starts without a pulse factor, nor without a curve', () => {
    const once = fuse({ preArcing: [{ time: 0.01, i2t: 50 }] });
    expect(fuseRunningI2tCheck(finding(10, 10), { worst: 50, nominal: 50 }, once, 0.1)).toMatchObject({ status: 'not-assessed', ratio: 0.2 });
    const none = fuseRunningI2tCheck(finding(null, null), { worst: null, nominal: null }, fuse({}), 0.1);
    expect(none.status).toBe('not-assessed');
    expect(none.remark).toContain('pre-arcing');
  });
});

describe('the steady current of a fuse', () => {
  it('is held against the rating at the highest ambient', () => {
    expect(fuseSteadyCurrentCheck(finding(2, 1.5), fuse({ deratedCurrent: 4 }), 0.1)).toMatchObject({ status: 'pass', ratio: 0.5 });
  });

  it('is at best a caution where no such rating is given', () => {
    expect(fuseSteadyCurrentCheck(finding(1, 1), fuse({}), 0.1)).toMatchObject({ status: 'caution', ratio: 0.2 });
    expect(fuseSteadyCurrentCheck(finding(6, 1), fuse({}), 0.1).status).toBe('fail');
  });
});

describe('the breaking capacity of a fuse', () => {
  it('is held against the prospective current', () => {
    expect(fuseBreakingCapacityCheck(finding(1200, 1000), fuse({ breakingCapacity: 1500 }), 0.1)).toMatchObject({ status: 'pass', ratio: 0.8 });
  });

  it('is not assessed without the figure or with a source of no impedance', () => {
    expect(fuseBreakingCapacityCheck(finding(1200, 1000), fuse({}), 0.1).status).toBe('not-assessed');
    const ideal = fuseBreakingCapacityCheck(finding(null, null), fuse({ breakingCapacity: 1500 }), 0.1);
    expect(ideal.status).toBe('not-assessed');
    expect(ideal.remark).toContain('source impedance');
  });
});
