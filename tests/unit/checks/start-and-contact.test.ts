import { bypassLoadCoincidenceCheck } from '../../../simulation/checks/bypass-load-coincidence';
import { bypassSecondPeakCheck } from '../../../simulation/checks/bypass-second-peak';
import { bypassWeldedCheck } from '../../../simulation/checks/bypass-welded';
import { coldStartHoldCheck } from '../../../simulation/checks/cold-start-hold';
import { coldStartReachCheck, NO_COLD_FIGURES } from '../../../simulation/checks/cold-start-reach';
import { finding } from '../../../simulation/checks/judge';
import { peakCurrentCheck } from '../../../simulation/checks/peak-current';
import { restartPeakCurrentCheck } from '../../../simulation/checks/restart-peak-current';

describe('peak currents', () => {
  it('are not assessed without a limit, cold or hot', () => {
    for (const check of [peakCurrentCheck(finding(40, 30), undefined, 0.1), restartPeakCurrentCheck(finding(40, 30), undefined, false, 0.1)]) {
      expect(check).toMatchObject({ status: 'not-assessed', value: 40 });
      expect(check.remark).toContain('peak current limit');
    }
  });

  it('say where a restart meets a contact that is still closed', () => {
    expect(restartPeakCurrentCheck(finding(195, 150), 80, true, 0.1)).toMatchObject({ status: 'fail' });
    expect(restartPeakCurrentCheck(finding(195, 150), 80, true, 0.1).remark).toContain('not yet released');
  });
});

describe('a cold start', () => {
  it('passes with the bus above its start voltage, and fails in words below it', () => {
    expect(coldStartReachCheck(finding(280, 310), 200, [], 0.1)).toMatchObject({ status: 'pass', margin: 1 - 200 / 280 });
    const never = coldStartReachCheck(finding(190, 310), 200, [], 0.1);
    expect(never.status).toBe('fail');
    expect(never.remark).toContain('never starts');
  });

  it('is at best a caution where the cold figures of the bulk capacitor are absent', () => {
    expect(coldStartReachCheck(finding(280, 310), 200, [NO_COLD_FIGURES], 0.1).status).toBe('caution');
  });

  it('fails in words when it hiccups or never starts', () => {
    expect(coldStartHoldCheck({ finding: finding(180, 250), stopVoltage: 140, starts: 1 }, [], 0.1).status).toBe('pass');
    const hiccup = coldStartHoldCheck({ finding: finding(139.9, 250), stopVoltage: 140, starts: 7 }, [], 0.1);
    expect(hiccup.status).toBe('fail');
    expect(hiccup.remark).toContain('7 times');
    expect(coldStartHoldCheck({ finding: finding(null, 250), stopVoltage: 140, starts: 0 }, [], 0.1).status).toBe('fail');
  });
});

describe('the second peak of a closing contact', () => {
  const one = { element: 0, finding: finding(36, 19), makingCurrent: 50, limit: undefined, contactVoltage: 21.234 };

  it('is held against the making current', () => {
    const check = bypassSecondPeakCheck(one, 0.1);
    expect(check).toMatchObject({ status: 'pass', rating: 50, ratio: 0.72 });
    expect(check.remark).toContain('21.2 V');
  });

  it('is held against the limit of the scenario where that is lower', () => {
    expect(bypassSecondPeakCheck({ ...one, limit: 30 }, 0.1)).toMatchObject({ status: 'fail', rating: 30 });
  });

  it('is not assessed without a making current, unless it is beyond the limit already', () => {
    expect(bypassSecondPeakCheck({ ...one, makingCurrent: undefined }, 0.1)).toMatchObject({ status: 'not-assessed', rating: null });
    expect(bypassSecondPeakCheck({ ...one, makingCurrent: undefined, limit: 80 }, 0.1).status).toBe('not-assessed');
    expect(bypassSecondPeakCheck({ ...one, makingCurrent: undefined, limit: 30 }, 0.1).status).toBe('fail');
  });
});

describe('a contact and the load start', () => {
  it('passes when the contact closes well before the load starts', () => {
    expect(bypassLoadCoincidenceCheck(0, finding(0.3, 0.3), { worst: 0.6, nominal: 0.8 }, 0.1)).toMatchObject({ status: 'pass', ratio: 0.5 });
  });

  it('is a caution, not a failure, when the load starts first: a sequence breaks no rating by itself', () => {
    const check = bypassLoadCoincidenceCheck(0, finding(0.3, 0.3), { worst: 0.06, nominal: 0.06 }, 0.1);
    expect(check.status).toBe('caution');
    expect(check.remark).toContain('load starts before');
  });

  it('is not assessed when the load never starts', () => {
    expect(bypassLoadCoincidenceCheck(0, finding(0.3, 0.3), { worst: null, nominal: null }, 0.1).status).toBe('not-assessed');
  });
});

describe('a welded contact', () => {
  const surge = { current: 200, pulseWidth: 0.01 };
  const welded = { element: 0, finding: finding(300, 250), surge, width: { worst: 1e-3, nominal: 1e-3 }, limit: 80, hasRectifier: true };

  it('is held against what breaks, and says when it is beyond the limit of the scenario', () => {
    const check = bypassWeldedCheck(welded, 0.1);
    expect(check.status).toBe('pass');
    expect(check.rating).toBeCloseTo(200 * Math.sqrt(10), 9);
    expect(check.remark).toContain('80 A');
    expect(bypassWeldedCheck({ ...welded, finding: finding(700, 250) }, 0.1).status).toBe('fail');
  });

  it('is not assessed without the surge current of the rectifier', () => {
    expect(bypassWeldedCheck({ ...welded, surge: undefined }, 0.1).status).toBe('not-assessed');
  });

  it('is held against the limit where there is no rectifier, and not assessed without one', () => {
    const direct = { ...welded, surge: undefined, hasRectifier: false };
    expect(bypassWeldedCheck(direct, 0.1)).toMatchObject({ status: 'fail', rating: 80 });
    expect(bypassWeldedCheck({ ...direct, limit: undefined }, 0.1).status).toBe('not-assessed');
  });
});
