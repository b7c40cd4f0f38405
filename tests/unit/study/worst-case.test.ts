import fc from 'fast-check';

import { FACTORS, type Factor } from '../../../shared/model/corner';
import type { FactorRange } from '../../../simulation/study/factors';
import { keyOf, levelOf, moved, NOMINAL, type Levels } from '../../../simulation/study/levels';
import { worstCase } from '../../../simulation/study/worst-case';
import { worstPhase } from '../../../simulation/study/worst-phase';

const range = (factor: Factor): FactorRange => ({ factor, values: { low: 0.8, nominal: 1, high: 1.2 }, levels: ['nominal', 'low', 'high'] });
const valueOf = (levels: Levels, factor: Factor): number => ({ low: -1, nominal: 0, high: 1 })[levelOf(levels, factor)];

describe('the worst switch-on angle', () => {
  it('is found to half a degree wherever it lies in the half period', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: Math.PI, noNaN: true, maxExcluded: true }), (wanted) => {
        const { phase } = worstPhase((angle) => Math.cos(2 * (angle - wanted)));
        const apart = Math.abs(phase - wanted);
        expect(Math.min(apart, Math.PI - apart)).toBeLessThan((0.5 * Math.PI) / 180);
      }),
    );
  });

  it('takes the higher of two summits', () => {
    const two = (angle: number) => Math.exp(-(((angle - 0.5) / 0.2) ** 2)) + 1.2 * Math.exp(-(((angle - 2.2) / 0.3) ** 2));
    expect(worstPhase(two).phase).toBeCloseTo(2.2, 2);
  });

  it('gives the best that it has seen, where the question has no answer at some angles', () => {
    expect(worstPhase((angle) => (angle > 1 && angle < 2 ? angle : -Infinity)).value).toBeGreaterThan(1.9);
  });
});

describe('the worst corner', () => {
  const ranges = FACTORS.map(range);

  it('is the vertex by the signs, whatever they are', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: -5, max: 5, noNaN: true }), { minLength: 8, maxLength: 8 }), (weights) => {
        const objective = (levels: Levels) => FACTORS.reduce((sum, factor, index) => sum + weights[index]! * valueOf(levels, factor), 0);
        const { worst } = worstCase({ ranges, objective, phase: 0 });
        expect(objective(worst.levels)).toBeCloseTo(weights.reduce((sum, weight) => sum + Math.abs(weight), 0), 10);
      }),
    );
  });

  it('is found by the neighbours where a factor turns its sign at the vertex', () => {
    // C alone does nothing; with the line high it helps.
    const objective = (levels: Levels) => 2 * valueOf(levels, 'line') + valueOf(levels, 'line') * valueOf(levels, 'capacitance');
    const { worst } = worstCase({ ranges, objective, phase: 0 });
    expect(objective(worst.levels)).toBe(3);
  });

  it('leaves a factor nominal that changes nothing', () => {
    const { worst } = worstCase({ ranges, objective: (levels) => valueOf(levels, 'line'), phase: 0 });
    expect(keyOf(worst.levels)).toBe(keyOf(moved(NOMINAL, 'line', 'high')));
  });

  it('searches the angle anew at the vertex', () => {
    const objective = (levels: Levels, phase: number) => 2 + valueOf(levels, 'line') + Math.cos(2 * (phase - 1 - 0.5 * valueOf(levels, 'line')));
    const { worst, nominal } = worstCase({ ranges, objective, phase: null });
    expect(nominal.phase).toBeCloseTo(1, 1);
    expect(worst.phase).toBeCloseTo(1.5, 1);
  });

  it('is the nominal case where nothing has a range', () => {
    const { worst } = worstCase({ ranges: [], objective: () => 1, phase: 0.3 });
    expect(worst).toEqual({ levels: NOMINAL, phase: 0.3 });
  });
});
