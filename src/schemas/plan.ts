import * as z from './zod';
import { EDGES, LAYOUTS } from '../lib/layout/layouts';
import { CONFIDENCES } from '../lib/plan/plan';
import { lengthM, massG, priceMinor, widthMm } from '../lib/units/quantities';
import { borderRoundSchema } from './border';
import { choice, counted, hex, list, measured, name, strict } from './fields';
import { PLAN_LIMITS, POSSIBLE } from './limits';

import { checkPlan } from './planChecks';
import { placementSchema } from './placement';
import { checkPutUp, checkStitchSize } from './possible';
import { currencySchema } from './preferences';
import { knownStitch, stitchCounts } from './stitchCounts';
import {
  lengthErrorM,
  pieceLengthM,
  pieceMassG,
  scaleResolutionG,
  swatchHeightMm,
  swatchRows,
  swatchStitches,
  swatchWidthMm,
} from './swatch';
import { motifSchema } from './workedMotif';
import {
  colourName,
  skeinLengthM,
  skeinMassG,
  skeinPriceMinor,
  weightCategory,
  yarnName,
} from './yarn';

export { PLAN_LIMITS };

/** Edition of this schema, stored beside every plan; a migration converts older ones. */
export const PLAN_SCHEMA_VERSION = 1;

const colourKey = name('Key of a colour', PLAN_LIMITS.keyLength);
const motifIndex = counted('Number of a motif', 0, PLAN_LIMITS.motifs - 1);

const yarn = strict('Yarn', {
  name: yarnName,
  weightCategory,
  putUp: strict('Put-up', {
    massG: skeinMassG.transform(massG),
    lengthM: skeinLengthM.transform(lengthM),
  }).superRefine(checkPutUp),
  price: strict('Price', {
    priceMinor: skeinPriceMinor.transform(priceMinor),
    currency: currencySchema,
  }).nullable(),
});

/** A flat piece worked to find the gauge. */
export const planSwatchSchema = strict('Swatch', {
  stitch: knownStitch,
  stitches: swatchStitches,
  rows: swatchRows,
  widthMm: swatchWidthMm.transform(widthMm),
  heightMm: swatchHeightMm.transform(widthMm),
}).superRefine((flat, issues) => checkStitchSize(flat, flat, issues));

const reading = z.discriminatedUnion(
  'by',
  [
    strict('Reading', {
      by: z.literal('weighing'),
      massG: pieceMassG.transform(massG),
      resolutionG: scaleResolutionG.transform(massG),
    }),
    strict('Reading', {
      by: z.literal('unravelling'),
      lengthM: pieceLengthM.transform(lengthM),
      errorM: lengthErrorM.transform(lengthM),
    }),
  ],
  { error: 'Reading must be by weighing or unravelling' },
);

const evidence = z.discriminatedUnion(
  'piece',
  [
    strict('Weighed piece', { piece: z.literal('swatch'), reading }),
    strict('Weighed piece', {
      piece: z.literal('motifs'),
      reading,
      count: counted('Motifs weighed', 1, PLAN_LIMITS.piecesWeighed),
      motifIndex,
    }),
    strict('Weighed piece', {
      piece: z.literal('counted'),
      reading,
      label: name('Name of the piece'),
      made: stitchCounts('Stitches of the piece', PLAN_LIMITS.pieceStitches),
      tails: counted('Tails of the piece', 0, PLAN_LIMITS.pieceTails),
    }),
  ],
  { error: 'Weighed piece must be the swatch, motifs or a counted piece' },
);

const size = z.discriminatedUnion(
  'by',
  [
    strict('Size', {
      by: z.literal('grid'),
      rows: counted('Rows of motifs', 1, PLAN_LIMITS.gridRows),
      columns: counted('Motifs in a row', 1, PLAN_LIMITS.gridColumns),
    }),
    strict('Size', {
      by: z.literal('target'),
      widthMm: measured('Width wanted', 'mm', PLAN_LIMITS.targetSizeMm).transform(widthMm),
      heightMm: measured('Height wanted', 'mm', PLAN_LIMITS.targetSizeMm).transform(widthMm),
      rule: choice('Rule for the size', ['nearest', 'at-least']),
    }),
  ],
  { error: 'Size must be a grid or a target' },
);

/** Everything an estimate depends on: plain JSON in, the library's `Plan` out. */
export const planSchema = strict('Plan', {
  yarn,
  colours: list(
    'Colours',
    strict('Colour', { key: colourKey, name: colourName, hex }),
    1,
    PLAN_LIMITS.colours,
  ),
  swatch: planSwatchSchema.nullable(),
  evidence: list('Weighed pieces', evidence, 0, PLAN_LIMITS.evidence),
  motifs: list('Motifs', motifSchema, 1, PLAN_LIMITS.motifs),
  colourways: list(
    'Colourways',
    strict('Colourway', {
      motifIndex,
      roundColours: list('Colours of the rounds', colourKey, 1, PLAN_LIMITS.roundsPerMotif),
    }),
    1,
    PLAN_LIMITS.colourways,
  ),
  motifSideMm: measured('Side of a motif', 'mm', PLAN_LIMITS.motifSideMm, POSSIBLE.leastMotifSideMm)
    .transform(widthMm)
    .nullable(),
  size,
  layout: choice('Layout', LAYOUTS).nullable().default(null),
  edge: choice('Edge', EDGES).default('toothed'),
  secondMotif: motifIndex.nullable().default(null),
  placement: placementSchema.default({
    rule: { by: 'diagonals', width: 1 },
    painted: [],
    byHand: [],
  }),
  join: strict('Join', { key: name('Key of the join', PLAN_LIMITS.keyLength), colour: colourKey }),
  corners: choice('Corners', ['gathered', 'crossed']),
  border: list('Border rounds', borderRoundSchema, 0, PLAN_LIMITS.borderRounds),
  confidence: choice('Confidence', CONFIDENCES),
  secondsPerMove: measured('Time of a move', 's', PLAN_LIMITS.secondsPerMove).nullable(),
}).superRefine(checkPlan);

/** A plan as JSON, before it is checked. */
export type PlanInput = z.input<typeof planSchema>;
