import { describe, expect, it } from 'vitest';
import { shoppingCsv, type ShoppingRecord } from '../../../src/lib/shopping/shoppingCsv';
import type { ShoppingLine } from '../../../src/lib/shopping/shoppingList';

const line = (change: Partial<ShoppingLine> = {}): ShoppingLine => ({
  colour: 'c1',
  name: 'Skerry',
  hex: '#2f5d73',
  neededM: 894.26,
  neededG: 447.13,
  haveM: 470,
  haveG: 235,
  toBuySkeins: 3,
  mixesLots: true,
  costMinor: 1920,
  ...change,
});

const list = (lines: ShoppingRecord['lines'], currency: string | null): ShoppingRecord => ({
  yarnName: 'Lindry Aran',
  currency,
  lines,
});

describe('shoppingCsv', () => {
  it('says metres and grams to a tenth, and money in the decimals of its currency', () => {
    expect(shoppingCsv(list([line()], 'EUR'), 'metric')).toBe(
      'Yarn,Colour,Needed (m),Needed (g),Have (m),Have (g),To buy (skeins),Price,Currency,From the stash,Dye lots\r\n' +
        'Lindry Aran,Skerry,894.3,447.1,470,235,3,19.20,EUR,,\r\n',
    );
    // ISO 4217: the yen has no minor unit.
    expect(shoppingCsv(list([line()], 'JPY'), 'metric')).toContain(',3,1920,JPY,,');
  });

  it('says yards and ounces to whoever measures in them', () => {
    // 894.26 m / 0.9144 = 977.97 yd; 447.13 g / 28.349523125 = 15.77 oz.
    expect(shoppingCsv(list([line()], 'EUR'), 'imperial')).toContain(
      'Needed (yd),Needed (oz),Have (yd),Have (oz)',
    );
    expect(shoppingCsv(list([line()], 'EUR'), 'imperial')).toContain('Skerry,978,15.8,');
  });

  it('leaves the cost out where no price is known', () => {
    expect(shoppingCsv(list([line({ costMinor: null })], null), 'metric')).toContain(
      ',470,235,3,,,,\r\n',
    );
  });

  it('names what the stash gives, and its lots', () => {
    const stash = {
      colourway: { name: 'Skerry', yarnName: 'Lindry Aran' },
      lots: [{ lotCode: 'A7' }, { lotCode: '' }],
    };
    expect(shoppingCsv(list([{ ...line(), stash }], 'EUR'), 'metric')).toContain(
      ',"Lindry Aran, Skerry",A7; not known\r\n',
    );
  });

  it('does not let a colour run in a spreadsheet', () => {
    expect(shoppingCsv(list([line({ name: '=1+1' })], 'EUR'), 'metric')).toContain(',"\'=1+1",');
  });
});
