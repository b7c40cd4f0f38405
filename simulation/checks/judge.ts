import type { Check, Status } from '../../shared/model/check';
import { CHECKS, type CheckId } from '../../shared/model/check-id';
import type { Corner } from '../../shared/model/corner';
import type { Dimension } from '../../shared/quantity/dimension';

/** A worst-case value as a study found it. SI; `null` where the run gave none. */
export interface Finding {
  value: number | null;
  nominal: number | null;
  corner: Corner | null;
  /** Degrees; null where the switch-on angle does not enter. */
  phase: number | null;
  /** s without supply before a restart. */
  offTime: number | null;
}

/** A value that comes from no run of its own: the figures of a formula at one corner. */
export const finding = (value: number | null, nominal: number | null, corner: Corner | null = null): Finding => ({
  value,
  nominal,
  corner,
  phase: null,
  offTime: null,
});

export interface Judgement {
  id: CheckId;
  element?: number;
  dimension: Dimension;
  kind?: 'rms' | 'peak';
  sense: 'at-most' | 'at-least';
  finding: Finding;
  rating: number | null;
  /** The rating in the nominal case, where it depends on the case. */
  nominalRating?: number | null;
  /** Subtracted from value and rating before they are compared: the ambient (K) under a temperature. */
  above?: { worst: number; nominal: number };
  basis: string;
  /** The figures that are absent; any one makes the check "not assessed". */
  missing?: readonly string[];
  /** Assumed or extrapolated figures that entered: a pass becomes a caution. */
  cautions?: readonly string[];
  /** Words that change nothing. */
  notes?: readonly string[];
  /** The outcome is a failure in words, whatever the numbers, such as a converter that never starts. */
  failure?: string | null;
}

/** Use of a rating: 1 at the rating, above 1 beyond it, whatever the sense. */
export const useOf = (sense: 'at-most' | 'at-least', value: number, rating: number): number => {
  const [part, whole] = sense === 'at-most' ? [value, rating] : [rating, value];
  if (part <= 0) return 0;
  return whole > 0 ? part / whole : BEYOND;
};

/** Stands for a use without bound (nothing is allowed, or nothing is left), which JSON cannot carry. */
export const BEYOND = 1e6;

const ratioOf = (judgement: Judgement, value: number | null, rating: number | null, above: number): number | null =>
  value === null || rating === null || !Number.isFinite(value) ? null : useOf(judgement.sense, value - above, rating - above);

const statusOf = (judgement: Judgement, ratio: number | null, cautionBelow: number): Status => {
  if (judgement.failure) return 'fail';
  if (ratio !== null && ratio > 1) return 'fail';
  if (ratio === null || judgement.missing?.length) return 'not-assessed';
  return 1 - ratio < cautionBelow || judgement.cautions?.length ? 'caution' : 'pass';
};

const MISSING = (figures: readonly string[]): string[] => (figures.length ? [`Missing: ${figures.join('; ')}.`] : []);

/** A rating that is absent makes "not assessed"; a value beyond one that is present fails all the same. */
export const judge = (judgement: Judgement, cautionBelow: number): Check => {
  const { id, finding: found, rating, above = { worst: 0, nominal: 0 } } = judgement;
  const ratio = ratioOf(judgement, found.value, rating, above.worst);
  const unanswered = found.value === null && !judgement.missing?.length && !judgement.failure;
  const remarks = [
    ...(judgement.failure ? [judgement.failure] : []),
    ...MISSING(judgement.missing ?? []),
    ...(unanswered ? ['The run ended before it could answer this.'] : []),
    ...(judgement.cautions ?? []),
    ...(judgement.notes ?? []),
  ];
  return {
    id,
    element: judgement.element ?? null,
    title: CHECKS[id].title,
    status: statusOf(judgement, ratio, cautionBelow),
    dimension: judgement.dimension,
    kind: judgement.kind ?? null,
    sense: judgement.sense,
    value: found.value,
    nominal: found.nominal,
    rating,
    ratio,
    nominalRatio: ratioOf(judgement, found.nominal, judgement.nominalRating ?? rating, above.nominal),
    margin: ratio === null ? null : 1 - ratio,
    corner: found.corner,
    phase: found.phase,
    offTime: found.offTime,
    basis: judgement.basis,
    remark: remarks.length ? remarks.join(' ') : null,
    setAside: null,
  };
};
