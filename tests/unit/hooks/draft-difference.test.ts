import { differencesBetween, mergeDrafts } from '@/hooks/scenario/draft-difference';
import { draftOf, nodeAt, withNode } from '@/hooks/scenario/draft-tree';

import { readScenario } from '../../support/sample-record';

const base = draftOf(readScenario());
const mine = withNode(withNode(base, 'load.resistance', 4700), 'duration', 2);
const theirs = withNode(withNode(base, 'duration', 5), 'fuse', { ratedCurrent: 6.3 });

describe('two people’s versions of one draft', () => {
  it('differ in exactly the fields that either has changed, with both values and who changed them', () => {
    expect(differencesBetween(base, mine, theirs)).toEqual(
      expect.arrayContaining([
        { path: 'load.resistance', mine: 4700, theirs: 1000, changedBy: 'me' },
        { path: 'duration', mine: 2, theirs: 5, changedBy: 'both' },
        { path: 'fuse', mine: undefined, theirs: { ratedCurrent: 6.3 }, changedBy: 'them' },
      ]),
    );
    expect(differencesBetween(base, mine, theirs)).toHaveLength(3);
  });

  it('do not differ where both say the same', () => {
    expect(differencesBetween(base, theirs, theirs)).toEqual([]);
  });

  it('do not differ where only the order of the keys does', () => {
    const reordered = withNode(base, 'bulk.capacitance', Object.fromEntries(Object.entries(nodeAt(base, 'bulk.capacitance') as object).reverse()));
    expect(differencesBetween(base, base, reordered)).toEqual([]);
  });

  it('differ as a whole in a band and in a block of another kind', () => {
    const other = withNode(withNode(base, 'bulk.capacitance', { nominal: 330e-6, min: 330e-6, max: 330e-6 }), 'load', { kind: 'none' });
    expect(differencesBetween(base, base, other).map(({ path }) => path).sort()).toEqual(['bulk.capacitance', 'load']);
  });

  it('merge field by field as chosen', () => {
    const merged = mergeDrafts(mine, differencesBetween(base, mine, theirs), (path) => path !== 'load.resistance');
    expect(nodeAt(merged, 'load.resistance')).toBe(4700);
    expect(nodeAt(merged, 'duration')).toBe(5);
    expect(nodeAt(merged, 'fuse.ratedCurrent')).toBe(6.3);
  });
});

describe('a place in a draft', () => {
  it('can be taken away, also from a list', () => {
    const listed = withNode(base, 'source.programme', [{ at: 1, switch: 'off' }, { at: 2, switch: 'on' }]);
    expect(nodeAt(withNode(listed, 'source.programme.0', undefined), 'source.programme')).toEqual([{ at: 2, switch: 'on' }]);
    expect('notes' in withNode(base, 'notes', undefined)).toBe(false);
  });

  it('is made where it was not', () => {
    expect(nodeAt(withNode(base, 'limits.peakCurrent', '80'), 'limits.peakCurrent')).toBe('80');
    expect(nodeAt(withNode(base, 'limiter.1', { part: {} }), 'limiter.1.part')).toEqual({});
  });
});
