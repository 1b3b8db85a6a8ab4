import { describe, expect, it } from 'vitest';
import { READY_JOINS, type Join } from '../../../src/lib';
import { countsOnSide } from '../../../src/lib/joins/joinCounts';
import { JOIN_TEXTS, type JoinText } from '../../../src/lib/joins/joinTexts';
import { readJoin } from '../../../src/lib/joins/readJoin';

const joins = Object.keys(JOIN_TEXTS).map(
  (key) =>
    [
      key,
      READY_JOINS.find((join) => join.key === key) as Join,
      JOIN_TEXTS[key] as JoinText,
    ] as const,
);

const withoutNone = (counts: Readonly<Record<string, number>>) =>
  Object.fromEntries(Object.entries(counts).filter(([, count]) => count !== 0));

describe.each(joins)('the text of %s', (_, join, text) => {
  const reading = readJoin(text)!;

  it('fits the sides that the estimate says it fits', () => {
    expect(reading.fit).toEqual({
      multipleOf: join.fit.multipleOf,
      plus: join.fit.plus % join.fit.multipleOf,
    });
    expect(reading.rounds).toBe(join.roundsAdded);
  });

  it('makes on a side and at a corner what the estimate counts', () => {
    const side = text.worked === 'seam' ? join.perSeam : join.perMotifSide;
    for (let n = join.fit.plus + 4 * join.fit.multipleOf; n < 40; n += join.fit.multipleOf) {
      expect(reading.onSide(n)).toEqual(withoutNone(countsOnSide(join, side, n)));
      if (text.linked === null) continue;
      expect(reading.linksOnSide(n)).toBe(countsOnSide(join, join.perSeam, n)['sl st']);
    }
    expect(reading.atCorner).toEqual(join.perMotifCorner);
  });
});

describe('readJoin', () => {
  it('gives its worked example', () => {
    const braid = readJoin(JOIN_TEXTS['flat-braid'] as JoinText);
    expect(braid?.onSide(15)).toEqual({ sc: 8, ch: 35 });
    expect(braid?.atCorner).toEqual({ ch: 7 });
  });

  it('works the lace edge in numbers: on 15, four groups, five loops a side, three of them linked', () => {
    // Common practice, no source: groups at 2, 6, 10, 14; loops of 3 anchored at each
    const reed = readJoin(JOIN_TEXTS['reed-lace'] as JoinText);
    expect(reed?.fit).toEqual({ multipleOf: 4, plus: 3 });
    const { dc = 0, ch = 0 } = reed?.onSide(15) ?? {};
    expect(dc).toBe(4 * 2);
    expect(ch - 3 * 2).toBe(5 * 3); // less the chains between the groups
    expect(reed?.linksOnSide(15)).toBe(3);
  });

  it('has nothing to say of a text that fits no side', () => {
    expect(readJoin({ worked: 'seam', text: 'Sc in next 99 sts.', linked: null })).toBeNull();
  });
});
