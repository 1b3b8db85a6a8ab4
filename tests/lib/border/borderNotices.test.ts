import { describe, expect, it } from 'vitest';
import { withBorderFix, withEdging } from '../../../src/lib/border/borderEdits';
import { planBorder } from '../../../src/lib/border/planBorder';
import { readyEdging } from '../../../src/lib/border/readyEdgings';
import { estimate } from '../../../src/lib/ledger/estimate';
import type { Plan } from '../../../src/lib/plan/plan';
import { buildPlan } from '../../support/plans';

const uneven = withEdging(buildPlan(), readyEdging('shell')!);
const asked = (plan: Plan) => estimate(plan).notices.filter(({ code }) => code === 'border-uneven');

describe('borderNotices', () => {
  it('asks about an edging that does not come out even, and no more once it is mended', () => {
    expect(asked(uneven).map(({ message }) => message)).toEqual([
      'Border round 4, Shells, does not come out even in repeats of 6: “Border round by round” says what would make it.',
    ]);
    const [fix] = planBorder(uneven, estimate(uneven))[3]!.fixes;
    expect(asked(withBorderFix(uneven, 3, fix!))).toEqual([]);
  });

  it('has nothing to ask about plain rounds', () => {
    expect(asked(buildPlan())).toEqual([]);
  });
});

describe('the ledger of an edging', () => {
  it('counts its stitches under its name, as they are shown round by round', () => {
    const { ledger, size } = estimate(uneven);
    const lines = ledger.filter(({ label }) => label === 'Border round 4: Shells');
    const made = Object.fromEntries(lines.map(({ stitch, count }) => [stitch, count]));
    const shown = planBorder(uneven, estimate(uneven))[3]!.made;
    for (const [code, count] of Object.entries(shown)) expect(made[code]).toBeCloseTo(count, 6);
    // by hand: three rounds of sc of 124 / 18 mm, and one of dc, 1.85 / 0.92 times as tall
    const scMm = 124 / 18;
    expect(size.borderMm).toBeCloseTo(3 * scMm + (scMm * 1.85) / 0.92, 6);
  });
});
