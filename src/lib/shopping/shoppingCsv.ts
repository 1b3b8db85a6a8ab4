import { toCsv } from '../csv/toCsv';
import { gramsToOunces, metresToYards } from '../units/conversion';
import { currencyDecimals, type Units } from '../units/display';
import type { ShoppingLine } from './shoppingList';

/** What the stash gives to a line, where there is a stash. */
interface FromStash {
  readonly colourway: { readonly name: string; readonly yarnName: string } | null;
  readonly lots: readonly { readonly lotCode: string }[];
}

/** A shopping list of one yarn, with or without a stash. */
export interface ShoppingRecord {
  readonly yarnName: string;
  readonly currency: string | null;
  readonly lines: readonly (Omit<ShoppingLine, 'mixesLots'> & { readonly stash?: FromStash })[];
}

/**
 * A shopping list as CSV, a line for each colour: lengths and masses to a tenth in the person's
 * units, money in the decimals of its currency.
 */
export function shoppingCsv({ yarnName, currency, lines }: ShoppingRecord, units: Units): string {
  const isMetric = units === 'metric';
  const length = (valueM: number): number => tenth(isMetric ? valueM : metresToYards(valueM));
  const mass = (valueG: number): number => tenth(isMetric ? valueG : gramsToOunces(valueG));
  const [lengthUnit, massUnit] = isMetric ? ['m', 'g'] : ['yd', 'oz'];
  const decimals = currency === null ? 0 : currencyDecimals(currency);
  return toCsv(
    [
      'Yarn',
      'Colour',
      `Needed (${lengthUnit})`,
      `Needed (${massUnit})`,
      `Have (${lengthUnit})`,
      `Have (${massUnit})`,
      'To buy (skeins)',
      'Price',
      'Currency',
      'From the stash',
      'Dye lots',
    ],
    lines.map((line) => [
      yarnName,
      line.name,
      length(line.neededM),
      mass(line.neededG),
      length(line.haveM),
      mass(line.haveG),
      line.toBuySkeins,
      line.costMinor === null ? null : (line.costMinor / 10 ** decimals).toFixed(decimals),
      line.costMinor === null ? null : currency,
      line.stash?.colourway
        ? `${line.stash.colourway.yarnName}, ${line.stash.colourway.name}`
        : null,
      line.stash ? line.stash.lots.map(({ lotCode }) => lotCode || 'not known').join('; ') : null,
    ]),
  );
}

const tenth = (value: number): number => Math.round(value * 10) / 10;
