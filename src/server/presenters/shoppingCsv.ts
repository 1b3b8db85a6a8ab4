import { gramsToOunces, metresToYards } from '../../lib/units/conversion';
import { currencyDecimals, type Units } from '../../lib/units/display';
import type { BlanketShopping } from '../../schemas/shoppingList';
import { toCsv } from './csv';

const toTenth = (value: number) => Math.round(value * 10) / 10;

/** A blanket's shopping list as CSV, in the person's units: a line for each colour. */
export function shoppingCsv(shopping: BlanketShopping, units: Units): string {
  const isMetric = units === 'metric';
  const length = (valueM: number) => toTenth(isMetric ? valueM : metresToYards(valueM));
  const mass = (valueG: number) => toTenth(isMetric ? valueG : gramsToOunces(valueG));
  const [lengthUnit, massUnit] = isMetric ? ['m', 'g'] : ['yd', 'oz'];
  const { currency } = shopping;
  const scale = currency === null ? 1 : 10 ** currencyDecimals(currency);
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
    shopping.lines.map((line) => [
      shopping.yarnName,
      line.name,
      length(line.neededM),
      mass(line.neededG),
      length(line.haveM),
      mass(line.haveG),
      line.toBuySkeins,
      line.costMinor === null ? null : line.costMinor / scale,
      line.costMinor === null ? null : currency,
      line.stash.colourway && `${line.stash.colourway.yarnName}, ${line.stash.colourway.name}`,
      line.stash.lots.map(({ lotCode }) => lotCode || 'not known').join('; '),
    ]),
  );
}
