import { hashKey } from '@tanstack/react-query';

import { isBranch, nodeAt, withNode, type Draft, type DraftNode } from './draft-tree';

export interface Difference {
  path: string;
  mine: DraftNode;
  theirs: DraftNode;
  /** Who moved away from what both began with. */
  changedBy: 'me' | 'them' | 'both';
}

/** Fields that only have a meaning together: another of these makes another block. */
const KIND_KEYS = ['kind', 'law', 'when'] as const;

/** Whatever the order of the keys, which the database does not keep. */
const same = (one: DraftNode, other: DraftNode) => hashKey([one]) === hashKey([other]);
const isBand = (node: Draft) => 'nominal' in node;
const sameKind = (one: Draft, other: Draft) => KIND_KEYS.every((key) => typeof one[key] === 'object' || one[key] === other[key]);

const join = (path: string, key: string | number) => (path ? `${path}.${key}` : String(key));

/** The smallest paths at which two drafts differ: a field, or a block that exists in one of them or is of another kind. */
const pathsThatDiffer = (mine: DraftNode, theirs: DraftNode, path: string): string[] => {
  if (same(mine, theirs)) return [];
  if (Array.isArray(mine) && Array.isArray(theirs) && mine.length === theirs.length)
    return mine.flatMap((one, index) => pathsThatDiffer(one, theirs[index], join(path, index)));
  const comparable = isBranch(mine) && isBranch(theirs) && !isBand(mine) && !isBand(theirs) && sameKind(mine, theirs);
  if (!comparable) return [path];
  const keys = [...new Set([...Object.keys(mine), ...Object.keys(theirs)])];
  return keys.flatMap((key) => pathsThatDiffer(mine[key], theirs[key], join(path, key)));
};

export const differencesBetween = (base: Draft, mine: Draft, theirs: Draft): Difference[] =>
  pathsThatDiffer(mine, theirs, '').map((path) => {
    const [began, here, there] = [base, mine, theirs].map((draft) => nodeAt(draft, path));
    const [iMoved, theyMoved] = [!same(began, here), !same(began, there)];
    return { path, mine: here, theirs: there, changedBy: iMoved && theyMoved ? 'both' : iMoved ? 'me' : 'them' };
  });

/** My draft with their value wherever theirs was chosen. */
export const mergeDrafts = (mine: Draft, differences: readonly Difference[], takeTheirs: (path: string) => boolean): Draft =>
  differences.reduce((draft, one) => (takeTheirs(one.path) ? withNode(draft, one.path, one.theirs) : draft), mine);
