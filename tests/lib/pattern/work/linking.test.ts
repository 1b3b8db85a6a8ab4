import { describe, expect, it } from 'vitest';
import { counts, expectReads, messages, read } from '../reads';

/** A square with `n` sc on each side and two chains at each corner. */
const base = (n: number): string =>
  `Ch ${4 * n}.\nRnd 1: Ch 1, *sc in next ${n} ch, ch 2; rep from * 3 more times; join with sl st in first sc.\nRnd 2: `;
const LINKED =
  'Ch 1, *sc in next st, [ch 2, sl st in facing ch-5 sp, ch 2, sk next st, sc in next st] to corner, ' +
  'ch 3, sl st in facing corner, ch 3, sk corner sp; rep from * 3 more times; join with sl st in first sc.';
const GROUPS =
  '*Sk next st, 2 dc in next st, [ch 2, sk 3 sts, 2 dc in next st] to last st before corner, ch 3, sk next st, ' +
  'sk corner sp; rep from * 3 more times; join with sl st in first dc.';

describe('a round that links to the motif beside it', () => {
  it('makes slip stitches in it that part no loop and count as no stitch', () => {
    // by hand: 15 a side hold 8 sc and 7 loops of 2 + 2 chains; each corner 3 + 3 chains
    const { rounds } = read(base(15) + LINKED, { sides: 4 });
    expect(rounds[1]?.made).toEqual({ ch: 1 + 4 * (7 * 4 + 6), sc: 32, 'sl st': 4 * 8 + 1 });
    expect(counts(rounds[1]!)).toBe('28 ch-4 + 32 sc + 4 ch-6');
    const links = rounds[1]?.stitches.filter(({ role }) => role === 'link') ?? [];
    expect(links).toHaveLength(4 * 8);
    expect(links.every(({ into }) => into.kind === 'facing')).toBe(true);
  });

  it('is printed again as the same pattern, in either terms', () => {
    expectReads(base(15) + LINKED, '28 ch-4 + 32 sc + 4 ch-6', { sides: 4 });
  });

  it('says what cannot be worked into the other motif', () => {
    const group = LINKED.replace('sl st in facing ch-5 sp', '(sc, ch 1, sc) in facing ch-5 sp');
    expect(messages(read(base(15) + group, { sides: 4 }))).toContain(
      'error no-such-place: Only single stitches are worked into the motif beside this one.',
    );
  });
});

describe('"to last st before corner"', () => {
  it('stops on this side: groups in every fourth stitch, the first and last in the second from a corner', () => {
    // Common practice, no source: positions 2, 6, 10, 14 of 15
    expectReads(base(15) + GROUPS, '32 dc + 12 ch-2 + 4 ch-3', { sides: 4 });
    expectReads(base(19) + GROUPS, '40 dc + 16 ch-2 + 4 ch-3', { sides: 4 });
  });

  it('finds that a side must have three over a multiple of four', () => {
    const even = Array.from({ length: 36 }, (_, i) => i + 5).filter(
      (n) => messages(read(base(n) + GROUPS, { sides: 4 })).length === 0,
    );
    expect(even).toEqual([7, 11, 15, 19, 23, 27, 31, 35, 39]);
  });
});
