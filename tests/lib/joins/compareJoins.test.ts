import { describe, expect, it } from 'vitest';
import { compareJoins } from '../../../src/lib/joins/compareJoins';
import { READY_JOINS } from '../../../src/lib/joins/readyJoins';
import { estimate } from '../../../src/lib/ledger/estimate';
import { widthMm } from '../../../src/lib/units/quantities';
import { buildPlan, frozen } from '../../support/plans';

const plan = buildPlan();
const compared = compareJoins(plan, frozen([...READY_JOINS]));

describe('compareJoins', () => {
  it('tries every join, each as the plan would have it', () => {
    expect(compared.map(({ join }) => join.key)).toEqual(READY_JOINS.map(({ key }) => key));
    for (const { join, totalM, skeins, widthMm: width, tails, costMinor } of compared) {
      const own = estimate({ ...plan, join: { ...plan.join, key: join.key } });
      expect({ totalM, skeins, width, tails, costMinor }).toEqual({
        totalM: own.totals.meanM,
        skeins: own.totals.skeins,
        width: own.size.widthMm,
        tails: own.totals.tails,
        costMinor: own.totals.costMinor,
      });
    }
  });

  it('takes the yarn of a join apart from that of motifs and border', () => {
    // motifs are the same under every join; the border of a braid finds as many stitches as a seam's
    const whip = compared.find(({ join }) => join.key === 'whip-stitch');
    const braid = compared.find(({ join }) => join.key === 'flat-braid');
    expect((braid?.totalM ?? 0) - (braid?.joinM ?? 0)).toBeCloseTo(
      (whip?.totalM ?? 0) - (whip?.joinM ?? 0),
      9,
    );
  });

  it('sews with three times the length of the seams', () => {
    // 142 sides of 119.416 mm × 3, and two tails of 150 mm for each of 9 + 7 lines
    const whip = compared.find(({ join }) => join.key === 'whip-stitch');
    expect(whip?.joinM).toBeCloseTo(142 * 0.119415623 * 3 + 32 * 0.15, 5);
    expect(whip?.seamMm).toBe(0);
  });

  it('keeps the grid that a target size gives with the join of the plan', () => {
    const size = {
      by: 'target',
      widthMm: widthMm(1200),
      heightMm: widthMm(1500),
      rule: 'nearest',
    } as const;
    const targeted = buildPlan({ size });
    const { rows, columns } = estimate(targeted);
    const onGrid = buildPlan({ size: { by: 'grid', rows, columns } });
    expect(compareJoins(targeted, READY_JOINS)).toEqual(compareJoins(onGrid, READY_JOINS));
  });

  it('says which joins fit the side, in words', () => {
    expect(compared.every(({ fits }) => fits)).toBe(true); // 15 = 4 × 3 + 3 = 2 × 7 + 1
    const even = {
      ...plan.motifs[0]!,
      rounds: plan.motifs[0]!.rounds.map((r) => ({ ...r, perSide: 16 })),
    };
    const uneven = compareJoins({ ...plan, motifs: [even] }, READY_JOINS);
    expect(uneven.filter(({ fits }) => !fits).map(({ join }) => join.key)).toEqual([
      'zigzag-chain',
      'last-round',
      'flat-braid',
      'reed-lace',
      'lantern-lace',
    ]);
    expect(uneven.find(({ fits }) => !fits)?.fitWords).toMatch(/^16 stitches a side do not fit/);
  });

  it('compares no join where there is none to compare', () => {
    expect(compareJoins(plan, [])).toEqual([]);
  });
});
