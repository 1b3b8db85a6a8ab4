import { describe, expect, it } from 'vitest';
import { estimate, gaugeOf, motifGeometry, readyMotif, type Motif } from '../../../src/lib';
import { measuredMotif } from '../../../src/lib/motifs/measuredMotif';
import { withMadeMotif, type MadeMotif } from '../../../src/lib/plan/madeMotif';
import { planSchema } from '../../../src/schemas/plan';
import { buildPlan, frozen, weighed } from '../../support/plans';

const hexagon = frozen(readyMotif('hexagon', 4) as Motif);
const plan = buildPlan({ evidence: [] });
const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
const { acrossMm } = motifGeometry(hexagon, gauge, null);
/** Four rounds, 6 % larger than by the gauge; its first colourway attaches four yarns. */
const made: MadeMotif = frozen({
  rounds: 4,
  sizes: [{ round: 4, acrossMm: 1.06 * acrossMm }],
  weighed: { count: 3, massG: 30, resolutionG: 1, yarns: 4 },
  weightCategory: plan.yarn.weightCategory,
  putUp: plan.yarn.putUp,
});

describe('withMadeMotif', () => {
  it('plans the motif at its measured size, with its weight as evidence', () => {
    const changed = withMadeMotif(plan, hexagon, made);
    expect(changed.motifs[0]).toBe(hexagon);
    expect(changed.motifSideMm).toBe(measuredMotif(hexagon, gauge, made.sizes).acrossMm);
    expect(changed.evidence).toEqual([
      { piece: 'motifs', count: 3, motifIndex: 0, reading: weighed(30, 1) },
    ]);
    expect(planSchema.safeParse(structuredClone(changed)).success).toBe(true);
    expect(estimate(changed).size.widthMm).toBeGreaterThan(
      estimate(withMadeMotif(plan, hexagon, { ...made, sizes: [] })).size.widthMm,
    );
  });

  it('leaves the size to be computed where the last round planned was not measured', () => {
    const fewer = { ...made, sizes: [{ round: 3, acrossMm: 0.8 * acrossMm }] };
    expect(withMadeMotif(plan, hexagon, fewer).motifSideMm).toBeNull();
  });

  it('counts the stitches of motifs that had fewer rounds or other yarns than the plan’s', () => {
    const [fewer] = withMadeMotif(plan, hexagon, { ...made, rounds: 2, sizes: [] }).evidence;
    const dc = (rounds: number) =>
      hexagon.rounds.slice(0, rounds).reduce((sum, round) => sum + (round.made.dc ?? 0), 0);
    expect(fewer).toMatchObject({ piece: 'counted', tails: 24, made: { dc: 3 * dc(2) } });
    const plain = { ...made, weighed: { count: 3, massG: 30, resolutionG: 1, yarns: 1 } };
    expect(withMadeMotif(plan, hexagon, plain).evidence[0]).toMatchObject({
      piece: 'counted',
      tails: 6,
      made: { dc: 3 * dc(4) },
    });
  });

  it('takes a weight once, however often it is handed over', () => {
    const once = withMadeMotif(plan, hexagon, made);
    expect(withMadeMotif(once, hexagon, made)).toEqual(once);
  });

  it('states the weight in grams of the plan’s yarn where that runs a little further', () => {
    const { massG, lengthM } = plan.yarn.putUp;
    const longer = { ...made, putUp: { massG, lengthM: 1.05 * lengthM } };
    const changed = withMadeMotif(plan, hexagon, longer);
    const { reading } = changed.evidence[0]!;
    expect(reading.by === 'weighing' && reading.massG).toBeCloseTo(31.5, 10);
    expect(changed.yarn).toBe(plan.yarn);
  });

  it('plans in the yarn it was made in where that is another, without what the old one told', () => {
    const other = { ...made, weightCategory: 5, putUp: { massG: 100, lengthM: 110 } } as const;
    const full = buildPlan();
    const changed = withMadeMotif(full, hexagon, other);
    expect(changed.yarn).toEqual({
      name: 'The yarn it was made in',
      weightCategory: 5,
      putUp: { massG: 100, lengthM: 110 },
      price: null,
    });
    expect([changed.swatch, changed.evidence.length]).toEqual([null, 1]);
    expect([full.swatch, full.evidence.length]).not.toEqual([null, 1]);
    expect(changed.evidence[0]?.reading).toEqual(weighed(30, 1));
    expect(planSchema.safeParse(structuredClone(changed)).success).toBe(true);
  });

  it('keeps what was weighed before', () => {
    const swatch = { piece: 'swatch', reading: weighed(30, 1) } as const;
    const { evidence } = withMadeMotif(buildPlan({ evidence: [swatch] }), hexagon, made);
    expect(evidence.map(({ piece }) => piece)).toEqual(['swatch', 'motifs']);
  });

  it('refuses more rounds than the motif has', () => {
    expect(() => withMadeMotif(plan, hexagon, { ...made, rounds: 5 })).toThrow(
      'withMadeMotif requires a motif of at least the 5 rounds made, got 4',
    );
  });
});
