import * as z from './zod';
import {
  choice,
  counted,
  hex,
  line,
  measured,
  moment,
  name,
  strict,
  uuid,
  version,
} from './fields';
import { KEPT_LIMITS, PLAN_LIMITS, POSSIBLE } from './limits';
import { checkPutUp } from './possible';
import { currencySchema } from './preferences';

/** Published yarn weight categories, lace to jumbo. */
export const WEIGHT_CATEGORIES = [0, 1, 2, 3, 4, 5, 6, 7] as const;

export const weightCategory = choice('Yarn weight category', WEIGHT_CATEGORIES);
export const skeinMassG = measured(
  'Skein mass',
  'g',
  PLAN_LIMITS.skeinMassG,
  POSSIBLE.leastSkeinMassG,
);
export const skeinLengthM = measured('Skein length', 'm', PLAN_LIMITS.skeinLengthM);
export const skeinPriceMinor = counted('Price of a skein', 0, PLAN_LIMITS.priceMinor);
export const yarnName = name('Yarn name');
export const colourName = name('Colour name');

/** An amount of money: whole minor units and their currency. */
export const moneySchema = strict('Price', {
  priceMinor: skeinPriceMinor,
  currency: currencySchema,
});
export type Money = z.output<typeof moneySchema>;

export const putUpSchema = strict('Put-up', {
  massG: skeinMassG,
  lengthM: skeinLengthM,
}).superRefine(checkPutUp);

const yarnFields = {
  name: yarnName,
  maker: line('Yarn maker', PLAN_LIMITS.nameLength),
  fibre: line('Fibre', KEPT_LIMITS.fibreLength),
  weightCategory,
  putUp: putUpSchema,
  price: moneySchema.nullable(),
};

export const yarnInput = strict('Yarn', yarnFields);
export type YarnInput = z.output<typeof yarnInput>;
export const yarnUpdate = strict('Yarn', { ...yarnFields, version });

const colourwayFields = { name: colourName, hex };
export const colourwayInput = strict('Colourway', { yarnId: uuid, ...colourwayFields });
export type ColourwayInput = z.output<typeof colourwayInput>;
export const colourwayUpdate = strict('Colourway', { ...colourwayFields, version });

export const colourwaySchema = z.strictObject({
  id: z.uuid(),
  yarnId: z.uuid(),
  version,
  ...colourwayFields,
});
export type PresentedColourway = z.output<typeof colourwaySchema>;

export const yarnSchema = z.strictObject({
  id: z.uuid(),
  version,
  updatedAt: moment,
  ...yarnFields,
  colourways: z.array(colourwaySchema),
});
export type PresentedYarn = z.output<typeof yarnSchema>;
