import fc from 'fast-check';
import {
  CONFIDENCES,
  EXAMPLE_PLAN,
  lengthM,
  massG,
  READY_JOINS,
  READY_MOTIFS,
  readyMotif,
  widthMm,
  type Confidence,
  type Motif,
  type Plan,
  type PlanEvidence,
  type PlanSwatch,
  type WeightCategory,
} from '../../src/lib';
import { layoutFacts, layoutFor, layoutsFor, EDGES } from '../../src/lib/layout/layouts';
import { withMotif } from '../../src/lib/plan/edits';
import { withLayout } from '../../src/lib/plan/layoutEdits';

/** Properties are tried on the same cases every time; fast-check prints them when one fails. */
export const FIXED_SEED = { seed: 20_261_201, numRuns: 60 } as const;

/** The same value, frozen all the way down: whoever changes it throws. */
export function frozen<T>(value: T): T {
  if (value !== null && typeof value === 'object') Object.values(value).forEach(frozen);
  return Object.freeze(value);
}

/** The front page's plan with some of it changed. */
export const buildPlan = (change: Partial<Plan> = {}): Plan =>
  frozen({ ...structuredClone(EXAMPLE_PLAN), ...change });

/** One motif in one colour, a single colour of yarn, no border and nothing measured, in its usual layout. */
export function plainPlan(key: string, change: Partial<Plan> = {}, rounds = Infinity): Plan {
  const motif = readyMotif(key, rounds) as Motif;
  const plan = buildPlan({
    colours: [{ key: 'c1', name: 'Skerry', hex: '#2f5d73' }],
    swatch: null,
    evidence: [],
    motifs: [motif],
    colourways: [{ motifIndex: 0, roundColours: motif.rounds.map(() => 'c1') }],
    size: { by: 'grid', rows: 4, columns: 3 },
    join: { key: 'slip-stitch', colour: 'c1' },
    border: [],
    ...change,
  });
  return frozen(withLayout(plan, plan.layout));
}

export const weighed = (pieceG: number, resolutionG: number): PlanEvidence['reading'] => ({
  by: 'weighing',
  massG: massG(pieceG),
  resolutionG: massG(resolutionG),
});

export const unravelled = (pieceM: number, errorM: number): PlanEvidence['reading'] => ({
  by: 'unravelling',
  lengthM: lengthM(pieceM),
  errorM: lengthM(errorM),
});

const colourKeys = ['c1', 'c2', 'c3', 'c4', 'c5'] as const;
const colourKey = fc.constantFrom(...colourKeys);

const swatch: fc.Arbitrary<PlanSwatch> = fc.record({
  stitch: fc.constantFrom('sc', 'hdc', 'dc'),
  stitches: fc.integer({ min: 10, max: 40 }),
  rows: fc.integer({ min: 6, max: 40 }),
  widthMm: fc.integer({ min: 90, max: 220 }).map(widthMm),
  heightMm: fc.integer({ min: 60, max: 220 }).map(widthMm),
});

/** Readings that a scale could show of such a piece, some of them far from what is usual. */
const reading: fc.Arbitrary<PlanEvidence['reading']> = fc.oneof(
  fc
    .tuple(fc.integer({ min: 5, max: 120 }), fc.constantFrom(0.1, 1, 5))
    .map(([pieceG, resolutionG]) => weighed(pieceG, resolutionG)),
  fc
    .tuple(fc.integer({ min: 10, max: 200 }), fc.integer({ min: 0, max: 3 }))
    .map(([pieceM, errorM]) => unravelled(pieceM, errorM)),
);

export const anyEvidence: fc.Arbitrary<PlanEvidence> = fc.oneof(
  fc.record({
    piece: fc.constant('motifs' as const),
    count: fc.integer({ min: 1, max: 12 }),
    motifIndex: fc.constant(0),
    reading,
  }),
  fc.record({
    piece: fc.constant('counted' as const),
    label: fc.constant('sample'),
    made: fc.record({ sc: fc.integer({ min: 50, max: 900 }), ch: fc.integer({ min: 0, max: 60 }) }),
    tails: fc.integer({ min: 0, max: 4 }),
    reading,
  }),
);

/** Motifs that fill a layout by themselves. */
const LONE_MOTIFS = READY_MOTIFS.filter(
  ({ sides }) => layoutFacts(layoutFor(sides)).secondSides === null,
);

/** Plans of every ready motif that fills its layout, every join, corner, border and confidence. */
export const anyPlan: fc.Arbitrary<Plan> = fc
  .record({
    motif: fc.constantFrom(...LONE_MOTIFS),
    rounds: fc.integer({ min: 1, max: 5 }),
    join: fc.constantFrom(...READY_JOINS),
    joinColour: colourKey,
    corners: fc.constantFrom('gathered' as const, 'crossed' as const),
    border: fc.array(fc.record({ stitch: fc.constantFrom('sc', 'hdc', 'dc'), colour: colourKey }), {
      maxLength: 4,
    }),
    colourings: fc.array(fc.array(colourKey, { minLength: 5, maxLength: 5 }), {
      minLength: 1,
      maxLength: 4,
    }),
    rows: fc.integer({ min: 1, max: 14 }),
    columns: fc.integer({ min: 1, max: 14 }),
    category: fc.constantFrom<WeightCategory>(0, 1, 2, 3, 4, 5, 6, 7),
    putUpM: fc.integer({ min: 40, max: 420 }),
    swatch: fc.option(swatch),
    evidence: fc.array(anyEvidence, { maxLength: 3 }),
    confidence: fc.constantFrom<Confidence>(...CONFIDENCES),
  })
  .map((parts) => {
    const motif = readyMotif(parts.motif.key, parts.rounds) as Motif;
    return buildPlan({
      yarn: {
        ...EXAMPLE_PLAN.yarn,
        weightCategory: parts.category,
        putUp: { massG: massG(100), lengthM: lengthM(parts.putUpM) },
      },
      swatch: parts.swatch,
      evidence: parts.evidence,
      motifs: [motif],
      colourways: parts.colourings.map((colours) => ({
        motifIndex: 0,
        roundColours: motif.rounds.map((_, i) => colours[i] as string),
      })),
      size: { by: 'grid', rows: parts.rows, columns: parts.columns },
      join: { key: parts.join.key, colour: parts.joinColour },
      corners: parts.corners,
      border: parts.border,
      confidence: parts.confidence,
    });
  });

/** The same, in every layout that the motif can lie in, octagons too, with either edge. */
export const anyLaidPlan: fc.Arbitrary<Plan> = fc
  .record({
    plan: anyPlan,
    motif: fc.constantFrom(...READY_MOTIFS),
    layout: fc.nat(10),
    edge: fc.constantFrom(...EDGES),
  })
  .map(({ plan, motif, layout, edge }) => {
    const layouts = layoutsFor(motif.sides);
    const worked = { ...motif, rounds: motif.rounds.slice(0, 4) };
    const laid = withLayout(withMotif(plan, worked), layouts[layout % layouts.length] ?? null);
    return frozen({ ...laid, edge });
  });
