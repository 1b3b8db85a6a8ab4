import * as z from './zod';
import { EDGES, LAYOUTS } from '../lib/layout/layouts';
import { CAUSES, PARTS, type Estimate } from '../lib/ledger/ledger';

const figure = z.number();
const count = z.number().int();
const colour = z.string();

const fit = z.union([
  z.strictObject({ fits: z.literal(true), repeats: count }),
  z.strictObject({
    fits: z.literal(false),
    repeats: count,
    over: count,
    nearest: z.array(count),
    scRounds: count.nullable(),
  }),
]);

const motifGeometry = z.strictObject({
  acrossMm: figure,
  sideMm: figure,
  acrossSdMm: figure,
  rounds: z.array(
    z.strictObject({ label: z.string(), heightMm: figure, acrossMm: figure, fullness: figure }),
  ),
  trouble: z.strictObject({ label: z.string(), kind: z.literal(['cups', 'ruffles']) }).nullable(),
});

const colourEstimate = z.strictObject({
  colour,
  meanM: figure,
  sdM: figure,
  neededM: figure,
  neededG: figure,
  skeins: count,
  chances: z.array(z.strictObject({ skeins: count, probabilityShort: figure })),
  costMinor: count.nullable(),
});

const ledgerLine = z.strictObject({
  colour,
  part: z.literal(PARTS),
  label: z.string(),
  stitch: z.string().nullable(),
  count: figure,
  loopsEach: figure,
  loops: figure,
  eachMm: figure,
  lengthM: figure,
  varianceM2: figure,
  source: z.literal(['measured', 'carried over', 'published', 'not loops']),
});

const nextMeasurement = z.strictObject({
  kind: z.literal([
    'weigh the swatch',
    'unravel the swatch',
    'weigh motifs together',
    'read a finer scale',
  ]),
  motifs: count,
  resolutionG: figure,
  marginNow: figure,
  marginThen: figure,
  skeinsNow: count,
  skeinsThen: count,
  fewer: z.array(z.strictObject({ colour, now: count, then: count })),
});

/** The whole answer for a plan: the library's own value, to the last digit. */
export const estimateSchema = z.strictObject({
  layout: z.literal(LAYOUTS),
  edge: z.literal(EDGES),
  rows: count,
  columns: count,
  counts: z.strictObject({
    motifs: count,
    halves: count,
    quarters: count,
    fillers: count,
    halfFillers: count,
    quarterFillers: count,
    joinedSides: figure,
    outerSides: figure,
    insideJunctions: count,
    edgeJunctions: count,
    outerCorners: count,
    gatheredLinks: count,
    crossedLinks: count,
    seamLines: count,
  }),
  colourwayMotifs: z.array(count),
  size: z.strictObject({
    widthMm: figure,
    heightMm: figure,
    widthSdMm: figure,
    heightSdMm: figure,
    seamMm: figure,
    edgeMm: figure,
    borderMm: figure,
  }),
  stitchWidthMm: figure,
  motifs: z.array(motifGeometry),
  fit,
  sideStitches: figure,
  colours: z.array(colourEstimate),
  parts: z.array(z.strictObject({ part: z.literal(PARTS), colour, lengthM: figure })),
  ledger: z.array(ledgerLine),
  uncertainty: z.array(
    z.strictObject({ cause: z.literal(CAUSES), varianceM2: figure, share: figure }),
  ),
  next: z.array(nextMeasurement),
  notices: z.array(
    z.strictObject({
      code: z.string(),
      severity: z.literal(['question', 'note', 'caution']),
      message: z.string(),
    }),
  ),
  totals: z.strictObject({
    meanM: figure,
    sdM: figure,
    marginFraction: figure,
    skeins: count,
    stitches: figure,
    tails: figure,
    durationS: figure,
    joinDurationS: figure,
    massG: figure,
    costMinor: count.nullable(),
  }),
}) satisfies z.ZodType<Estimate>;
export type PresentedEstimate = z.input<typeof estimateSchema>;
