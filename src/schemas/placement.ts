import * as z from './zod';
import { GRADIENT_WAYS, STRIPES, type Placement } from '../lib/colour/placement';
import { choice, counted, list, strict } from './fields';
import { PLAN_LIMITS } from './limits';

const colourway = counted('Number of a colourway', 0, PLAN_LIMITS.colourways - 1);
const seed = counted('Seed', 0, PLAN_LIMITS.seed);

const rule = z.discriminatedUnion(
  'by',
  [
    strict('Stripes', {
      by: choice('Stripes', STRIPES),
      width: counted('Width of a stripe', 1, PLAN_LIMITS.gridRows),
    }),
    strict('Repeat', {
      by: z.literal('repeat'),
      tile: list(
        'Rows of the repeat',
        list('Row of the repeat', colourway, 1, PLAN_LIMITS.tileSide),
        1,
        PLAN_LIMITS.tileSide,
      ),
    }),
    strict('Gradient', {
      by: z.literal('gradient'),
      towards: choice('Way of the gradient', GRADIENT_WAYS),
      order: list('Order of the colourways', colourway, 1, PLAN_LIMITS.colourways),
      seed,
    }),
    strict('Random placement', {
      by: z.literal('random'),
      seed,
      counts: list(
        'Motifs of each colourway',
        counted('Motifs of a colourway', 0, PLAN_LIMITS.gridRows * PLAN_LIMITS.gridColumns),
        1,
        PLAN_LIMITS.colourways,
      ).nullable(),
    }),
  ],
  { error: 'Placement must be stripes, a repeat, a gradient or at random' },
);

/** Which colourway lies where: a rule, and what is painted over it. */
export const placementSchema = strict('Placement', {
  rule,
  painted: list(
    'Painted motifs',
    z.tuple(
      [
        counted('Row', 0, PLAN_LIMITS.gridRows * 2),
        counted('Motif of the row', 0, PLAN_LIMITS.gridColumns * 2),
        counted('Motifs painted', 1, PLAN_LIMITS.gridColumns * 2),
        colourway,
      ],
      { error: 'A painted run must be row, first motif, number of motifs and colourway' },
    ),
    0,
    PLAN_LIMITS.paintedRuns,
  ),
  byHand: list('Colourways placed by hand', colourway, 0, PLAN_LIMITS.colourways).default([]),
}) satisfies z.ZodType<Placement>;
