// @vitest-environment jsdom
import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { ShoppingTable } from '../../../src/components/shopping/ShoppingTable';
import { estimate, EXAMPLE_PLAN, shoppingList, type Plan, type StashLot } from '../../../src/lib';

afterEach(cleanup);

const lot: StashLot = {
  colour: 'c1',
  lotCode: 'K 114',
  wholeSkeins: 2,
  partMassesG: [35],
  putUpMassG: 100,
  putUpLengthM: 200,
};

function shown(stash: StashLot[], plan: Plan = EXAMPLE_PLAN, hasStash = true) {
  const list = shoppingList({ plan, estimate: estimate(plan), stash });
  render(<ShoppingTable list={list} weight={4} units="metric" hasStash={hasStash} />);
  return list;
}
const row = (name: string) => screen.getByRole('row', { name: new RegExp(`^${name}`) });

describe('ShoppingTable', () => {
  it('says what is needed, at hand and to buy, and the sum', () => {
    const list = shown([lot]);
    expect(row('Skerry').textContent).toContain('470\u00a0m');
    expect(row('Skerry').textContent).toContain('235\u00a0g');
    expect(row('Skerry').textContent).toContain('mixes dye lots');
    expect(row('Barley').textContent).toContain('one dye lot');
    // The price stands under the skeins for a phone, and in a column of its own where there is room.
    expect(
      within(row('In all'))
        .getAllByRole('cell')
        .map((cell) => cell.textContent),
    ).toEqual([`${list.toBuySkeins}€89.60`, '€89.60']);
  });

  it('says where the stash is enough', () => {
    shown([{ ...lot, wholeSkeins: 9 }]);
    expect(row('Skerry').textContent).toContain('enough in hand');
  });

  it('leaves out colours that nothing is worked in, and columns that say nothing', () => {
    const plan = {
      ...EXAMPLE_PLAN,
      colourways: EXAMPLE_PLAN.colourways.slice(0, 1),
      yarn: { ...EXAMPLE_PLAN.yarn, price: null },
    };
    shown([], plan, false);
    expect(screen.queryByRole('row', { name: /Sloe/ })).toBeNull();
    expect(screen.getAllByRole('columnheader').map((head) => head.textContent)).toEqual([
      'Colour',
      'needed',
      'to buy',
    ]);
  });
});
