import { toCsv } from '../csv/toCsv';
import { currencyDecimals } from '../units/display';
import type { ShoppingList } from './shoppingList';

/** A shopping list as CSV: metres and grams to one decimal, prices in the currency's own decimals. */
export function shoppingCsv({ currency, lines }: ShoppingList): string {
  const decimals = currency === null ? 0 : currencyDecimals(currency);
  return toCsv(
    [
      'colour',
      'needed_m',
      'needed_g',
      'have_m',
      'have_g',
      'to_buy_skeins',
      currency === null ? 'cost' : `cost_${currency.toLowerCase()}`,
    ],
    lines.map((line) => [
      line.name,
      tenth(line.neededM),
      tenth(line.neededG),
      tenth(line.haveM),
      tenth(line.haveG),
      line.toBuySkeins,
      line.costMinor === null ? null : (line.costMinor / 10 ** decimals).toFixed(decimals),
    ]),
  );
}

const tenth = (value: number): number => Math.round(value * 10) / 10;
