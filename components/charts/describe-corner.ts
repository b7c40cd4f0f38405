import type { Check } from '@/shared/model/check';
import type { Corner, Factor } from '@/shared/model/corner';
import { formatQuantity } from '@/shared/quantity/format';

type CornerFactor = Corner['factors'][number];

/** Letter of a factor that is told as its share off nominal. */
const LETTER: Partial<Record<Factor, string>> = { elementResistance: 'R', elementB: 'B', capacitance: 'C', esr: 'ESR', sourceImpedance: 'Z' };
const ORDER: readonly Factor[] = ['line', 'frequency', 'capacitance', 'esr', 'sourceImpedance', 'elementResistance', 'elementB', 'ambient'];

const share = (change: number): string => {
  const percent = Number((Math.abs(change) * 100).toPrecision(3));
  return `${change < 0 ? '\u2212' : '+'}${percent} %`;
};

const describeFactor = ({ factor, level, value, change }: CornerFactor): string | null => {
  if (factor === 'line') return formatQuantity(value, 'voltage');
  if (factor === 'frequency') return formatQuantity(value, 'frequency');
  if (factor === 'ambient') return formatQuantity(value, 'temperature');
  const letter = LETTER[factor];
  if (!letter || level === 'nominal') return null;
  return change === null ? `${letter} ${level}` : `${letter} ${share(change)}`;
};

/** A corner in one line, such as `253 V · C +20 % · R −20 % · 40 °C`; what stands at nominal goes unsaid, but for line and ambient. */
export const describeFactors = (corner: Corner): string =>
  ORDER.flatMap((factor) => corner.factors.filter((one) => one.factor === factor))
    .map(describeFactor)
    .filter(Boolean)
    .join(' · ');

/**
 * What governs a check, in one line: the time off before a restart, the corner, the switch-on angle, and that a
 * temperature is held against its rating by its rise. What is missing stands first where nothing was assessed.
 */
export const describeCorner = (check: Check): string => {
  if (check.setAside) return `Set aside: ${check.setAside}`;
  if (check.status === 'not-assessed') return check.remark ?? 'No figure to assess it by';
  const off = check.offTime === null ? null : `off ${formatQuantity(check.offTime, 'time', 3)}`;
  const corner = check.corner ? describeFactors(check.corner) : null;
  const phase = check.phase === null ? null : `at ${formatQuantity(Math.round(check.phase), 'angle')}`;
  const text = [off, corner, phase].filter(Boolean).join(' · ');
  if (!text) return check.remark ?? 'The same at every corner';
  return check.dimension === 'temperature' ? `${text}; by rise` : text;
};
