import type { Check } from '../../shared/model/check';
import type { Ratings } from '../../shared/model/part';
import { judge, type Finding } from './judge';

export type CurrentRating = NonNullable<Ratings['steadyCurrent']>;

export interface DeratedCurrent {
  /** A rms; null where it cannot be told. */
  current: number | null;
  beyondCurve: boolean;
}

/** Straight from `share` at `from` to zero at `maximum`; zero where there is no room between. */
const fade = (ambient: number, from: number, share: number, maximum: number): number =>
  maximum > from ? share * Math.max(0, (maximum - ambient) / (maximum - from)) : 0;

/**
 * Steady current rating (A rms) at an ambient (K): the part's derating curve, straight between its points;
 * without one flat to the rating's ambient, then linear to zero at T_max (common practice). Beyond the last
 * point of a curve it fades the same way, and is flagged.
 */
export const deratedCurrent = (rating: CurrentRating, ambient: number, maximum: number | undefined): DeratedCurrent => {
  const points = rating.derating ?? [];
  const [first, last] = [points[0], points[points.length - 1]];
  if (!first || !last) {
    if (ambient <= rating.ambient) return { current: rating.current, beyondCurve: false };
    return { current: maximum === undefined ? null : rating.current * fade(ambient, rating.ambient, 1, maximum), beyondCurve: false };
  }
  if (ambient <= first.ambient) return { current: rating.current * first.share, beyondCurve: false };
  if (ambient > last.ambient) return { current: rating.current * fade(ambient, last.ambient, last.share, maximum ?? 0), beyondCurve: true };
  const index = points.findIndex((point) => point.ambient >= ambient);
  const [before, after] = [points[index - 1] ?? first, points[index] ?? last];
  const share = before.share + ((after.share - before.share) * (ambient - before.ambient)) / (after.ambient - before.ambient);
  return { current: rating.current * share, beyondCurve: false };
};

export interface SteadyCurrentCase {
  element: number;
  finding: Finding;
  ambient: { worst: number; nominal: number };
  ratings: Ratings;
}

/** Steady current through the body (A rms) against its rating at the ambient of the corner. */
export const limiterSteadyCurrentCheck = ({ element, finding, ambient, ratings }: SteadyCurrentCase, cautionBelow: number): Check => {
  const { steadyCurrent: rating, maximumTemperature } = ratings;
  const at = (temperature: number): DeratedCurrent =>
    rating ? deratedCurrent(rating, temperature, maximumTemperature) : { current: null, beyondCurve: false };
  const worst = at(ambient.worst);
  return judge(
    {
      id: 'limiter-steady-current',
      element,
      dimension: 'current',
      kind: 'rms',
      sense: 'at-most',
      finding,
      rating: worst.current,
      nominalRating: at(ambient.nominal).current,
      basis: rating?.derating?.length
        ? "Steady rms current through the body against the part's derating curve."
        : "Steady rms current through the body; rating flat to its ambient, then linear to zero at T_max (common practice).",
      missing: [
        ...(rating ? [] : ['the steady current rating of the limiter, with its ambient']),
        ...(rating && worst.current === null ? ['the maximum body temperature, to derate the steady current by'] : []),
      ],
      cautions: worst.beyondCurve ? ['The ambient is beyond the derating curve.'] : [],
    },
    cautionBelow,
  );
};
