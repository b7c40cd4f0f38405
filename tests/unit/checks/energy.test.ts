import { comparedEnergy, deratedEnergy, type PulseEnergy } from '../../../simulation/checks/energy-rating';
import { finding } from '../../../simulation/checks/judge';
import { allowedCapacitance, limiterCapacitanceCheck } from '../../../simulation/checks/limiter-capacitance';
import { limiterEnergyCheck } from '../../../simulation/checks/limiter-energy';
import { limiterRestartEnergyCheck } from '../../../simulation/checks/limiter-restart-energy';
import { ratingsSchema } from '../../../shared/model/part';

const ratings = (given: object) => ratingsSchema.parse(given);
const mains = { rms: 230, peak: 230 * Math.SQRT2 };
const pulse = (more: Partial<PulseEnergy> = {}): PulseEnergy => ({ absorbed: 20, capacitance: 470e-6, voltage: mains, busVoltage: 0, ...more });

describe('the energy that is compared with a rating', () => {
  it('is the absorbed energy for an absorbed rating', () => {
    expect(comparedEnergy('absorbed', pulse())).toBe(20);
  });

  it('is ½CV² with the kind of V that the rating has', () => {
    // ½ · 470 µF · (230 V)² = 12.4315 J; with the crest twice that.
    expect(comparedEnergy('half-cv2-rms', pulse())).toBeCloseTo(12.4315, 9);
    expect(comparedEnergy('half-cv2-peak', pulse())).toBeCloseTo(24.863, 9);
  });

  it('is the larger where the basis is not known', () => {
    expect(comparedEnergy('unknown', pulse())).toBeCloseTo(24.863, 9);
    expect(comparedEnergy('unknown', pulse({ absorbed: 30 }))).toBe(30);
  });

  it('leaves out what a charged capacitor still holds', () => {
    expect(comparedEnergy('half-cv2-peak', pulse({ busVoltage: mains.peak / 2 }))).toBeCloseTo(24.863 * 0.75, 9);
    expect(comparedEnergy('half-cv2-rms', pulse({ busVoltage: 2 * mains.peak }))).toBe(0);
  });
});

describe('an energy rating and the temperature at the start', () => {
  const rating = ratings({ energy: { energy: 40, basis: 'absorbed' } }).energy!;

  // × (T_max − T_start)/(T_max − 25 °C): common practice, no source.
  it('falls with the start temperature and is gone at T_max', () => {
    expect(deratedEnergy(rating, 298.15, 498.15)).toBe(40);
    expect(deratedEnergy(rating, 398.15, 498.15)).toBeCloseTo(20, 9);
    expect(deratedEnergy(rating, 510, 498.15)).toBe(0);
  });

  it('is never raised by a cold start', () => {
    expect(deratedEnergy(rating, 233.15, 498.15)).toBe(40);
  });
});

const from = (temperature: number) => ({ worst: temperature, nominal: 298.15 });

describe('the energy check of a cold start', () => {
  it('fails a design over the energy rating', () => {
    const one = { element: 0, finding: finding(50, 30), start: from(298.15), ratings: ratings({ energy: { energy: 40, basis: 'absorbed' } }) };
    expect(limiterEnergyCheck(one, 0.1)).toMatchObject({ status: 'fail', ratio: 1.25, nominalRatio: 0.75 });
  });

  it('is at best a caution on an unknown basis', () => {
    const one = { element: 0, finding: finding(10, 10), start: from(298.15), ratings: ratings({ energy: { energy: 40, basis: 'unknown' } }) };
    expect(limiterEnergyCheck(one, 0.1).status).toBe('caution');
  });

  it('is at best a caution from a warm body without a maximum temperature to derate by', () => {
    const one = { element: 0, finding: finding(10, 10), start: from(330), ratings: ratings({ energy: { energy: 40, basis: 'absorbed' } }) };
    expect(limiterEnergyCheck(one, 0.1)).toMatchObject({ status: 'caution', rating: 40 });
  });

  it('is not assessed without a rating', () => {
    const check = limiterEnergyCheck({ element: 0, finding: finding(10, 10), start: from(298.15), ratings: ratings({}) }, 0.1);
    expect(check.status).toBe('not-assessed');
    expect(check.remark).toContain('energy rating');
  });
});

describe('the energy check of a restart', () => {
  it('derates by the temperature at the start', () => {
    const one = { element: 0, finding: finding(15, 10), start: from(398.15), ratings: ratings({ maximumTemperature: 498.15, energy: { energy: 40, basis: 'absorbed' } }) };
    const check = limiterRestartEnergyCheck(one, 0.1);
    expect(check.status).toBe('pass');
    expect(check.rating).toBeCloseTo(20, 9);
    expect(check.margin).toBeCloseTo(0.25, 9);
    expect(check.nominalRatio).toBeCloseTo(0.25, 9);
  });

  it('is not assessed without a maximum temperature', () => {
    const one = { element: 0, finding: finding(15, 10), start: from(398.15), ratings: ratings({ energy: { energy: 40, basis: 'absorbed' } }) };
    const check = limiterRestartEnergyCheck(one, 0.1);
    expect(check.status).toBe('not-assessed');
    expect(check.remark).toContain('maximum body temperature');
  });

  it('fails from a body that is at its maximum already', () => {
    const one = { element: 0, finding: finding(1, 1), start: from(500), ratings: ratings({ maximumTemperature: 498.15, energy: { energy: 40, basis: 'absorbed' } }) };
    expect(limiterRestartEnergyCheck(one, 0.1).status).toBe('fail');
  });
});

describe('a capacitance rating', () => {
  const rating = ratings({ capacitance: { capacitance: 500e-6, voltage: 240, voltageIs: 'rms' } }).capacitance!;

  // C·V² ≤ C_rated·V_rated², IEC 60539-1 (from memory); screening only.
  it('allows more capacitance at a lower voltage of the same kind', () => {
    expect(allowedCapacitance(rating, { rms: 120, peak: 1 })).toBeCloseTo(2000e-6, 12);
  });

  it('is held as C·V² against C·V²', () => {
    const voltage = { worst: { rms: 264, peak: 264 * Math.SQRT2 }, nominal: { rms: 240, peak: 240 * Math.SQRT2 } };
    const check = limiterCapacitanceCheck(0, finding(400e-6, 400e-6), rating, voltage, 0.1);
    expect(check.ratio).toBeCloseTo((400 * 264 ** 2) / (500 * 240 ** 2), 12);
    expect(check.nominalRatio).toBeCloseTo(0.8, 12);
  });

  it('is not assessed without the figure', () => {
    const voltage = { worst: mains, nominal: mains };
    expect(limiterCapacitanceCheck(0, finding(400e-6, 400e-6), undefined, voltage, 0.1).status).toBe('not-assessed');
  });
});
