import * as z from './zod';
import { MAKING_ORDERS, type MakingOrder } from '../lib/joining/makingOrder';
import { EDGES, LAYOUTS } from '../lib/layout/layouts';
import { choice, counted, strict } from './fields';

/** Rows or columns of an order that is asked for on its own. */
const MOST_ORDERED = 100;

/** Shorter ways to say the same. */
const SAID_SHORTER: Readonly<Record<string, MakingOrder>> = {
  rows: 'row-by-row',
  columns: 'in-columns',
};

export const joiningOrderInput = strict('Joining order', {
  layout: choice('Layout', LAYOUTS),
  edge: choice('Edge', EDGES).default('toothed'),
  rows: counted('Rows of motifs', 1, MOST_ORDERED),
  columns: counted('Motifs in a row', 1, MOST_ORDERED),
  corners: choice('Corners', ['gathered', 'crossed']),
  order: z
    .preprocess(
      (order) => (typeof order === 'string' ? (SAID_SHORTER[order] ?? order) : order),
      choice('Order', MAKING_ORDERS),
    )
    .default('row-by-row'),
});

const place = z.int().min(1);
const address = z.strictObject({ row: place, column: place, second: z.literal(true).optional() });

const side = z.strictObject({ side: z.string(), to: address });
const corner = z.strictObject({
  corner: z.string(),
  to: address.nullable(),
  reason: z.literal(['edge', 'gathered', 'crossed', 'open']),
});

export const joiningOrderSchema = z.strictObject({
  steps: z
    .array(
      address.extend({
        sides: z.array(side).readonly(),
        corners: z.array(corner).readonly(),
      }),
    )
    .readonly(),
});
