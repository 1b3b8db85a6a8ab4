import * as z from './zod';
import { MAKING_ORDERS } from '../lib/joining/makingOrder';
import {
  choice,
  counted,
  flag,
  list,
  measured,
  measuredOrZero,
  moment,
  name,
  strict,
  uuid,
} from './fields';
import { KEPT_LIMITS, PLAN_LIMITS } from './limits';
import { stitchCounts } from './stitchCounts';

const at = z.iso.datetime({ error: 'Time must be a moment such as 2026-11-30T18:00:00Z' });

/** A motif by its row and column from 0: "m2:3" of the main motif, "s0:1" of the second. */
const motifKey = z
  .string({ error: 'Motif must be text such as m2:3' })
  .regex(/^[ms]\d{1,4}:\d{1,4}$/, 'Motif must be written as m or s, row, colon, column: m2:3');

const tick = strict('Tick', { motif: motifKey, done: flag('Done'), at });

const weighing = strict('Weighing', {
  id: uuid,
  colour: name('Key of the colour', PLAN_LIMITS.keyLength),
  leftG: measuredOrZero('What is left', 'g', PLAN_LIMITS.pieceMassG),
  resolutionG: measured('Step of the scale', 'g', PLAN_LIMITS.skeinMassG),
  made: stitchCounts('Stitches worked', PLAN_LIMITS.pieceStitches),
  tails: counted('Tails', 0, PLAN_LIMITS.pieceTails),
  gone: flag('Taken back'),
  at,
});
export type MakingWeighingInput = z.input<typeof weighing>;

/** What a device has marked since it last reached the server; the same mark twice is one. */
export const makingInput = strict('Marks', {
  ticks: list('Ticks', tick, 0, KEPT_LIMITS.ticksAtOnce),
  weighings: list('Weighings', weighing, 0, KEPT_LIMITS.weighingsPerBlanket),
  order: strict('Order', { order: choice('Order', MAKING_ORDERS), at }).nullable(),
});
export type MakingInput = z.input<typeof makingInput>;
export type Marks = z.output<typeof makingInput>;

/** How far a blanket is made, as all devices together have it. */
export const makingSchema = z.strictObject({
  order: z.literal(MAKING_ORDERS),
  ticks: z.array(z.strictObject({ motif: z.string(), done: z.boolean(), at: moment })),
  weighings: z.array(
    z.strictObject({
      id: z.string(),
      colour: z.string(),
      leftG: z.number(),
      resolutionG: z.number(),
      made: z.record(z.string(), z.number()),
      tails: z.number().int(),
      gone: z.boolean(),
      at: moment,
    }),
  ),
});
export type Making = z.output<typeof makingSchema>;
