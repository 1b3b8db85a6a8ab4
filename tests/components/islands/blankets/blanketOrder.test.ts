import { describe, expect, it } from 'vitest';
import {
  copyTitle,
  matching,
  sorted,
} from '../../../../src/components/islands/blankets/blanketOrder';
import type { BlanketSummary } from '../../../../src/schemas/blanket';

const blanket = (title: string, more: Partial<BlanketSummary> = {}): BlanketSummary => ({
  id: title,
  version: 1,
  title,
  createdAt: '2026-11-01T00:00:00.000Z',
  updatedAt: '2026-11-01T00:00:00.000Z',
  deletedAt: null,
  yarnName: 'Lindry Aran',
  confidence: 0.95,
  currency: null,
  colours: [{ key: 'c1', name: 'Skerry', hex: '#2f5d73' }],
  figures: null,
  ...more,
});
const figures = (widthMm: number, heightMm: number, skeins: number) => ({
  rows: 1,
  columns: 1,
  widthMm,
  heightMm,
  skeins,
  meanM: 1,
  costMinor: null,
});
const titles = (blankets: BlanketSummary[]) => blankets.map(({ title }) => title);

describe('sorted', () => {
  const all = [
    blanket('bed', { figures: figures(2000, 2200, 30), updatedAt: '2026-11-02T00:00:00.000Z' }),
    blanket('Armchair', { figures: figures(1000, 900, 40), updatedAt: '2026-11-03T00:00:00.000Z' }),
    blanket('cot'),
  ];

  it.each([
    { by: 'changed', order: ['Armchair', 'bed', 'cot'] },
    { by: 'title', order: ['Armchair', 'bed', 'cot'] },
    { by: 'size', order: ['bed', 'Armchair', 'cot'] },
    { by: 'skeins', order: ['Armchair', 'bed', 'cot'] },
  ] as const)('puts them in order of $by', ({ by, order }) => {
    expect(titles(sorted(Object.freeze(all), by))).toEqual(order);
  });
});

describe('matching', () => {
  const all = [blanket('Bed'), blanket('Cot', { yarnName: 'Towpath DK', colours: [] })];

  it.each([
    { search: 'bED', found: ['Bed'] },
    { search: ' towpath ', found: ['Cot'] },
    { search: 'skerry', found: ['Bed'] },
    { search: '', found: ['Bed', 'Cot'] },
    { search: 'sloe', found: [] },
  ])('finds $found by “$search”', ({ search, found }) => {
    expect(titles(matching(all, search))).toEqual(found);
  });
});

describe('copyTitle', () => {
  it('says that it is a copy, and numbers copies of copies', () => {
    const first = copyTitle('Bed', [{ title: 'Bed' }]);
    expect(first).toBe('Bed, copy');
    expect(copyTitle('Bed', [{ title: 'Bed' }, { title: first }])).toBe('Bed, copy 2');
    expect(copyTitle(first, [{ title: first }])).toBe('Bed, copy 2');
  });

  it('keeps within the longest title', () => {
    expect(copyTitle('x'.repeat(120), []).length).toBeLessThanOrEqual(120);
  });
});
