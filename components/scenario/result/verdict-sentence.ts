import type { Check, Status } from '@/shared/model/check';
import type { Verdict } from '@/shared/model/result';
import type { Scenario } from '@/shared/model/scenario';
import { formatQuantity } from '@/shared/quantity/format';

import { CHECK_WORDS } from './check-words';

/** A sentence in pieces; the strong ones carry the figures. */
export type Sentence = readonly { text: string; strong?: boolean }[];

export const VERDICT_WORD: Record<Status, string> = {
  fail: 'Over rating',
  'not-assessed': 'Not fully assessed',
  caution: 'Within rating, with caution',
  pass: 'Within rating',
};

const plain = (text: string) => ({ text });
const strong = (text: string) => ({ text, strong: true });

const amount = (value: number, { dimension }: Check) => formatQuantity(value, dimension);
const kinded = (value: number, check: Check) => [amount(value, check), check.kind].filter(Boolean).join(' ');

const against = (check: Check): Sentence => {
  if (check.rating === null) return [];
  const rating = strong(amount(check.rating, check));
  return check.sense === 'at-most' ? [plain(', limit '), rating] : [plain(', at least '), rating, plain(' needed')];
};

/** When power comes back, and whether it then meets a contact that has not yet opened. */
const restart = (check: Check, scenario: Scenario): Sentence => {
  const { offTime } = check;
  if (offTime === null) return [];
  const closed = scenario.limiter.some(({ bypass }) => bypass && bypass.releaseTime > offTime);
  return [plain(': power back after '), strong(formatQuantity(offTime, 'time', 3)), ...(closed ? [plain(' meets a contact still closed')] : [])];
};

const judged = (check: Check, scenario: Scenario): Sentence => {
  if (check.value === null) return [plain(`${check.title}: ${check.remark ?? 'no figure'}`)];
  return [plain(`${CHECK_WORDS[check.id].lead} `), strong(kinded(check.value, check)), ...against(check), ...restart(check, scenario)];
};

/** The verdict in plain words, from the check that governs it. */
export const verdictSentence = (verdict: Verdict, checks: readonly Check[], scenario: Scenario): Sentence => {
  const counted = checks.filter(({ setAside }) => setAside === null);
  const governing = counted.find(({ status }) => status === verdict.status) ?? counted[0];
  if (!governing) return [plain('No check applies to this path: add a limiter, a fuse or a limit.')];
  const sentence = judged(governing, scenario);
  if (verdict.status === 'pass') return [plain('Closest to its rating: '), ...sentence, plain('.')];
  if (verdict.status === 'not-assessed') return [plain(`${governing.title} is not assessed: ${governing.remark ?? 'a figure is missing'}.`)];
  const remark = verdict.status === 'caution' && governing.remark ? [plain(`. ${governing.remark}`)] : [];
  return [...sentence, ...remark, plain('.')];
};

export const spokenSentence = (sentence: Sentence): string => sentence.map(({ text }) => text).join('');
