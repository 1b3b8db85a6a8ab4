import { describe, expect, it } from 'vitest';
import { readPattern, stitchRuns } from '../../../src/lib';

const text = `Ch 4, join with sl st to form ring.
Rnd 1: Ch 3 (counts as dc), 2 dc in ring, ch 2, *3 dc in ring, ch 2; rep from * 2 more times; join with sl st in top of beg ch-3.
Rnd 2: Ch 3 (counts as dc), dc in next 2 dc, (2 dc, ch 2, 2 dc) in next ch-2 sp, *dc in next 3 dc, (2 dc, ch 2, 2 dc) in next ch-2 sp; rep from * 2 more times; join with sl st in top of beg ch-3.`;

describe('stitchRuns', () => {
  const { rounds } = readPattern(text, { terms: 'us', sides: 4 });

  it('says the beginning of a round in its own order', () => {
    const runs = rounds[1] ? stitchRuns(rounds[1], rounds[0]?.places ?? []) : [];
    const said = runs
      .slice(0, 4)
      .map(({ count, code, role, into }) => ({ count, code, role, into }));
    expect(said).toEqual([
      { count: 3, code: 'ch', role: 'standing', into: { kind: 'place', code: 'dc', inOne: true } },
      { count: 2, code: 'dc', role: 'stitch', into: { kind: 'place', code: 'dc', inOne: false } },
      { count: 2, code: 'dc', role: 'stitch', into: { kind: 'place', code: 'ch-2', inOne: true } },
      { count: 2, code: 'ch', role: 'space', into: { kind: 'none' } },
    ]);
  });

  it('leaves out no stitch', () => {
    for (const [i, round] of rounds.entries()) {
      const runs = stitchRuns(round, rounds[i - 1]?.places ?? []);
      expect(runs.reduce((sum, { count }) => sum + count, 0)).toBe(round.stitches.length);
    }
  });
});
