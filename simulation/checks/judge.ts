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

/** Use of a rating: 1 at the rating, above 1 beyond it, whatever the sense; null where nothing at all is allowed or left. */
export const useOf = (sense: 'at-most' | 'at-least', value: number, rating: number): number | null => {
  const [part, whole] = sense === 'at-most' ? [value, rating] : [rating, value];
  if (part <= 0) return 0;
  return whole > 0 ? part / whole : null;
};

interface Use {
  ratio: number | null;
  /** Beyond any share of a rating. */
  unbounded: boolean;
}

const useIn = (sense: Judgement['sense'], value: number | null, rating: number | null, above: number): Use => {
  if (value === null || rating === null || !Number.isFinite(value)) return { ratio: null, unbounded: false };
  const ratio = useOf(sense, value - above, rating - above);
  return { ratio, unbounded: ratio === null };
};

const statusOf = (judgement: Judgement, { ratio, unbounded }: Use, cautionBelow: number): Status => {
  if (judgement.failure || unbounded) return 'fail';
  if (ratio !== null && ratio > 1) return 'fail';
  if (ratio === null || judgement.missing?.length) return 'not-assessed';
  return 1 - ratio < cautionBelow || judgement.cautions?.length ? 'caution' : 'pass';
};

const NOTHING_ALLOWED = { 'at-most': 'In this case the rating allows nothing at all.', 'at-least': 'In this case nothing at all is left.' } as const;

const remarksOf = (judgement: Judgement, { unbounded }: Use): string[] => {
  const { failure, missing = [], cautions = [], notes = [], finding: found } = judgement;
  const unanswered = found.value === null && missing.length === 0 && !failure;
  return [
    ...(failure ? [failure] : []),
    ...(unbounded ? [NOTHING_ALLOWED[judgement.sense]] : []),
    ...(missing.length ? [`Missing: ${missing.join('; ')}.`] : cautions),
    ...(unanswered ? ['The run ended before it could answer this.'] : []),
    ...notes,
  ];
};

/** A rating that is absent makes "not assessed"; a value beyond one that is present fails all the same. */
export const judge = (judgement: Judgement, cautionBelow: number): Check => {
  const { id, finding: found, rating, above = { worst: 0, nominal: 0 } } = judgement;
  const use = useIn(judgement.sense, found.value, rating, above.worst);
  const { ratio } = use;
  const remarks = remarksOf(judgement, use);
  return {
    id,
    element: judgement.element ?? null,
    title: CHECKS[id].title,
    status: statusOf(judgement, use, cautionBelow),
    dimension: judgement.dimension,
    kind: judgement.kind ?? null,
    sense: judgement.sense,
    value: found.value,
    nominal: found.nominal,
    rating,
    ratio,
    nominalRatio: useIn(judgement.sense, found.nominal, judgement.nominalRating ?? rating, above.nominal).ratio,
    margin: ratio === null ? null : 1 - ratio,
    corner: found.corner,
    phase: found.phase,
    offTime: found.offTime,
    basis: judgement.basis,
    remark: remarks.length ? remarks.join(' ') : null,
    setAside: null,
  };
};
