import fc from 'fast-check';

import { thinned } from '../../../simulation/run/thin';

const MOST = 40;
const columns = fc.array(fc.tuple(fc.double({ min: 1e-6, max: 1, noNaN: true }), fc.double({ min: -500, max: 500, noNaN: true })), { minLength: 1, maxLength: 400 }).map((rows) => {
  let at = 0;
  return { position: rows.map(([step]) => (at += step)), column: rows.map(([, value]) => value) };
});

describe('thinning of a trace', () => {
  it('keeps first, last, highest and lowest whatever the trace, in order and few', () => {
    fc.assert(
      fc.property(columns, ({ position, column }) => {
        const kept = thinned(position, column, MOST);
        const values = kept.map((k) => column[k]!);
        expect(kept).toEqual([...new Set(kept)].sort((a, b) => a - b));
        expect([kept[0], kept[kept.length - 1]]).toEqual([0, column.length - 1]);
        expect(Math.max(...values)).toBe(Math.max(...column));
        expect(Math.min(...values)).toBe(Math.min(...column));
        expect(kept.length).toBeLessThanOrEqual(MOST + 2);
      }),
    );
  });

  it('keeps every one of many narrow peaks that lie apart', () => {
    const position = Array.from({ length: 5000 }, (_, k) => k);
    const column = position.map((k) => (k % 500 === 250 ? 10 + k : 0));
    const kept = new Set(thinned(position, column, MOST));
    position.filter((k) => k % 500 === 250).forEach((k) => expect(kept.has(k)).toBe(true));
  });

  it('leaves a short trace as it is', () => expect(thinned([0, 1, 2], [3, 1, 2], MOST)).toEqual([0, 1, 2]));
});
