import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { estimate } from '../../../src/lib/ledger/estimate';
import { BLANKET_SIZES } from '../../../src/lib/sizes/blanketSizes';
import { sizesCsv } from '../../../src/lib/sizes/sizesCsv';
import { sizesOf, withTarget } from '../../../src/lib/sizes/sizesOf';
import { widthMm } from '../../../src/lib/units/quantities';
import { buildPlan, frozen } from '../../support/plans';

const plan = buildPlan();
const sized = sizesOf(plan, frozen([...BLANKET_SIZES]));

describe('BLANKET_SIZES', () => {
  it('are the published ones, in inches exactly', () => {
    const millimetres = BLANKET_SIZES.map(({ key, ...size }) => [key, size.widthMm, size.heightMm]);
    // published: justastitchaway.blogspot.com, 6 Mar 2008 (stroller; adult afghan; twin, full, king
    // bed blanket); the lap crochetcabana.com (lapghan, the larger)
    expect(millimetres).toEqual(
      [
        ['baby', 30, 36],
        ['lap', 36, 48],
        ['throw', 50, 70],
        ['single', 66, 90],
        ['double', 80, 90],
        ['king', 108, 100],
      ].map(([key, width, height]) => [key, 25.4 * Number(width), 25.4 * Number(height)]),
    );
  });
});

describe('sizesOf', () => {
  it('gives its worked example', () => {
    const throwSize = sized.find(({ target }) => target.key === 'throw');
    // by hand: 50 in are 1,270 mm, 9 columns 1,279, 8 columns 1,142; 70 in are 1,778, 13 rows 1,830, 12 rows 1,692
    expect([throwSize?.columns, throwSize?.rows]).toEqual([9, 13]);
  });

  it('is the estimate of the plan with each size wanted', () => {
    for (const { target, totals, colours, size } of sized) {
      const own = estimate(withTarget(plan, target));
      expect({ totals, colours, size }).toEqual({
        totals: own.totals,
        colours: own.colours,
        size: own.size,
      });
    }
  });

  it('comes within half a motif and its seam of what is wanted', () => {
    const stepMm = (estimate(plan).motifs[0]?.acrossMm ?? 0) + estimate(plan).size.seamMm;
    for (const { target, size } of sized) {
      expect(Math.abs(size.widthMm - target.widthMm)).toBeLessThanOrEqual(stepMm / 2 + 1e-9);
      expect(Math.abs(size.heightMm - target.heightMm)).toBeLessThanOrEqual(stepMm / 2 + 1e-9);
    }
  });

  it('keeps to at least the size where the plan does', () => {
    const size = { by: 'target', widthMm: widthMm(900), heightMm: widthMm(900), rule: 'at-least' };
    for (const each of sizesOf(buildPlan({ size } as never), BLANKET_SIZES)) {
      expect(each.size.widthMm).toBeGreaterThanOrEqual(each.target.widthMm);
      expect(each.size.heightMm).toBeGreaterThanOrEqual(each.target.heightMm);
    }
  });

  it('answers nothing for no sizes', () => {
    expect(sizesOf(plan, [])).toEqual([]);
  });
});

describe('sizesCsv', () => {
  it('has a column for each size and the skeins of each colour', () => {
    const { data } = Papa.parse<Record<string, string>>(sizesCsv(plan, sized), {
      header: true,
      skipEmptyLines: true,
    });
    const row = (what: string) => data.find(({ size }) => size === what);
    expect(Object.keys(data[0] ?? {})).toEqual(['size', ...BLANKET_SIZES.map(({ name }) => name)]);
    expect(row('skeins')?.King).toBe(String(sized.at(-1)?.totals.skeins));
    expect(row('Skerry: skeins')?.Baby).toBe(String(sized[0]?.colours[0]?.skeins));
    expect(row('cost_EUR')?.Baby).toBe(((sized[0]?.totals.costMinor ?? 0) / 100).toFixed(2));
  });

  it('leaves the cost out where no price is known', () => {
    const free = buildPlan({ yarn: { ...plan.yarn, price: null } });
    expect(sizesCsv(free, sizesOf(free, BLANKET_SIZES))).not.toContain('cost');
  });
});
