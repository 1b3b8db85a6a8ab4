import { describe, expect, it } from 'vitest';
import { YARN_CATEGORIES } from '../../src/lib/yarnCategories';
import { referenceRows } from '../support/reference';

type Row = Record<'category' | 'name' | 'edition' | 'fewest' | 'most', string>;
const rows: Row[] = referenceRows('yarn-categories.csv');

describe('yarn weight categories', () => {
  it('are the published ones, by number and name', () => {
    const published = new Map(rows.map(({ category, name }) => [Number(category), name]));
    expect(new Map(YARN_CATEGORIES.map(({ category, name }) => [category, name]))).toEqual(
      published,
    );
  });

  it.each(rows)('accept $category $name as the $edition edition gauges it', (row) => {
    // Craft Yarn Council, READ; super bulky and jumbo changed between editions, jumbo has no least
    const found = YARN_CATEGORIES.find(({ category }) => category === Number(row.category));
    const [fewest, most] = found?.stitchesIn4In as [number, number];
    if (row.edition === 'every') {
      expect([fewest, most]).toEqual([Number(row.fewest), Number(row.most)]);
    } else {
      expect(fewest).toBeLessThanOrEqual(Number(row.fewest || row.most));
      expect(most).toBeGreaterThanOrEqual(Number(row.most));
    }
  });
});
