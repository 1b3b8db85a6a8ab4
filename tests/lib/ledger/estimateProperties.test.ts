import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  compareJoins,
  CONFIDENCES,
  estimate,
  inchesToMm,
  lengthM,
  massG,
  ouncesToGrams,
  READY_JOINS,
  widthMm,
  yardsToMetres,
  type Estimate,
  type Plan,
} from '../../../src/lib';
import { anyEvidence, anyLaidPlan, anyPlan, FIXED_SEED, plainPlan } from '../../support/plans';

const roundsM = ({ parts }: Estimate): number =>
  parts.filter(({ part }) => part === 'rounds').reduce((sum, each) => sum + each.lengthM, 0);

const close = (actual: number, expected: number, relative: number): void =>
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(
    relative * Math.max(1e-9, Math.abs(expected)),
  );

/** Every figure of an estimate, in order. */
const figures = (value: unknown): number[] => {
  if (typeof value === 'number') return [value];
  return value !== null && typeof value === 'object' ? Object.values(value).flatMap(figures) : [];
};

describe('estimate, whatever the plan', () => {
  it('takes twice the yarn in rounds for twice the motifs', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        fc.pre(plan.size.by === 'grid' && plan.colourways.length === 1);
        const { rows, columns } = plan.size as { rows: number; columns: number };
        const doubled = estimate({ ...plan, size: { by: 'grid', rows: 2 * rows, columns } });
        close(roundsM(doubled), 2 * roundsM(estimate(plan)), 1e-12);
      }),
      FIXED_SEED,
    );
  });

  it('takes the same yarn in rounds for every motif of a grid', () => {
    fc.assert(
      fc.property(anyPlan, fc.integer({ min: 2, max: 9 }), (plan, times) => {
        fc.pre(plan.colourways.length === 1);
        const one = estimate({ ...plan, size: { by: 'grid', rows: 1, columns: 1 } });
        const many = estimate({ ...plan, size: { by: 'grid', rows: times, columns: times } });
        close(roundsM(many), times ** 2 * roundsM(one), 1e-12);
      }),
      FIXED_SEED,
    );
  });

  it('is never less sure of any colour with one more measured piece', () => {
    fc.assert(
      fc.property(anyPlan, anyEvidence, (plan, piece) => {
        const hand = ({ uncertainty }: Estimate): number =>
          uncertainty
            .filter(({ cause }) => cause === 'hand' || cause === 'stitch' || cause === 'sewing')
            .reduce((sum, { varianceM2 }) => sum + varianceM2, 0);
        const before = hand(estimate(plan));
        const after = hand(estimate({ ...plan, evidence: [...plan.evidence, piece] }));
        expect(after).toBeLessThanOrEqual(before * (1 + 1e-7) + 1e-9);
      }),
      FIXED_SEED,
    );
  });

  it('never asks for fewer skeins as the confidence rises', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const skeins = CONFIDENCES.map((confidence) => estimate({ ...plan, confidence }).colours);
        for (let i = 1; i < skeins.length; i += 1) {
          skeins[i]?.forEach((colour, j) =>
            expect(colour.skeins).toBeGreaterThanOrEqual(skeins[i - 1]?.[j]?.skeins as number),
          );
        }
      }),
      FIXED_SEED,
    );
  });

  it('has a chance of running short that falls with every skein', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        for (const { chances } of estimate(plan).colours) {
          const shares = chances.map(({ probabilityShort }) => probabilityShort);
          expect(shares).toEqual(shares.toSorted((left, right) => right - left));
        }
      }),
      FIXED_SEED,
    );
  });

  it('is the same for a swatch and a skein entered in inches, yards and ounces', () => {
    // What is entered in imperial is converted once, at the edge: to the bit nearly the metric value.
    const imperial = (plan: Plan): Plan => ({
      ...plan,
      yarn: {
        ...plan.yarn,
        putUp: {
          massG: massG(ouncesToGrams(plan.yarn.putUp.massG / 28.349523125)),
          lengthM: lengthM(yardsToMetres(plan.yarn.putUp.lengthM / 0.9144)),
        },
      },
      swatch: plan.swatch && {
        ...plan.swatch,
        widthMm: widthMm(inchesToMm(plan.swatch.widthMm / 25.4)),
        heightMm: widthMm(inchesToMm(plan.swatch.heightMm / 25.4)),
      },
    });
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const metric = estimate(plan);
        const other = estimate(imperial(plan));
        close(other.totals.meanM, metric.totals.meanM, 1e-12);
        close(other.size.widthMm, metric.size.widthMm, 1e-12);
        other.colours.forEach(({ neededM }, i) =>
          close(neededM, metric.colours[i]?.neededM as number, 1e-10),
        );
      }),
      FIXED_SEED,
    );
  });

  it('does not care in which order pieces were measured', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const forward = estimate(plan).totals;
        const backward = estimate({ ...plan, evidence: plan.evidence.toReversed() }).totals;
        close(backward.meanM, forward.meanM, 1e-9);
        close(backward.sdM, forward.sdM, 1e-7);
        expect(backward.skeins).toBe(forward.skeins);
      }),
      FIXED_SEED,
    );
  });

  it('takes as many metres per mm of stitch, whatever the size of the stitch', () => {
    // Everything but tails is proportional to the width of a stitch while nothing is weighed.
    fc.assert(
      fc.property(anyPlan, fc.constantFrom(0.5, 2, 3), (plan, times) => {
        fc.pre(plan.swatch !== null);
        const swatch = plan.swatch as NonNullable<Plan['swatch']>;
        const bigger: Plan['swatch'] = {
          ...swatch,
          widthMm: widthMm(swatch.widthMm * times),
          heightMm: widthMm(swatch.heightMm * times),
        };
        const bare = { ...plan, evidence: [], motifSideMm: null };
        const worked = ({ parts }: Estimate): number =>
          parts
            .filter(({ part }) => part !== 'tails' && part !== 'allowance')
            .reduce((sum, each) => sum + each.lengthM, 0);
        const small = estimate(bare);
        const large = estimate({ ...bare, swatch: bigger });
        close(worked(large), times * worked(small), 1e-12);
        close(large.size.widthMm, times * small.size.widthMm, 1e-12);
      }),
      FIXED_SEED,
    );
  });

  it('keeps the grid while joins are compared', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const { rows, columns, motifs } = estimate(plan);
        const acrossMm = Math.max(...motifs.map((motif) => motif.acrossMm));
        for (const each of compareJoins(plan, READY_JOINS)) {
          const own = estimate({ ...plan, join: { ...plan.join, key: each.join.key } });
          expect([own.rows, own.columns]).toEqual([rows, columns]);
          // Strips of triangles hold two in the width of a side.
          if (plan.motifs[0]?.sides === 3) continue;
          expect(each.widthMm).toBeGreaterThanOrEqual(columns * acrossMm - 1e-9);
        }
      }),
      { ...FIXED_SEED, numRuns: 15 },
    );
  });

  it('adds up in every layout: parts to the total, motifs to the layout, within a real size', () => {
    fc.assert(
      fc.property(anyLaidPlan, (plan) => {
        const { totals, parts, counts, colourwayMotifs, size } = estimate(plan);
        const inParts = parts.reduce(
          (sum, { part, lengthM }) => (part === 'allowance' ? sum : sum + lengthM),
          0,
        );
        expect(inParts).toBeCloseTo(totals.meanM, 6);
        const motifs = colourwayMotifs.reduce((sum, each) => sum + each, 0);
        expect(motifs).toBe(counts.motifs + counts.fillers);
        expect(size.widthMm).toBeGreaterThan(0);
        expect(size.heightMm).toBeGreaterThan(0);
      }),
      FIXED_SEED,
    );
  });

  it('takes half the yarn of a motif for half of it', () => {
    const plan = plainPlan('group-square', { layout: 'brick', edge: 'straight' });
    const one: Plan = { ...plan, layout: 'square', size: { by: 'grid', rows: 1, columns: 1 } };
    const { counts } = estimate(plan);
    expect(counts.halves).toBe(4);
    const motifs = counts.motifs + counts.halves / 2;
    close(roundsM(estimate(plan)), motifs * roundsM(estimate(one)), 1e-9);
  });

  it('changes nothing of a plan that is frozen all the way down', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const before = JSON.stringify(plan);
        estimate(plan);
        compareJoins(plan, READY_JOINS.slice(0, 2));
        expect(JSON.stringify(plan)).toBe(before);
      }),
      { ...FIXED_SEED, numRuns: 15 },
    );
  });

  it('gives only finite figures, twice the same', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const all = figures(estimate(plan));
        expect(all.every(Number.isFinite)).toBe(true);
        expect(figures(estimate(plan))).toEqual(all);
      }),
      FIXED_SEED,
    );
  });
});
