import type { ResistanceLaw } from '../circuit/path';
import { bValueLaw } from './b-value';
import { steinhartHartLaw } from './steinhart-hart';

export interface TablePoint {
  /** K */
  temperature: number;
  /** Ω */
  resistance: number;
}

/** A law fitted to a table, with what it misses at each point, K: temperature of the law less that of the table. */
export interface Fit<Coefficients> {
  coefficients: Coefficients;
  law: ResistanceLaw;
  residuals: number[];
}

/** Least squares of y = Σ c·column by the normal equations, eliminated with pivots; columns scaled to their largest value. */
const leastSquares = (columns: readonly (readonly number[])[], y: readonly number[]): number[] => {
  const scales = columns.map((column) => column.reduce((most, one) => Math.max(most, Math.abs(one)), Number.MIN_VALUE));
  const scaled = columns.map((column, k) => column.map((one) => one / scales[k]!));
  const dot = (a: readonly number[], b: readonly number[]) => a.reduce((sum, one, k) => sum + one * b[k]!, 0);
  const rows = scaled.map((column) => [...scaled.map((other) => dot(column, other)), dot(column, y)]);
  rows.forEach((_, k) => {
    const pivot = rows.slice(k).reduce((best, row) => (Math.abs(row[k]!) > Math.abs(best[k]!) ? row : best));
    rows.splice(rows.indexOf(pivot), 1);
    rows.splice(k, 0, pivot);
    rows.forEach((row, other) => {
      if (other === k) return;
      const share = row[k]! / pivot[k]!;
      row.forEach((_value, column) => (row[column]! -= share * pivot[column]!));
    });
  });
  return rows.map((row, k) => row[row.length - 1]! / row[k]! / scales[k]!);
};

const residualsOf = (law: ResistanceLaw, points: readonly TablePoint[]): number[] =>
  points.map(({ temperature, resistance }) => (law.temperature(resistance) ?? Infinity) - temperature);

/** R25 (Ω) and B (K) of a table of two points or more: 1/T against ln R is a straight line. Source: IEC 60539-1 (from memory). */
export const fitBValue = (points: readonly TablePoint[]): Fit<{ r25: number; b: number }> => {
  const logs = points.map(({ resistance }) => Math.log(resistance));
  const [offset, slope] = leastSquares([logs.map(() => 1), logs], points.map(({ temperature }) => 1 / temperature)) as [number, number];
  const coefficients = { r25: Math.exp((1 / 298.15 - offset) / slope), b: 1 / slope };
  const law = bValueLaw(coefficients.r25, coefficients.b);
  return { coefficients, law, residuals: residualsOf(law, points) };
};

/** A, B and C of a table of three points or more. Source of the law: Steinhart & Hart, Deep-Sea Research 15 (1968) 497–503. */
export const fitSteinhartHart = (points: readonly TablePoint[]): Fit<{ a: number; b: number; c: number }> => {
  const logs = points.map(({ resistance }) => Math.log(resistance));
  const columns = [logs.map(() => 1), logs, logs.map((x) => x ** 3)];
  const [a, b, c] = leastSquares(columns, points.map(({ temperature }) => 1 / temperature)) as [number, number, number];
  const law = steinhartHartLaw(a, b, c);
  return { coefficients: { a, b, c }, law, residuals: residualsOf(law, points) };
};
