import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import { blanketOf } from '../../../src/lib/ledger/blanketOf';
import { joinStitches } from '../../../src/lib/ledger/pieces';
import type { Motif } from '../../../src/lib/motifs/motif';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';
import { widthMm } from '../../../src/lib/units/quantities';
import { HEXAGONS, SQUARES } from '../../support/arrangements';
import { buildPlan, plainPlan } from '../../support/plans';

describe('blanketOf', () => {
  it('lays the front page out', () => {
    const blanket = blanketOf(buildPlan());
    expect(blanket).toMatchObject({
      arrangement: SQUARES,
      rows: 10,
      columns: 8,
      sideStitches: 15,
      cornerLinks: 63 * 2 + 32,
      places: [27, 27, 26].map((motifs) => ({ motifs, halves: 0 })),
    });
  });

  it('measures it: motifs, seams, and on either side the added round and the border', () => {
    // swatch 7.5 mm, sc 6.889, dc 13.853; motif 2 × (4 × 6.75 / 2π + 4 × 13.853) = 119.416
    // braid 1.2 × sqrt(16.875² - 7.5²) = 18.140, half of it outside; border 3 × 6.889 = 20.667
    const { size } = blanketOf(buildPlan());
    expect(size.seamMm).toBeCloseTo(18.14, 3);
    expect(size.edgeMm).toBeCloseTo(9.07, 3);
    expect(size.borderMm).toBeCloseTo(20.667, 3);
    expect(size.widthMm).toBeCloseTo(8 * 119.4156 + 8 * 18.1401 + 2 * 20.6667, 2);
    expect(size.heightMm).toBeCloseTo(10 * 119.4156 + 10 * 18.1401 + 2 * 20.6667, 2);
  });

  it('is as uncertain as its motifs all together', () => {
    const { size, geometries } = blanketOf(buildPlan());
    expect(size.widthSdMm).toBeCloseTo(8 * (geometries[0]?.acrossSdMm as number), 10);
    expect(size.heightSdMm).toBeCloseTo(10 * (geometries[0]?.acrossSdMm as number), 10);
  });

  it('takes a measured side for the computed one', () => {
    const plan = buildPlan({ motifSideMm: widthMm(142) });
    const { size } = blanketOf(plan);
    expect(size.widthMm).toBeCloseTo(8 * 142 + 8 * size.seamMm + 2 * size.borderMm, 10);
    expect(size.widthSdMm).toBeCloseTo(8 * 1.42, 10);
  });

  it('plans for the largest of several motifs', () => {
    const motifs = [readyMotif('group-square', 3), readyMotif('group-square', 4)] as Motif[];
    const colourways = [
      { motifIndex: 0, roundColours: ['c1', 'c1', 'c1'] },
      { motifIndex: 1, roundColours: ['c1', 'c1', 'c1', 'c1'] },
    ];
    const { size } = blanketOf(buildPlan({ motifs, colourways }));
    expect(size.widthMm).toBeCloseTo(blanketOf(buildPlan()).size.widthMm, 10);
  });

  it('finds rows and columns for a target size', () => {
    const size = {
      by: 'target',
      widthMm: widthMm(1300),
      heightMm: widthMm(1700),
      rule: 'at-least',
    } as const;
    const blanket = blanketOf(buildPlan({ size }));
    expect(blanket).toMatchObject({ rows: 13, columns: 10 });
    expect(blanket.size.widthMm).toBeGreaterThanOrEqual(1300);
  });

  it('counts an eighth of a circle where two touch, and no corners', () => {
    const blanket = blanketOf(plainPlan('circle'));
    const { acrossMm } = blanket.geometries[0] as { acrossMm: number };
    expect(blanket).toMatchObject({ arrangement: SQUARES, sideStitches: 7, cornerLinks: 0 });
    expect(blanket.seamMm).toBeCloseTo((Math.PI * acrossMm) / 8, 10);
  });

  it('lays hexagons in offset rows', () => {
    expect(blanketOf(plainPlan('hexagon'))).toMatchObject({
      arrangement: HEXAGONS,
      sideStitches: 10,
    });
  });

  it('refuses a layout that has no place for the motifs, and a join it does not know', () => {
    const hexagons = plainPlan('hexagon', { layout: null });
    expect(() => blanketOf({ ...hexagons, layout: 'square' })).toThrow(DomainError);
    expect(() => blanketOf({ ...plainPlan('octagon'), secondMotif: null })).toThrow(DomainError);
    const unknown = buildPlan({ join: { key: 'no-such', colour: 'c1' } });
    expect(() => blanketOf(unknown)).toThrow('got "no-such"');
  });
});

describe('joinStitches', () => {
  it('is the side of the last round, and an eighth of a circle', () => {
    expect(joinStitches(readyMotif('group-square', 4) as Motif)).toBe(15);
    expect(joinStitches(readyMotif('circle', 5) as Motif)).toBe(7);
    expect(joinStitches(readyMotif('circle', 1) as Motif)).toBe(1);
    expect(joinStitches({ ...(readyMotif('circle') as Motif), rounds: [] })).toBe(0);
  });
});
