import * as z from './zod';
import { counted, line, list, measured, moment, strict, uuid, version } from './fields';
import { KEPT_LIMITS, PLAN_LIMITS } from './limits';
import { moneySchema, putUpSchema, weightCategory } from './yarn';

const partSkein = strict('Part skein', {
  massG: measured('Mass of a part skein', 'g', PLAN_LIMITS.skeinMassG),
});

const lotFields = {
  /** As printed on the band; empty when not known. */
  lotCode: line('Dye lot', KEPT_LIMITS.lotCodeLength),
  location: line('Place', KEPT_LIMITS.locationLength),
  /** Paid for one skein. */
  pricePaid: moneySchema.nullable(),
  wholeSkeins: counted('Whole skeins', 0, KEPT_LIMITS.wholeSkeins),
  partSkeins: list('Part skeins', partSkein, 0, KEPT_LIMITS.partSkeinsPerLot),
};

/** What a person has of one colourway in one dye lot. */
export const lotInput = strict('Dye lot', { colourwayId: uuid, ...lotFields });
export type LotInput = z.output<typeof lotInput>;
export const lotUpdate = strict('Dye lot', { ...lotFields, version });
export type LotUpdate = z.output<typeof lotUpdate>;

export const lotSchema = z.strictObject({
  id: z.uuid(),
  version,
  updatedAt: moment,
  ...lotFields,
  colourway: z.strictObject({ id: z.uuid(), name: z.string(), hex: z.string() }),
  yarn: z.strictObject({
    id: z.uuid(),
    name: z.string(),
    maker: z.string(),
    weightCategory,
    putUp: putUpSchema,
  }),
  /** Whole and part skeins together. */
  totalG: z.number(),
  totalM: z.number(),
});
export type PresentedLot = z.output<typeof lotSchema>;
