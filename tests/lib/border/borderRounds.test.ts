import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { borderRounds } from '../../../src/lib/border/borderRounds';
import { edgeSides, edgeStitches, type EdgeOf } from '../../../src/lib/border/edge';
import { sumSides, type FourSides } from '../../../src/lib/border/edging';
import { READY_EDGINGS, readyEdging } from '../../../src/lib/border/readyEdgings';
import { gridCounts } from '../../../src/lib/layout/gridCounts';
import { readPattern } from '../../../src/lib/pattern';
import type { StitchCounts } from '../../../src/lib/stitches/stitch';
import { ARRANGEMENTS, HEXAGONS, SQUARES } from '../../support/arrangements';
import { FIXED_SEED, frozen } from '../../support/plans';

const plain = (...codes: string[]) => frozen(codes.map((stitch) => ({ stitch, colour: 'c1' })));
const made = (codes: string[], edge: FourSides): StitchCounts[] =>
  borderRounds(plain(...codes), edge).map((work) => work.made);

function edgeOf(arrangement: typeof SQUARES, rows: number, columns: number): EdgeOf {
  const counts = gridCounts(arrangement, rows, columns);
  const size = { widthMm: 100 * columns, heightMm: 100 * rows };
  return { layout: arrangement.layout, rows, columns, counts, size };
}
const squares = edgeSides(edgeOf(SQUARES, 10, 8), 15);

describe('edgeSides', () => {
  it('goes from one corner stitch up to the next along straight sides', () => {
    // by hand: 8 × 15 + 7 × 2 + 1 = 135, 10 × 15 + 9 × 2 + 1 = 169
    expect(squares).toEqual([135, 169, 135, 169]);
  });

  it('adds up to all that the first round finds, in every layout', () => {
    for (const arrangement of ARRANGEMENTS) {
      for (const [rows, columns] of [
        [1, 1],
        [3, 4],
        [6, 5],
      ] as const) {
        const edge = edgeOf(arrangement, rows, columns);
        const sides = edgeSides(edge, 11);
        // half motifs have sides of part of a stitch
        expect(sumSides(sides)).toBe(Math.round(edgeStitches(edge.counts, 11)));
        expect(Math.min(...sides)).toBeGreaterThan(0);
      }
    }
  });
});

describe('borderRounds of plain rounds', () => {
  it('gives its worked example', () => {
    // 36 sides × 15 + 32 junctions × 2 + 4 corners × 3 = 616; 8 more in the next round
    expect(made(['sc', 'sc'], squares)).toEqual([
      { sc: 616, ch: 1, 'sl st': 1 },
      { sc: 624, ch: 1, 'sl st': 1 },
    ]);
  });

  it('is nothing without rounds', () => {
    expect(borderRounds([], squares)).toEqual([]);
  });

  it('goes round a single motif', () => {
    expect(made(['sc'], edgeSides(edgeOf(SQUARES, 1, 1), 15))).toEqual([
      { sc: 4 * 15 + 12, ch: 1, 'sl st': 1 },
    ]);
  });

  it('puts more into a corner the taller the stitch, and turns with its own chains', () => {
    // common practice, no source: 3 in a corner up to hdc, 5 dc, 7 tr; 604 + 4 sides and junctions
    expect(made(['hdc'], squares)).toEqual([{ hdc: 604 + 12, ch: 2, 'sl st': 1 }]);
    expect(made(['dc'], squares)).toEqual([{ dc: 604 + 20, ch: 3, 'sl st': 1 }]);
    expect(made(['tr'], squares)).toEqual([{ tr: 604 + 28, ch: 4, 'sl st': 1 }]);
  });

  it('grows from the round below, whatever its stitch', () => {
    const counts = made(['sc', 'dc', 'sc'], squares).map(({ sc, dc }) => sc ?? dc);
    expect(counts).toEqual([616, 616 + 16, 616 + 16 + 8]);
  });

  it('holds a stitch at every outer corner of hexagons and grows at four of them', () => {
    const hexagons = edgeOf(HEXAGONS, 3, 4);
    const { outerSides, edgeJunctions, outerCorners } = hexagons.counts;
    const all = outerSides * 10 + edgeJunctions * 2 + outerCorners;
    expect(outerCorners).toBeGreaterThan(4);
    expect(made(['sc', 'sc'], edgeSides(hexagons, 10)).map(({ sc }) => sc)).toEqual([
      all + 8,
      all + 16,
    ]);
  });

  it('works more or fewer where a side is adjusted', () => {
    const [round] = borderRounds(
      [{ stitch: 'sc', colour: 'c1', adjust: [3, -2, 0, 0] }],
      [20, 30, 20, 30],
    );
    // by hand: two more a side for the corners, then the adjustment
    expect(round?.leaves).toEqual([25, 30, 22, 32]);
    expect(round?.made.sc).toBe(109);
  });
});

describe('borderRounds of edgings', () => {
  it('makes what a hand makes that works the text round such an edge, stitch by stitch', () => {
    for (const { key, text } of READY_EDGINGS) {
      const edging = readyEdging(key)!;
      const { least, multipleOf } = edging.over;
      for (const repeats of [0, 1, 5]) {
        const n = least + repeats * multipleOf;
        const [work] = borderRounds([{ stitch: 'sc', colour: 'c1', edging }], [n, 0, 0, 0]);
        const { rounds, diagnostics } = readPattern(
          `Ch ${n}.\nRnd 1: Sc in each ch around; join with sl st in first sc.\nRnd 2: ${text}`,
          { terms: 'us', sides: 0 },
        );
        expect(diagnostics.filter(({ severity }) => severity !== 'note')).toEqual([]);
        expect({ key, n, made: work?.made }).toEqual({ key, n, made: rounds[1]?.made });
      }
    }
  });

  it('leaves the next round as many stitches and chains as stand on it, over any sides', () => {
    const key = fc.constantFrom(...READY_EDGINGS.map((each) => each.key));
    const sides = fc.tuple(...Array.from({ length: 4 }, () => fc.integer({ min: 1, max: 12 })));
    fc.assert(
      fc.property(key, sides, (chosen, repeats) => {
        const edging = readyEdging(chosen)!;
        const { least, multipleOf } = edging.over;
        const over = repeats.map((each, i) =>
          i === 0 ? least + each * multipleOf : each * multipleOf,
        );
        const [work] = borderRounds(
          [{ stitch: 'sc', colour: 'c1', edging }],
          over as unknown as FourSides,
        );
        const more = repeats.reduce((sum, each) => sum + each, 0);
        expect(sumSides(work!.leaves)).toBeCloseTo(
          edging.top.least + more * edging.top.perRepeat,
          9,
        );
      }),
      FIXED_SEED,
    );
  });
});
