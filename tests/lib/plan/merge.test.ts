import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate, type Plan } from '../../../src/lib';
import { withBorder, withColour, withRoundColour } from '../../../src/lib/plan/edits';
import { changedParts, mergedPlan } from '../../../src/lib/plan/merge';
import { planSchema } from '../../../src/schemas/plan';
import { buildPlan, FIXED_SEED } from '../../support/plans';

const base = buildPlan();
const wide: Plan = { ...base, size: { by: 'grid', rows: 10, columns: 12 } };
const sure: Plan = { ...base, confidence: 0.99 };
const plain = withBorder(base, 0, 'sc');
const recoloured = withRoundColour(base, 0, 0, 'c5');

describe('changedParts', () => {
  it('names the parts whose content differs, however they were made', () => {
    expect(changedParts(base, wide)).toEqual(['size']);
    expect(changedParts(base, structuredClone(base))).toEqual([]);
    expect(changedParts(base, { ...plain, confidence: 0.5 })).toEqual(['border', 'confidence']);
  });
});

describe('mergedPlan', () => {
  it('puts changes of different parts together, from whichever side', () => {
    const both = { ...wide, border: [] };
    expect(mergedPlan(base, wide, plain)).toEqual(both);
    expect(mergedPlan(base, plain, wide)).toEqual(both);
  });

  it('takes the one change where the other side changed nothing', () => {
    expect(mergedPlan(base, base, sure)).toEqual(sure);
    expect(mergedPlan(base, sure, base)).toEqual(sure);
  });

  it('refuses two changes of one part, even if they are the same', () => {
    const wider: Plan = { ...base, size: { by: 'grid', rows: 10, columns: 14 } };
    expect(mergedPlan(base, wide, wider)).toBeNull();
    expect(mergedPlan(base, wide, wide)).toBeNull();
  });

  it('refuses to put colours with parts that name them', () => {
    const more = withColour(base, { name: 'Marram', hex: '#c0b070' });
    expect(mergedPlan(base, more, plain)).toBeNull();
    expect(mergedPlan(base, plain, more)).toBeNull();
    expect(
      mergedPlan(base, recoloured, { ...base, join: { ...base.join, key: 'whip-stitch' } }),
    ).toBeNull();
    expect(mergedPlan(base, more, wide)).not.toBeNull();
  });

  it('gives only plans that can be kept and worked out', () => {
    const edits = [wide, sure, plain, recoloured, { ...base, corners: 'gathered' as const }];
    fc.assert(
      fc.property(fc.constantFrom(...edits), fc.constantFrom(...edits), (mine, theirs) => {
        const merged = mergedPlan(base, mine, theirs);
        if (!merged) return;
        expect(planSchema.safeParse(merged).success).toBe(true);
        expect(estimate(merged).totals.skeins).toBeGreaterThan(0);
      }),
      FIXED_SEED,
    );
  });
});
