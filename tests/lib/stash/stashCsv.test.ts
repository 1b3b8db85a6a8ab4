import { describe, expect, it } from 'vitest';
import { stashCsv, type StashRecord } from '../../../src/lib/stash/stashCsv';

const lot: StashRecord = {
  yarn: { name: 'Lindry Aran', maker: 'Lindry Mill' },
  colourway: { name: 'Skerry', hex: '#2f5d73' },
  lotCode: '4471',
  location: 'Blue basket',
  pricePaid: { priceMinor: 640, currency: 'EUR' },
  wholeSkeins: 3,
  partSkeins: [{ massG: 62 }, { massG: 17.5 }],
  totalG: 379.5,
  totalM: 759,
};
const linesOf = (lots: StashRecord[]) => stashCsv(lots).trimEnd().split('\r\n');

describe('stashCsv', () => {
  it('has a line for each dye lot under one header', () => {
    expect(linesOf([lot, lot])).toHaveLength(3);
    expect(linesOf([lot])[0]).toBe(
      'yarn,maker,colour,hex,dye_lot,whole_skeins,part_skeins_g,total_g,total_m,place,price_paid_per_skein,currency',
    );
    expect(linesOf([lot])[1]).toBe(
      'Lindry Aran,Lindry Mill,Skerry,#2f5d73,4471,3,62 17.5,379.5,759,Blue basket,6.40,EUR',
    );
  });

  it('writes prices in the decimals of their currency', () => {
    // ISO 4217: the yen has no minor unit.
    const yen = { ...lot, pricePaid: { priceMinor: 980, currency: 'JPY' } };
    expect(linesOf([yen])[1]).toMatch(/,980,JPY$/);
  });

  it('leaves a price that is not known empty', () => {
    expect(linesOf([{ ...lot, pricePaid: null }])[1]).toMatch(/Blue basket,,$/);
  });

  it('lets no name run as a formula in a spreadsheet', () => {
    const sly = { ...lot, location: '=HYPERLINK("http://example.com")' };
    expect(linesOf([sly])[1]).toContain(`"'=HYPERLINK(""http://example.com"")"`);
  });
});
