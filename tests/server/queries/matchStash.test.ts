import { describe, expect, it } from 'vitest';
import { EXAMPLE_PLAN } from '../../../src/lib';
import { matchStash, type StashColourway } from '../../../src/server/queries/matchStash';

const lot = { id: 'l', lotCode: '1', totalM: 200, totalG: 100 } as StashColourway['lots'][number];
const colourway = (values: Partial<StashColourway> & { id: string }): StashColourway => ({
  name: 'Skerry',
  hex: '#000000',
  yarnName: 'Other Aran',
  weightCategory: 4,
  lots: [lot],
  ...values,
});
const matchOf = (colourways: StashColourway[], links: [string, string | null][] = []) => {
  const stash = matchStash(EXAMPLE_PLAN, new Map(links), colourways);
  return [...stash].map(([key, { match, colourway: found }]) => [key, match, found?.id ?? null]);
};

describe('matchStash', () => {
  it('finds a colourway by name, however it is capitalised', () => {
    expect(matchOf([colourway({ id: 'a', name: ' sKeRRy ' })])[0]).toEqual(['c1', 'by name', 'a']);
  });

  it('wants the same weight category and something in the stash', () => {
    const others = [colourway({ id: 'a', weightCategory: 3 }), colourway({ id: 'b', lots: [] })];
    expect(matchOf(others)[0]).toEqual(['c1', 'none', null]);
  });

  it("prefers the plan's own yarn", () => {
    const two = [colourway({ id: 'a' }), colourway({ id: 'b', yarnName: 'lindry aran' })];
    expect(matchOf(two)[0]).toEqual(['c1', 'by name', 'b']);
  });

  it('lets a link win over a name, for another colour too', () => {
    const one = [colourway({ id: 'a' })];
    expect(matchOf(one, [['c2', 'a']]).slice(0, 2)).toEqual([
      ['c1', 'none', null],
      ['c2', 'linked', 'a'],
    ]);
  });

  it('keeps a colour out where that was chosen', () => {
    expect(matchOf([colourway({ id: 'a' })], [['c1', null]])[0]).toEqual(['c1', 'kept out', null]);
  });
});
