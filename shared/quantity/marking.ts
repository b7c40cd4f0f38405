import { DIMENSIONS, type Dimension } from './dimension';
import { PREFIX_EXPONENT } from './prefix';
import { scaleByTen } from './notation';

/** Letter that stands for the plain unit in a marking (IEC 60062 gives R and F; V, A … are common usage). */
const UNIT_LETTER: Partial<Record<Dimension, string>> = {
  resistance: 'R', capacitance: 'F', inductance: 'H', voltage: 'V', current: 'A', power: 'W', energy: 'J', time: 's',
};

/** Tolerance letters of IEC 60062 (from memory) as fractions. */
const TOLERANCE_LETTER: Readonly<Record<string, number>> = {
  B: 0.001, C: 0.0025, D: 0.005, F: 0.01, G: 0.02, J: 0.05, K: 0.1, M: 0.2, N: 0.3,
};

export interface Marking {
  value: number;
  tolerance: number | null;
}

const exponentOf = (letter: string, dimension: Dimension): number | null => {
  if (letter === UNIT_LETTER[dimension]) return 0;
  if (letter === 'L') return dimension === 'resistance' ? -3 : null;
  if (letter === 'K') return 3;
  return PREFIX_EXPONENT[letter] ?? null;
};

/** A farad sign after a capacitance is the unit, never the tolerance letter F. */
const isUnit = (suffix: string, dimension: Dimension): boolean =>
  suffix === '' || suffix === DIMENSIONS[dimension].typed;

/** `4k7`, `R47`, `3V3`, `4k7 Ω`, `4K7J`: a letter in place of the decimal point; null where the text is none. */
export const readMarking = (text: string, dimension: Dimension): Marking | null => {
  if (!UNIT_LETTER[dimension] && dimension !== 'temperatureInterval') return null;
  const infix = /^(\d*)([A-Za-z])(\d+) ?([A-Za-z]*)$/.exec(text);
  const trailing = infix ? null : /^(\d+(?:\.\d+)?)(R) ?([A-Za-z]*)$/.exec(text);
  if (trailing && dimension !== 'resistance') return null;
  const [number, letter, suffix] = infix ? [`${infix[1] || '0'}.${infix[3]}`, infix[2]!, infix[4]!] : [trailing?.[1], 'R', trailing?.[3] ?? ''];
  const exponent = number === undefined ? null : exponentOf(letter, dimension);
  if (number === undefined || exponent === null) return null;
  const value = scaleByTen(number, exponent);
  if (isUnit(suffix, dimension)) return { value, tolerance: null };
  const tolerance = dimension === 'resistance' || dimension === 'capacitance' ? TOLERANCE_LETTER[suffix] : undefined;
  return tolerance === undefined ? null : { value, tolerance };
};
