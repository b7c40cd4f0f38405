import type { SplitTimePlotProps } from '@/components/charts/SplitTimePlot';
import type { Scenario } from '@/shared/model/scenario';
import { formatQuantity } from '@/shared/quantity/format';

const DIGITS = 3;

/**
 * The rating lines of the power-up plot. An energy rating told as ½CV² is no line here: the traced energy is what
 * the element absorbs, and against ½CV² it would flatter the part.
 */
export const plotRatings = ({ limits, limiter }: Scenario, element: number): SplitTimePlotProps['ratings'] => {
  const { maximumTemperature, energy } = limiter[element]?.part.ratings ?? {};
  return {
    ...(limits.peakCurrent === undefined ? {} : { current: { value: limits.peakCurrent, label: `peak limit ${formatQuantity(limits.peakCurrent, 'current', DIGITS)}` } }),
    ...(maximumTemperature === undefined ? {} : { temperature: { value: maximumTemperature, label: `maximum ${formatQuantity(maximumTemperature, 'temperature', DIGITS)}` } }),
    ...(energy?.basis === 'absorbed' ? { energy: { value: energy.energy, label: `single pulse ${formatQuantity(energy.energy, 'energy', DIGITS)}` } } : {}),
  };
};
