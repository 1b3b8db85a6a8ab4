import { describe, expect, it } from 'vitest';
import { loopsOf } from '../../src/lib/stitches/loops';
import { BASIC_STITCHES, knownStitch } from '../../src/lib/stitches/stitchTable';
import { swatchCounts } from '../../src/lib/stitches/swatchCounts';
import { referenceRows } from '../support/reference';

const rowYarn = new Map(
  referenceRows<'stitch' | 'yarn_in' | 'length_in'>('yarn-per-row.csv').map(
    ({ stitch, yarn_in, length_in }) => [stitch, Number(yarn_in) / Number(length_in)],
  ),
);

describe('stitches', () => {
  it.each(referenceRows<'stitch' | 'chains'>('turning-chains.csv'))(
    'turn $stitch with $chains chains as published', // dummies.com; Crochet Guild of America, READ
    ({ stitch, chains }) => expect(knownStitch(stitch).turningChains).toBe(Number(chains)),
  );

  it.each(referenceRows<'stitch' | 'over_stitches'>('foundation-chains.csv'))(
    'start $stitch on $over_stitches chains more than stitches', // Eckman 2020, 2ND
    ({ stitch, over_stitches }) => {
      for (const stitches of [1, 20, 143]) {
        expect(swatchCounts(stitch, stitches, 1).ch).toBe(stitches + Number(over_stitches));
      }
    },
  );

  it.each(referenceRows<'us' | 'uk'>('us-uk-terms.csv'))(
    'call US $us $uk in the UK', // Craft Yarn Council, READ
    ({ us, uk }) => expect(knownStitch(us).ukCode).toBe(uk),
  );

  it('shift US terms by one step to UK terms and back to themselves', () => {
    const uk = new Map(BASIC_STITCHES.map(({ code, ukCode }) => [code, ukCode]));
    const us = new Map(BASIC_STITCHES.map(({ code, ukCode }) => [ukCode, code]));
    for (const code of uk.keys()) expect(us.get(uk.get(code) as string)).toBe(code);
  });

  it.each(['ch', 'sc', 'hdc', 'dc'])(
    'lay loops of %s in the published proportion, within 4 %%',
    (code) => {
      // windchilde.com, READ: 5.10, 10.6, 15.7, 20.4 in of yarn per inch of row; one loop each ÷ 5.2
      const perLoop = (rowYarn.get(code) as number) / loopsOf(knownStitch(code));
      expect(Math.abs(perLoop / 5.2 - 1)).toBeLessThan(0.04);
    },
  );

  it('are as tall over a sc as measured rows are, within the 8 % that heights spread', () => {
    // joannascrochet.com, Nov 2025, 2ND: ranges of row heights, worsted, 5 mm hook
    const rows = referenceRows<'stitch' | 'least_mm' | 'most_mm'>('row-heights.csv');
    const [sc, ...others] = rows;
    for (const { stitch, least_mm, most_mm } of others) {
      const over = knownStitch(stitch).heightOverWidth / knownStitch('sc').heightOverWidth;
      expect(over).toBeGreaterThan((0.92 * Number(least_mm)) / Number(sc?.most_mm));
      expect(over).toBeLessThan((1.08 * Number(most_mm)) / Number(sc?.least_mm));
    }
  });

  it('are as tall over their width as weighed swatches measured, within 3 %', () => {
    // interweave.com, READ: sc 0.2875 / 0.3125 in, hdc 0.4625 / 0.3375 in
    const swatches = referenceRows<'stitch' | 'width_in' | 'height_in' | 'stitches' | 'rows'>(
      'weighed-swatches.csv',
    );
    for (const { stitch, width_in, height_in, stitches, rows } of swatches) {
      const over = Number(height_in) / Number(rows) / (Number(width_in) / Number(stitches));
      expect(Math.abs(knownStitch(stitch).heightOverWidth / over - 1)).toBeLessThan(0.03);
    }
  });
});
