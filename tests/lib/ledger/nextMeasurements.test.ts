import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expectedM, learnHand } from '../../../src/lib/hand/hand';
import { NO_YARN, type YarnUse } from '../../../src/lib/hand/yarnUse';
import { estimate } from '../../../src/lib/ledger/estimate';
import { evidenceOf, motifUse, swatchUse } from '../../../src/lib/ledger/evidenceOf';
import type { NextMeasurement } from '../../../src/lib/ledger/ledger';
import type { Plan, PlanEvidence } from '../../../src/lib/plan/plan';
import {
  anyPlan,
  buildPlan,
  FIXED_SEED,
  plainPlan,
  unravelled,
  weighed,
} from '../../support/plans';

const next = (plan: Plan): readonly NextMeasurement[] => estimate(plan).next;
const find = (plan: Plan, kind: NextMeasurement['kind'], motifs = 0) =>
  next(plan).find((each) => each.kind === kind && each.motifs === motifs) as NextMeasurement;

/** What the plan's own hand expects of a piece, so that measuring it changes no mean. */
function expectedOf(plan: Plan, use: YarnUse | null): number {
  const width = estimate(plan).stitchWidthMm;
  const stitches = new Set(evidenceOf(plan, width).flatMap((each) => [...each.use.loops.keys()]));
  for (const code of use?.loops.keys() ?? []) stitches.add(code);
  return expectedM(learnHand(width, [...stitches], evidenceOf(plan, width)), use ?? NO_YARN);
}

/** The margin of the plan once it has this piece of evidence as well. */
const marginWith = (plan: Plan, piece: PlanEvidence): number =>
  estimate({ ...plan, evidence: [...plan.evidence, piece] }).totals.marginFraction;

describe('nextMeasurements', () => {
  const plan = buildPlan();

  it.each([8, 12])('foresees what weighing %i motifs would leave', (count) => {
    const pieceM = expectedOf(plan, motifUse(plan, 0, count));
    const piece: PlanEvidence = {
      piece: 'motifs',
      count,
      motifIndex: 0,
      reading: weighed(pieceM / 2, 1),
    };
    const foreseen = find(plan, 'weigh motifs together', count);
    expect(foreseen.marginThen).toBeCloseTo(marginWith(plan, piece), 9);
    expect(foreseen.marginNow).toBeCloseTo(estimate(plan).totals.marginFraction, 12);
  });

  it('foresees what weighing or unravelling the swatch would leave', () => {
    const pieceM = expectedOf(plan, swatchUse(plan));
    const scale: PlanEvidence = { piece: 'swatch', reading: weighed(pieceM / 2, 1) };
    expect(find(plan, 'weigh the swatch').marginThen).toBeCloseTo(marginWith(plan, scale), 9);
    const tape: PlanEvidence = { piece: 'swatch', reading: unravelled(pieceM, 0.01 * pieceM) };
    expect(find(plan, 'unravel the swatch').marginThen).toBeCloseTo(marginWith(plan, tape), 9);
  });

  it('foresees a swatch whose stitch the blanket has none of', () => {
    const swatch = buildPlan().swatch;
    const dcOnly = plainPlan('solid-square', {
      swatch,
      join: { key: 'whip-stitch', colour: 'c1' },
    });
    const pieceM = expectedOf(dcOnly, swatchUse(dcOnly));
    const scale: PlanEvidence = { piece: 'swatch', reading: weighed(pieceM / 2, 1) };
    expect(find(dcOnly, 'weigh the swatch').marginThen).toBeCloseTo(marginWith(dcOnly, scale), 9);
  });

  it('foresees what a finer scale would have left of the same piece', () => {
    const coarse = buildPlan({
      evidence: [{ piece: 'motifs', count: 4, motifIndex: 0, reading: weighed(40, 5) }],
    });
    const fine = buildPlan({
      evidence: [{ piece: 'motifs', count: 4, motifIndex: 0, reading: weighed(40, 0.1) }],
    });
    // the mean shifts a little with the weight of the reading, and with it what motifs differ by
    const { totals } = estimate(fine);
    const { marginThen } = find(coarse, 'read a finer scale', 4);
    expect(marginThen * estimate(coarse).totals.meanM).toBeCloseTo(
      totals.marginFraction * totals.meanM,
      2,
    );
  });

  it('offers only more motifs than were weighed, no swatch twice, no finer scale than the finest', () => {
    const measured = buildPlan({
      evidence: [
        { piece: 'motifs', count: 8, motifIndex: 0, reading: weighed(80, 0.1) },
        { piece: 'swatch', reading: weighed(14, 0.1) },
      ],
    });
    for (const { kind, motifs, resolutionG } of next(measured)) {
      expect(kind).toBe('weigh motifs together');
      expect(motifs).toBeGreaterThan(8);
      expect(resolutionG).toBe(0.1);
    }
  });

  it('offers nothing for a blanket that takes no yarn', () => {
    const nothing = { ...buildPlan().motifs[0]!, ring: { chains: 0, made: {} }, rounds: [] };
    const plan = plainPlan('group-square', {
      motifs: [nothing],
      colourways: [{ motifIndex: 0, roundColours: [] }],
      size: { by: 'grid', rows: 1, columns: 1 },
    });
    expect(next(plan)).toEqual([]);
  });

  it('always cuts the margin, best first, and never asks for more skeins', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const offers = next(plan);
        const margins = offers.map(({ marginThen }) => marginThen);
        expect(margins).toEqual(margins.toSorted((left, right) => left - right));
        for (const { marginNow, marginThen, skeinsNow, skeinsThen, fewer } of offers) {
          expect(marginThen).toBeLessThan(0.99 * marginNow);
          expect(skeinsThen).toBeLessThanOrEqual(skeinsNow);
          const saved = fewer.reduce((sum, { now, then }) => sum + now - then, 0);
          expect(saved).toBe(skeinsNow - skeinsThen);
        }
      }),
      FIXED_SEED,
    );
  });
});
