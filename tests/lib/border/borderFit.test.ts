import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { withBorderFix } from '../../../src/lib/border/borderEdits';
import { borderChecks } from '../../../src/lib/border/borderFit';
import { edgeSides } from '../../../src/lib/border/edge';
import { sumSides, type Edging, type FourSides } from '../../../src/lib/border/edging';
import { addInWords, fixInWords } from '../../../src/lib/border/fixInWords';
import { readEdging } from '../../../src/lib/border/readEdging';
import { READY_EDGINGS, readyEdging } from '../../../src/lib/border/readyEdgings';
import { gridCounts } from '../../../src/lib/layout/gridCounts';
import type { BorderRound } from '../../../src/lib/plan/plan';
import { SQUARES } from '../../support/arrangements';
import { buildPlan, FIXED_SEED, frozen } from '../../support/plans';

const sc: BorderRound = { stitch: 'sc', colour: 'c1' };
const round = (edging: Edging): BorderRound => ({ stitch: 'dc', colour: 'c1', edging });
const shells = readyEdging('shell')!;
/** Needs two stitches once, on its first side, and then threes. */
const withBeginning: Edging = {
  name: 'Begins with two',
  ...readEdging(
    'Ch 1, sc in next 2 sts, *3 dc in next st, sk next st, sc in next st; rep from * around; join with sl st in first sc.',
    { terms: 'us' },
  ).edging!,
};
const EDGINGS = [...READY_EDGINGS.map(({ key }) => readyEdging(key)!), withBeginning];

/**
 * Whether a hand that works repeat after repeat from the first corner stitch on begins one at every
 * corner and ends where it began: walked stitch by stitch.
 */
function walkComesOutEven({ over: { least, multipleOf } }: Edging, sides: FourSides): boolean {
  const corners = new Set<number>();
  let at = 0;
  for (const side of sides) {
    corners.add(at);
    for (let stitch = 0; stitch < side; stitch += 1) at += 1;
  }
  const total = at;
  const begins = new Set([0]);
  let worked = least % multipleOf;
  while (worked < total) {
    begins.add(worked);
    worked += multipleOf;
  }
  return worked === total && total >= least && [...corners].every((corner) => begins.has(corner));
}

const anyBorder = fc.record({
  rows: fc.integer({ min: 1, max: 5 }),
  columns: fc.integer({ min: 1, max: 5 }),
  n: fc.integer({ min: 3, max: 24 }),
  before: fc.integer({ min: 0, max: 3 }),
  edging: fc.constantFrom(...EDGINGS),
});

describe('borderChecks', () => {
  it('gives its worked example', () => {
    const [check] = borderChecks([round(shells)], [136, 170, 136, 170]);
    // by hand: 136 = 22 × 6 + 4, 170 = 28 × 6 + 2
    expect(check).toMatchObject({ even: false, left: [4, 2, 4, 2] });
  });

  it('has no question about plain rounds', () => {
    const checks = borderChecks([sc, sc], [20, 30, 20, 30]);
    expect(checks.map(({ even, fixes }) => ({ even, fixes }))).toEqual([
      { even: null, fixes: [] },
      { even: null, fixes: [] },
    ]);
  });

  it('says even of just those edges round which a walk, stitch by stitch, comes out', () => {
    const size = { widthMm: 1, heightMm: 1 };
    fc.assert(
      fc.property(anyBorder, ({ rows, columns, n, before, edging }) => {
        const counts = gridCounts(SQUARES, rows, columns);
        const edge = edgeSides({ layout: 'square', rows, columns, counts, size }, n);
        const rounds = frozen([...Array<BorderRound>(before).fill(sc), round(edging)]);
        const check = borderChecks(rounds, edge).at(-1)!;
        expect(check.even).toBe(walkComesOutEven(edging, check.over));
      }),
      { ...FIXED_SEED, numRuns: 400 },
    );
  });

  it('offers fixes that make it come out, each of them, walked again', () => {
    fc.assert(
      fc.property(
        fc.tuple(...Array.from({ length: 4 }, () => fc.integer({ min: 1, max: 90 }))),
        fc.integer({ min: 0, max: 2 }),
        fc.constantFrom(...EDGINGS),
        (edge, before, edging) => {
          const border = [...Array<BorderRound>(before).fill(sc), round(edging)];
          const sides = edge as unknown as FourSides;
          const check = borderChecks(border, sides).at(-1)!;
          if (check.even) expect(check.fixes).toEqual([]);
          else expect(check.fixes.length).toBeGreaterThan(0);
          for (const fix of check.fixes) {
            const plan = withBorderFix(buildPlan({ border }), before, fix);
            const fixed = borderChecks(plan.border, sides).at(-1)!;
            expect(fixed.even).toBe(true);
            expect(walkComesOutEven(edging, fixed.over)).toBe(true);
            expect(sumSides(fixed.over)).toBeGreaterThanOrEqual(edging.over.least);
          }
        },
      ),
      { ...FIXED_SEED, numRuns: 300 },
    );
  });

  it('asks for the least change of each side in the round before', () => {
    const [, check] = borderChecks([sc, round(shells)], [134, 168, 134, 168]);
    // by hand: 136 has 4 over: 2 more; 170 has 2 over: 2 fewer. Rounds of sc add alike to sides that differ
    expect(check?.fixes).toEqual([{ kind: 'adjust', inserted: false, add: [2, -2, 2, -2] }]);
  });

  it('offers rounds of sc where they bring every side to a multiple', () => {
    const [, check] = borderChecks([sc, round(shells)], [20, 26, 20, 26]);
    // by hand: 22 and 28 have 4 over; one round more, 24 and 30, has none
    expect(check?.fixes[1]).toEqual({ kind: 'rounds', count: 1 });
  });

  it('begins with a new round of sc where there is none before', () => {
    const [check] = borderChecks([round(shells)], [20, 26, 20, 26]);
    expect(check?.fixes[0]).toEqual({ kind: 'adjust', inserted: true, add: [2, 2, 2, 2] });
  });
});

describe('fixInWords', () => {
  it('says what to work, where', () => {
    expect(fixInWords({ kind: 'adjust', inserted: false, add: [2, -1, 2, -1] }, 'sc')).toBe(
      'In the round before, work 2 more on the top and bottom, and 1 fewer on the right and left, spread evenly.',
    );
    expect(fixInWords({ kind: 'adjust', inserted: true, add: [2, 2, 2, 2] }, 'dc')).toBe(
      'Work a round of dc before it, with 2 more on every side, spread evenly.',
    );
    expect(fixInWords({ kind: 'rounds', count: 1 }, 'sc')).toBe(
      'Work a round of sc before it, with 3 sc in each corner: 2 more a side each.',
    );
    expect(fixInWords({ kind: 'rounds', count: 3 }, 'sc')).toMatch(/^Work 3 rounds of sc/);
    expect(addInWords([0, 0, 0, 0])).toBe('as many as there are');
  });
});
