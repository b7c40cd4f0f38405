import { STATUSES, type Check, type Status } from '../../shared/model/check';
import type { Verdict } from '../../shared/model/result';
import type { Scenario } from '../../shared/model/scenario';

/** Marks the checks that a person set aside; they stay listed, with the reason. */
export const setAsideIn = (checks: readonly Check[], setAside: Scenario['setAside']): Check[] =>
  checks.map((check) => ({ ...check, setAside: setAside.find((one) => one.check === check.id)?.reason ?? null }));

const rank = (check: Check): number => (check.setAside === null ? 0 : STATUSES.length) + STATUSES.indexOf(check.status);

/** A failure beyond any number is the worst of its kind; any other check without a margin comes last. */
const marginOf = ({ margin, status }: Check): number => margin ?? (status === 'fail' ? -Infinity : Infinity);
const byMargin = (a: Check, b: Check): number => (marginOf(a) === marginOf(b) ? 0 : marginOf(a) - marginOf(b));

/** Fail, not assessed, caution, pass; the smallest margin first in each; what was set aside comes last. */
export const inOrder = (checks: readonly Check[]): Check[] =>
  [...checks].sort((a, b) => rank(a) - rank(b) || byMargin(a, b));

/** The worst status of the checks that count. With none left there is nothing that was assessed. */
export const verdictOf = (checks: readonly Check[]): Verdict => {
  const counted = checks.filter((check) => check.setAside === null);
  const count = (status: Status): number => counted.filter((check) => check.status === status).length;
  return {
    status: STATUSES.find((status) => count(status) > 0) ?? 'not-assessed',
    counts: {
      fail: count('fail'),
      'not-assessed': count('not-assessed'),
      caution: count('caution'),
      pass: count('pass'),
      'set-aside': checks.length - counted.length,
    },
  };
};
