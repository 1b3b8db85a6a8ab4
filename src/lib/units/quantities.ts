import { DomainError } from '../errors';

declare const unit: unique symbol;
/** A number that carries its unit in its type, so that metres cannot be passed for millimetres. */
type Quantity<Unit extends string> = number & { readonly [unit]: Unit };

/** Length of yarn, in metres. */
export type LengthM = Quantity<'m'>;
/** A dimension of fabric, in millimetres. */
export type WidthMm = Quantity<'mm'>;
/** Mass, in grams. */
export type MassG = Quantity<'g'>;
/** Duration, in seconds. */
export type DurationS = Quantity<'s'>;
/** Money, in whole minor units (cents, pence) of some ISO 4217 currency. */
export type PriceMinor = Quantity<'minor unit'>;

/** Largest value of each quantity that the program accepts; schemas refuse more with the same numbers. */
export const QUANTITY_LIMITS = {
  lengthM: 1e7,
  widthMm: 1e6,
  massG: 1e7,
  durationS: 1e10,
  priceMinor: 1e12,
} as const;

function quantity<Q extends number>(name: keyof typeof QUANTITY_LIMITS, value: number): Q {
  if (!(value >= 0 && value <= QUANTITY_LIMITS[name])) {
    throw new DomainError(
      'quantity-out-of-range',
      `${name} requires a number from 0 to ${QUANTITY_LIMITS[name]}, got ${value}`,
    );
  }
  return value as Q;
}

/** `lengthM(200)` is 200 m of yarn. Throws DomainError unless 0 to 10,000 km. */
export const lengthM = (value: number): LengthM => quantity('lengthM', value);
/** `widthMm(142)` is 14.2 cm of fabric. Throws DomainError unless 0 to 1 km. */
export const widthMm = (value: number): WidthMm => quantity('widthMm', value);
/** `massG(100)` is 100 g. Throws DomainError unless 0 to 10 t. */
export const massG = (value: number): MassG => quantity('massG', value);
/** `durationS(90)` is a minute and a half. Throws DomainError unless 0 to some 300 years. */
export const durationS = (value: number): DurationS => quantity('durationS', value);
/** `priceMinor(650)` is 6.50 in a currency of two decimals. Throws DomainError unless a whole number. */
export function priceMinor(value: number): PriceMinor {
  if (!Number.isInteger(value)) {
    throw new DomainError('price-not-whole', `priceMinor requires whole minor units, got ${value}`);
  }
  return quantity('priceMinor', value);
}
