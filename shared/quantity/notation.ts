import type { Dimension, Qualifier } from './dimension';

const SPACES = /[\s\u00a0\u2000-\u200b\u202f\u205f\u2060\u3000]+/g;
const GROUPED = /^([+-]?)(\d{1,3}(?: \d{3})+)(?![\d])/;

/** One spelling for signs, spaces, micro, ohm, degree, squares, thousands groups and the decimal comma. */
export const normalise = (text: string): string =>
  text
    .replace(SPACES, ' ')
    .trim()
    .replace(/[\u2212\u2012\u2013]/g, '-')
    .replace(/[\u00b5\u03bc]/g, 'u')
    .replace(/\u03a9|\u2126|ohms?/gi, 'ohm')
    .replace(/\u00ba|\u02da/g, '°')
    .replace(/\u2103|° ?C\b|\bdegC\b/g, '°C')
    .replace(/(\/ ?)°C/g, '$1K')
    .replace(/²/g, '^2')
    .replace(/[·⋅]/g, ' ')
    .replace(GROUPED, (_, sign: string, digits: string) => sign + digits.replaceAll(' ', ''))
    .replace(/^([+-]?\d*),(\d+)/, '$1.$2');

/** A, A rms and A peak are told apart; only a current or a voltage can say which it is. */
export const takeQualifier = (text: string, dimension: Dimension): { rest: string; qualifier: Qualifier | null } => {
  const match = dimension === 'current' || dimension === 'voltage' ? /(?<=[\d\sAV])(rms|eff|peak|pk)$/i.exec(text) : null;
  if (!match) return { rest: text, qualifier: null };
  const qualifier = /rms|eff/i.test(match[0]) ? 'rms' : 'peak';
  return { rest: text.slice(0, match.index).trimEnd(), qualifier };
};

/** `number × 10^exponent` rounded once, so that `470u` is the same number as `0.00047`. */
export const scaleByTen = (number: string, exponent: number): number => {
  const [mantissa = '', own = '0'] = number.toLowerCase().split('e');
  return Number(`${mantissa}e${Number(own) + exponent}`);
};
