import { describe, expect, it } from 'vitest';
import { gaugeOf } from '../../../src/lib/gauge/gauge';
import { motifGeometry } from '../../../src/lib/motifs/geometry';
import type { Motif, MotifRound } from '../../../src/lib/motifs/motif';
import { READY_MOTIFS, readyMotif } from '../../../src/lib/motifs/readyMotifs';
import { addCounts, totalCount } from '../../../src/lib/stitches/counts';
import { knownStitch } from '../../../src/lib/stitches/stitchTable';
import { frozen } from '../../support/plans';

const ready = (key: string): Motif => readyMotif(key) as Motif;
const rounds = READY_MOTIFS.flatMap((motif) =>
  motif.rounds.map((round, i) => ({ name: `${motif.name}, ${round.label}`, motif, round, i })),
);
const chainsIn = (space: string): number => Number(space.replace('ch-', ''));

describe('readyMotif', () => {
  it('gives a motif by its key, worked to as many rounds as asked for', () => {
    expect(readyMotif('group-square', 4)?.rounds).toHaveLength(4);
    expect(readyMotif('group-square', 99)?.rounds).toHaveLength(8);
    expect(readyMotif('no-such')).toBeNull();
    expect(ready('group-square').rounds).toHaveLength(8);
  });
});

/**
 * The written patterns, worked by hand. `starts` is the chain that stands for the first stitch of a
 * round; where it stands for none (ch 1 of a round of sc) nothing is taken off the tally.
 */
describe('group-square', () => {
  // Ch 4, sl st to form a ring.
  // Rnd 1: ch 3 (a dc), 2 dc in ring, ch 2, *3 dc, ch 2; rep from * twice; sl st in top of ch-3.
  // Rnd k: sl st in 2 dc and in the corner sp; ch 3, (2 dc, ch 2, 3 dc) in same sp, ch 1, a group of
  //   3 dc and ch 1 in each ch-1 sp, (3 dc, ch 2, 3 dc) in each corner; sl st in top of ch-3.
  it.each(ready('group-square').rounds.map((round, i) => [i + 1, round] as const))(
    'round %i has a group in every space and two in every corner',
    (k, round) => {
      const groups = 4 * (k - 1) + 4; // k - 1 spaces on each of 4 sides with one, 4 corners with two
      const groupsMade = k === 1 ? 4 : 4 * (k - 2) + 4 * 2;
      expect(groupsMade).toBe(groups);
      expect(round.tally).toEqual({ dc: 3 * groups });
      expect(round.spaces['ch-2']).toBe(4);
      expect(round.spaces['ch-1'] ?? 0).toBe(groups - 4);
      expect(round.made).toEqual({
        ch: 3 + 2 * 4 + (groups - 4),
        dc: 3 * groups - 1,
        'sl st': k === 1 ? 1 : 1 + 3,
      });
      // a side runs from corner to corner: k groups of 3 and the k - 1 chains between them
      expect(round.perSide).toBe(3 * k + (k - 1));
    },
  );

  it('cumulates to 6 k (k + 1) dc', () => {
    // CALC from the classic construction: 12, 36, 72, 120, 180, 252, 336, 432
    let sum = 0;
    const sums = ready('group-square').rounds.map(({ tally }) => (sum += tally.dc ?? 0));
    expect(sums).toEqual([12, 36, 72, 120, 180, 252, 336, 432]);
    expect(sums).toEqual(sums.map((_, i) => 6 * (i + 1) * (i + 2)));
  });

  it('starts from a ring of four chains closed by a slip stitch', () => {
    expect(ready('group-square').ring).toEqual({ chains: 4, made: { ch: 4, 'sl st': 1 } });
  });
});

describe('solid-square', () => {
  // Rnd 1 as the group square. Rnd k: ch 3 (a dc), dc in each dc, (2 dc, ch 2, 2 dc) in each corner.
  it('grows by four dc in each corner', () => {
    let stitches = 12;
    ready('solid-square').rounds.forEach((round, i) => {
      if (i > 0) stitches += 4 * 4;
      expect(round.tally).toEqual({ dc: stitches });
      expect(round.made).toEqual({ ch: 3 + 4 * 2, dc: stitches - 1, 'sl st': 1 });
      expect(round.spaces).toEqual({ 'ch-2': 4 });
      expect(round.perSide).toBe(stitches / 4);
    });
  });
});

