import { toCsv, type CsvCell } from '../csv/toCsv';
import { currencyDecimals } from '../units/display';
import type { LotAmounts } from './lotYarn';

/** A dye lot as the CSV needs it. */
export interface StashRecord extends LotAmounts {
  readonly yarn: { readonly name: string; readonly maker: string };
  readonly colourway: { readonly name: string; readonly hex: string };
  readonly lotCode: string;
  readonly location: string;
  readonly pricePaid: { readonly priceMinor: number; readonly currency: string } | null;
  readonly totalG: number;
  readonly totalM: number;
}

const HEADER = [
  'yarn',
  'maker',
  'colour',
  'hex',
  'dye_lot',
  'whole_skeins',
  'part_skeins_g',
  'total_g',
  'total_m',
  'place',
  'price_paid_per_skein',
  'currency',
];

/**
 * A stash as CSV, a line for each dye lot: grams and metres to a tenth, part skeins parted by
 * spaces ("62 17.5"), prices in their currency's own decimals.
 */
export const stashCsv = (lots: readonly StashRecord[]): string => toCsv(HEADER, lots.map(line));

function line(lot: StashRecord): CsvCell[] {
  const { yarn, colourway, pricePaid } = lot;
  return [
    yarn.name,
    yarn.maker,
    colourway.name,
    colourway.hex,
    lot.lotCode,
    lot.wholeSkeins,
    lot.partSkeins.map(({ massG }) => massG).join(' '),
    tenth(lot.totalG),
    tenth(lot.totalM),
    lot.location,
    pricePaid && priceText(pricePaid),
    pricePaid?.currency ?? null,
  ];
}

function priceText({ priceMinor, currency }: { priceMinor: number; currency: string }): string {
  const decimals = currencyDecimals(currency);
  return (priceMinor / 10 ** decimals).toFixed(decimals);
}

const tenth = (value: number): number => Math.round(value * 10) / 10;
