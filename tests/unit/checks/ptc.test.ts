import { foldCurrent } from '../../../simulation/checks/fold-current';
import { finding } from '../../../simulation/checks/judge';
import { ptcHoldCheck } from '../../../simulation/checks/ptc-hold';
import { ptcInrushCheck } from '../../../simulation/checks/ptc-inrush';
import { ptcMaximumCurrentCheck } from '../../../simulation/checks/ptc-maximum-current';
import { ptcMaximumVoltageCheck } from '../../../simulation/checks/ptc-maximum-voltage';
import { ptcSourceCapabilityCheck } from '../../../simulation/checks/ptc-source-capability';
import { ptcTimeToTripCheck } from '../../../simulation/checks/ptc-time-to-trip';
import { ptcVoltageDropCheck } from '../../../simulation/checks/ptc-voltage-drop';

/** Constant resistance up to a step: the balance can only fold at the step. */
const stepAt = (temperature: number, low: number) => ({
  dissipation: 0.01,
  law: {
    resistance: (body: number) => (body < temperature ? low : 1e6 * low),
    slope: () => 0,
    temperature: () => null,
    valid: { min: 0, max: 1000 },
  },
});

describe('the fold current', () => {
  it('of a body with a step at T_sw is √(δ·(T_sw − T_a)/R)', () => {
    // δ = 0.01 W/K, R = 0.1 Ω, 23 → 125 °C: 3.193743885 A, derived from I²R = δ·ΔT.
    const fold = foldCurrent(stepAt(398.15, 0.1), 296.15);
    expect(fold.current).toBeCloseTo(3.193743885, 5);
    expect(fold.temperature).toBeCloseTo(398.15, 4);
  });

  it('falls with the ambient as √((T_sw − T_a)/(T_sw − 23 °C))', () => {
    const hold = (ambient: number) => foldCurrent(stepAt(398.15, 0.1), ambient).current / foldCurrent(stepAt(398.15, 0.1), 296.15).current;
    expect(hold(333.15)).toBeCloseTo(0.798282, 5);
    expect(hold(358.15)).toBeCloseTo(0.626224, 5);
    expect(hold(233.15)).toBeCloseTo(1.271868, 5);
  });
});

describe('holding', () => {
  it('asks for a fold current above the operating current', () => {
    expect(ptcHoldCheck(0, finding(2, 3), { worst: 1.5, nominal: 1.5 }, true, 0.1)).toMatchObject({ status: 'pass', margin: 0.25, nominalRatio: 0.5 });
    expect(ptcHoldCheck(0, finding(1, 3), { worst: 1.5, nominal: 1.5 }, true, 0.1).status).toBe('fail');
    expect(ptcHoldCheck(0, finding(1, 3), { worst: null, nominal: null }, false, 0.1).status).toBe('not-assessed');
  });
});

describe('the inrush through a PTC', () => {
  it('is held by rise against the temperature of ten times the resistance', () => {
    const ambient = { worst: 333.15, nominal: 296.15 };
    const check = ptcInrushCheck({ element: 0, finding: finding(353.15, 306.15), tripTemperature: { worst: 383.15, nominal: 386.15 }, ambient }, 0.1);
    expect(check.status).toBe('pass');
    expect(check.ratio).toBeCloseTo(0.4, 12);
    expect(ptcInrushCheck({ element: 0, finding: finding(353.15, 306.15), tripTemperature: { worst: null, nominal: null }, ambient }, 0.1).status).toBe('not-assessed');
  });
});

describe('a source that must trip a PTC', () => {
  it('delivers more than the fold current, or fails', () => {
    expect(ptcSourceCapabilityCheck(0, finding(12, 14), { worst: 6, nominal: 5 }, true, 0.1)).toMatchObject({ status: 'pass', margin: 0.5 });
    expect(ptcSourceCapabilityCheck(0, finding(5, 14), { worst: 6, nominal: 5 }, true, 0.1).status).toBe('fail');
  });

  it('is at best a caution where the fault is not stated', () => {
    expect(ptcSourceCapabilityCheck(0, finding(12, 14), { worst: 6, nominal: 5 }, false, 0.1).status).toBe('caution');
  });
});

describe('the time to trip', () => {
  const trip = { element: 0, finding: finding(1.5, 1), allowed: 2, faultStated: true, neverTrips: false };

  it('is held against the time allowed', () => {
    expect(ptcTimeToTripCheck(trip, 0.1)).toMatchObject({ status: 'pass', ratio: 0.75 });
  });

  it('is not assessed without a fault or a time allowed', () => {
    expect(ptcTimeToTripCheck({ ...trip, faultStated: false, finding: finding(null, null) }, 0.1)).toMatchObject({ status: 'not-assessed' });
    expect(ptcTimeToTripCheck({ ...trip, allowed: undefined }, 0.1).remark).toContain('time allowed');
  });

  it('fails in words when it never trips', () => {
    const check = ptcTimeToTripCheck({ ...trip, finding: finding(null, 1), neverTrips: true }, 0.1);
    expect(check.status).toBe('fail');
    expect(check.remark).toContain('does not trip');
  });
});

describe('the hard gates of a PTC', () => {
  it('are the prospective current and the voltage', () => {
    expect(ptcMaximumCurrentCheck(0, finding(50, 40), 40, 0.1).status).toBe('fail');
    expect(ptcMaximumVoltageCheck(0, finding(30, 24), 60, 0.1)).toMatchObject({ status: 'pass', ratio: 0.5 });
  });

  it('are not assessed without I_max, V_max or a source impedance', () => {
    expect(ptcMaximumCurrentCheck(0, finding(50, 40), undefined, 0.1).remark).toContain('I_max');
    expect(ptcMaximumCurrentCheck(0, finding(null, null), 40, 0.1).remark).toContain('source impedance');
    expect(ptcMaximumVoltageCheck(0, finding(30, 24), undefined, 0.1).remark).toContain('V_max');
  });
});

describe('the drop over a PTC', () => {
  it('is held against the limit, and without one there is no check', () => {
    expect(ptcVoltageDropCheck(0, finding(0.2, 0.1), 0.5, 0.1)[0]).toMatchObject({ status: 'pass', ratio: 0.4 });
    expect(ptcVoltageDropCheck(0, finding(0.2, 0.1), undefined, 0.1)).toEqual([]);
  });
});
