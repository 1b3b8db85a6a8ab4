import { describe, expect, it } from 'vitest';
import { fitOf } from '../../../src/lib/joins/fit';
import type { Join } from '../../../src/lib/joins/join';
import { countsOnSide } from '../../../src/lib/joins/joinCounts';
import { READY_JOINS, readyJoin } from '../../../src/lib/joins/readyJoins';
import { knownStitch } from '../../../src/lib/stitches/stitchTable';

const join = (key: string): Join => readyJoin(key) as Join;
const onSide = (key: string, n: number) => countsOnSide(join(key), join(key).perMotifSide, n);
const onSeam = (key: string, n: number) => countsOnSide(join(key), join(key).perSeam, n);

describe('readyJoin', () => {
  it('gives a join by its key', () => {
    expect(readyJoin('whip-stitch')?.name).toBe('Whip stitch');
    expect(readyJoin('no-such')).toBeNull();
  });
});

describe('READY_JOINS', () => {
  it('are at least six, two of them laces of two or three added rounds', () => {
    expect(READY_JOINS.length).toBeGreaterThanOrEqual(6);
    expect(READY_JOINS.filter(({ roundsAdded }) => roundsAdded >= 2)).toHaveLength(2);
    expect(new Set(READY_JOINS.map(({ key }) => key)).size).toBe(READY_JOINS.length);
  });

  it.each(READY_JOINS.map((each) => [each.key, each] as const))(
    '%s is made of stitches in the table and says how it is worked',
    (_, each) => {
      const codes = [each.perSeam, each.perMotifSide, each.perMotifCorner, each.perLink].flatMap(
        (counts) => Object.keys(counts),
      );
      for (const code of [...codes, ...Object.keys(each.width.stitches)]) knownStitch(code);
      expect(each.description).not.toBe('');
      expect(each.tool).toBe(each.sewn ? 'needle' : 'hook');
      if (each.openness === 'open') expect(each.cautions.join(' ')).toMatch(/small fingers/);
    },
  );

  it('sewn with a needle take no loops', () => {
    for (const each of READY_JOINS.filter(({ sewn }) => sewn)) {
      expect([each.perSeam, each.perMotifSide, each.perMotifCorner, each.perLink]).toEqual([
        {},
        {},
        {},
        {},
      ]);
    }
  });
});

/** A side of 15 stitches, worked by hand. */
describe('the ready joins on a side of 15', () => {
  it('slip and single crochet seams take one stitch, or two, in each', () => {
    expect(onSeam('slip-stitch', 15)).toEqual({ 'sl st': 15 });
    expect(onSeam('sc-ridge', 15)).toEqual({ sc: 15 });
    // to and fro: one in the front loop of either edge
    expect(onSeam('flat-slip-stitch', 15)).toEqual({ 'sl st': 30 });
  });

  it('zigzag chain sets 8 sc on either edge with 2 chains between one and the next', () => {
    // positions 1, 3, … 15 of both edges: 16 sc, 15 gaps
    expect(onSeam('zigzag-chain', 15)).toEqual({ sc: 16, ch: 2 * 15 });
  });

  it('joining in the last round of group squares links every chain space of the side', () => {
    // 4 rounds: groups 3-1-3-1-3-1-3, three spaces
    expect(onSeam('last-round', 15)).toEqual({ 'sl st': 3 });
  });

  it('flat braid anchors a loop of 5 chains in every second stitch', () => {
    // sc in 1, 3, … 15: 8 anchors, 7 loops, each linked once
    expect(onSide('flat-braid', 15)).toEqual({ sc: 8, ch: 7 * 5 });
    expect(onSeam('flat-braid', 15)).toEqual({ 'sl st': 7 });
  });

  it('lace holds 4 groups a side, 5 loops of which 3 link', () => {
    // common practice, no source: groups at 2, 6, 10, 14 of 15; loops anchored at each group, the
    // first and the last of 5 free
    const groups = 4;
    const loops = groups + 1;
    const reed = onSide('reed-lace', 15);
    expect(fitOf(15, join('reed-lace').fit)).toEqual({ fits: true, repeats: loops - 2 });
    expect(reed.dc).toBe(2 * groups);
    expect(reed.sc).toBe(groups);
    expect(onSeam('reed-lace', 15)).toEqual({ 'sl st': loops - 2 });
    // loops of 3, two chains between one group and the next
    expect(reed.ch).toBe(3 * loops + 2 * (groups - 1));

    const lantern = onSide('lantern-lace', 15);
    expect(lantern.tr).toBe(2 * groups);
    expect(lantern.sc).toBe(15 + groups);
    expect(onSeam('lantern-lace', 15)).toEqual({ 'sl st': loops - 2 });
    expect(lantern.ch).toBe(5 * loops + 2 * (groups - 1));
  });

  it.each(['reed-lace', 'lantern-lace'])(
    '%s gains a group, a loop and a link with 4 stitches',
    (key) => {
      const before = onSide(key, 15);
      const after = onSide(key, 19);
      expect((after.sc as number) - (before.sc as number)).toBe(key === 'reed-lace' ? 1 : 5);
      expect(onSeam(key, 19)['sl st']).toBe(4);
    },
  );
});