describe('circle-in-square', () => {
  const [first, second, third, fourth, fifth] = ready('circle-in-square').rounds as [
    MotifRound,
    MotifRound,
    MotifRound,
    MotifRound,
    MotifRound,
  ];

  it('is a circle of 12, 24 and 36 dc', () => {
    // Rnd 1: ch 3 (a dc), 11 dc in a magic ring. Rnd 2: 2 dc in each. Rnd 3: (dc, 2 dc) 12 times.
    for (const [round, dc] of [
      [first, 12],
      [second, 24],
      [third, 36],
    ] as const) {
      expect(round.tally).toEqual({ dc });
      expect(round.made).toEqual({ ch: 3, dc: dc - 1, 'sl st': 1 });
      expect(round.perSide * 4).toBe(dc);
    }
  });

  it('is squared off over its 36 stitches', () => {
    // Rnd 4, of every 9 stitches: (2 tr, ch 2, 2 tr) in one, then 2 dc, hdc, 2 sc, hdc, 2 dc in eight.
    // Starts ch 4 (a tr).
    expect(1 + 2 + 1 + 2 + 1 + 2).toBe(9);
    expect(fourth.tally).toEqual({ tr: 4 * 4, dc: 4 * 4, hdc: 4 * 2, sc: 4 * 2 });
    expect(fourth.made).toEqual({
      ch: 4 + 4 * 2,
      tr: 4 * 4 - 1,
      dc: 16,
      hdc: 8,
      sc: 8,
      'sl st': 1,
    });
    expect(fourth.perSide).toBe(2 + 8 + 2);
    expect(fourth.height).toBe('sc');
  });

  it('ends with a solid round', () => {
    // Rnd 5: dc in each of 48, (2 dc, ch 2, 2 dc) in each corner.
    expect(fifth.tally).toEqual({ dc: 48 + 16 });
    expect(fifth.made).toEqual({ ch: 3 + 8, dc: 63, 'sl st': 1 });
    expect(fifth.perSide).toBe(12 + 4);
  });
});

describe('hexagon', () => {
  // Rnd 1: (dc, ch 2, dc) six times in a magic ring. Rnd k: dc in each dc, (dc, ch 2, dc) in each corner.
  it('grows by two dc in each of six corners', () => {
    ready('hexagon').rounds.forEach((round, i) => {
      const dc = 12 * (i + 1);
      expect(round.tally).toEqual({ dc });
      expect(round.made).toEqual({ ch: 3 + 6 * 2, dc: dc - 1, 'sl st': 1 });
      expect(round.spaces).toEqual({ 'ch-2': 6 });
      expect(round.perSide).toBe(dc / 6);
    });
  });
});

describe('circle', () => {
  it('grows by twelve dc a round', () => {
    // common practice: 12 dc in round 1 and 12 more in each round lie flat
    ready('circle').rounds.forEach((round, i) => {
      const dc = 12 * (i + 1);
      expect(round.tally).toEqual({ dc });
      expect(round.made).toEqual({ ch: 3, dc: dc - 1, 'sl st': 1 });
      expect(round.perSide).toBe(dc);
    });
  });
});

describe('two-colour-square', () => {
  // Rnd 1: ch 1, 8 sc in a magic ring: four corners, four sides of one. Rnd k: 3 sc in each corner sc.
  it('grows by two sc in each of four corners, whose middle stitch is the corner', () => {
    ready('two-colour-square').rounds.forEach((round, i) => {
      const sc = 8 * (i + 1);
      expect(round.tally).toEqual({ sc });
      expect(round.made).toEqual({ ch: 1, sc, 'sl st': 1 });
      expect(round.cornerSpace).toBeNull();
      expect(4 * (round.perSide + 1)).toBe(sc);
    });
  });
});

describe.each(rounds)('$name', ({ motif, round, i }) => {
  it('makes what it counts, less the chain that counts as its first stitch', () => {
    const first = Object.keys(round.tally)[0] as string;
    const { turningChains } = knownStitch(first);
    const counts = first !== 'sc'; // published: turning chain counts as a stitch, all but sc
    const { ch = 0, 'sl st': slips = 0, ...rest } = round.made;
    const inSpaces = Object.entries(round.spaces).reduce(
      (sum, [space, count]) => sum + chainsIn(space) * count,
      0,
    );
    expect(addCounts(rest, counts ? { [first]: 1 } : {})).toEqual(round.tally);
    expect(ch).toBe(turningChains + inSpaces);
    expect(slips).toBe(1 + totalCount(round.travel));
  });

  it('has sides, corners and spaces that make up its count', () => {
    const between = Object.entries(round.spaces)
      .filter(([space]) => space !== round.cornerSpace)
      .reduce((sum, [, count]) => sum + count, 0);
    const cornerStitches = motif.key === 'two-colour-square' ? 4 : 0;
    expect(round.perSide * Math.max(1, motif.sides)).toBe(
      totalCount(round.tally) + between - cornerStitches,
    );
    if (round.cornerSpace) expect(round.spaces[round.cornerSpace]).toBe(motif.sides);
  });

  it('is called by its number', () => expect(round.label).toBe(`Rnd ${i + 1}`));
});

describe.each(READY_MOTIFS.map((motif) => [motif.name, motif] as const))('%s', (_, motif) => {
  it('lies flat at the published proportions of its stitches, to any round it can be worked to', () => {
    for (let worked = 3; worked <= motif.rounds.length; worked += 1) {
      const upTo = frozen({ ...motif, rounds: motif.rounds.slice(0, worked) });
      // A circle about to be squared off lies flat as a circle, which its four sides do not show.
      if (motif.key === 'circle-in-square' && worked < 4) continue;
      expect(motifGeometry(upTo, gaugeOf(null, 4), null).trouble).toBeNull();
    }
  });
});
