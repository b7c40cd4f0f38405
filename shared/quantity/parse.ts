import { DIMENSIONS, ZERO_CELSIUS, type Dimension, type Qualifier } from './dimension';
import { readMarking } from './marking';
import { normalise, scaleByTen, takeQualifier } from './notation';
import { PREFIX_EXPONENT } from './prefix';
import { readUnit } from './unit-reader';

export type Parsed<T> = ({ ok: true } & T) | { ok: false; message: string };
export type ParsedQuantity = Parsed<{ value: number; qualifier: Qualifier | null }>;
/** `±` as a half width in the quantity's own unit. */
export type ParsedBand = Parsed<{ value: number; halfWidth: number; qualifier: Qualifier | null }>;

const LONGEST = 64;
const QUANTITY = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d{1,3})?) ?([A-Za-z%°][A-Za-z%°/^ ]*(?:\^2 ?[A-Za-z]*)?)?$/;

/** Units beyond a prefix and the dimension's own: minutes, kWh, radian and so on. */
const readOtherUnit = (number: string, suffix: string, dimension: Dimension): number | null => {
  const { typed } = DIMENSIONS[dimension];
  const own = typed === 'A^2s' ? 'A^2 s' : typed;
  if (own === '' || own === '%') return null;
  const unit = readUnit(`1 ${suffix}`);
  const base = unit && readUnit(own);
  return unit && base?.equalBase(unit) ? Number(number) * unit.toNumber(own) : null;
};

const readTemperature = (number: string, suffix: string): number | null => {
  if (suffix === '' || suffix === '°C' || suffix === 'C') return Number(number) + ZERO_CELSIUS;
  return suffix === 'K' ? Number(number) : null;
};

const readSuffixed = (number: string, suffix: string, dimension: Dimension): number | null => {
  if (dimension === 'temperature') return readTemperature(number, suffix);
  if (dimension === 'ratio') return suffix === '%' || suffix === '' ? scaleByTen(number, -2) : null;
  const { typed } = DIMENSIONS[dimension];
  const compact = suffix.replaceAll(' ', '');
  if (compact === '' || compact === typed || (dimension === 'angle' && compact === '°')) return Number(number);
  const prefix = compact.endsWith(typed) ? compact.slice(0, compact.length - typed.length) : compact;
  const exponent = PREFIX_EXPONENT[prefix === 'K' && typed !== 'K' ? 'k' : prefix];
  const bare = prefix === compact;
  if (exponent !== undefined && (bare || DIMENSIONS[dimension].prefixed || typed === 'K')) return scaleByTen(number, exponent);
  // A difference in °C is written in K, and A²s takes no prefix: both would be read wrongly.
  return typed === 'K' || typed === 'A^2s' || bare && dimension === 'count' ? null : readOtherUnit(number, suffix, dimension);
};

const refusal = (text: string, dimension: Dimension): { ok: false; message: string } => {
  const { unit, example } = DIMENSIONS[dimension];
  const asked = dimension === 'temperature' ? '°C' : unit;
  const shown = text.trim();
  const said = shown === '' ? 'nothing was written' : `"${shown.length > 24 ? `${shown.slice(0, 24)}…` : shown}" is not a value${asked ? ` in ${asked}` : ''}`;
  return { ok: false, message: `${said}; write for example ${example}` };
};

/**
 * Reads a quantity as an engineer types it (`470u`, `470 µF`, `4k7`, `R47`, `500mA`, `1.5e-9`, decimal comma).
 * A bare number is in the SI unit, except temperatures (°C) and ratios (per cent). A comma is always decimal.
 * @returns the SI value, or a sentence with an example
 */
export const parseQuantity = (text: string, dimension: Dimension): ParsedQuantity => {
  if (text.length > LONGEST) return refusal(text, dimension);
  const { rest, qualifier } = takeQualifier(normalise(text), dimension);
  const marked = readMarking(rest, dimension);
  if (marked?.tolerance === null) return { ok: true, value: marked.value, qualifier };
  const match = QUANTITY.exec(rest);
  const value = match ? readSuffixed(match[1]!, match[2]?.trim() ?? '', dimension) : null;
  return value !== null && Number.isFinite(value) ? { ok: true, value, qualifier } : refusal(text, dimension);
};

/** A share of the value (`20 %`, or bare), or an amount in the quantity's own unit (`2 Ω`; a temperature takes only K). */
const readHalfWidth = (text: string, value: number, dimension: Dimension): number | null => {
  if (dimension !== 'temperature') {
    const share = parseQuantity(text, 'ratio');
    if (share.ok) return share.value >= 0 && share.value < 1 ? Math.abs(value) * share.value : null;
  }
  const amount = parseQuantity(text, dimension === 'temperature' ? 'temperatureInterval' : dimension);
  return amount.ok && amount.value >= 0 ? amount.value : null;
};

/** `470u ±20 %`, `25 °C ±15 K`, `4K7J`: a value with a symmetric tolerance; without one the half width is 0. */
export const parseTolerancedText = (text: string, dimension: Dimension): ParsedBand => {
  const marked = text.length > LONGEST ? null : readMarking(normalise(text), dimension);
  if (marked?.tolerance) return { ok: true, value: marked.value, halfWidth: marked.value * marked.tolerance, qualifier: null };
  const [valueText = '', toleranceText, ...more] = text.split(/±|\+\/[-\u2212]/);
  const parsed = parseQuantity(valueText, dimension);
  if (!parsed.ok || toleranceText === undefined) return parsed.ok ? { ...parsed, halfWidth: 0 } : parsed;
  const halfWidth = more.length > 0 ? null : readHalfWidth(toleranceText, parsed.value, dimension);
  if (halfWidth !== null) return { ...parsed, halfWidth };
  const example = dimension === 'temperature' ? '25 °C ±15 K' : `${DIMENSIONS[dimension].example} ±20 %`;
  return { ok: false, message: `the tolerance "${toleranceText.trim()}" was not understood; write for example ${example}` };
};
