import type { PresentedYarn, YarnInput } from '../../../schemas/yarn';
import type { ColourContent, LotContent, StashEntry } from '../../../schemas/stashEntry';

/** An empty field of a form, which the schema says is missing. */
const NOT_YET = null as unknown as number;

export const BLANK_YARN: YarnInput = {
  name: '',
  maker: '',
  fibre: '',
  weightCategory: 4,
  putUp: { massG: NOT_YET, lengthM: NOT_YET },
  price: null,
};
export const BLANK_COLOUR: ColourContent = { name: '', hex: '#7a8f8c' };
const BLANK_LOT: LotContent = {
  lotCode: '',
  location: '',
  pricePaid: null,
  wholeSkeins: 1,
  partSkeins: [],
};

/** A new lot, of the first yarn there is or else of a new one. */
export function blankEntry(yarns: readonly PresentedYarn[], yarnId?: string): StashEntry {
  const yarn = yarns.find(({ id }) => id === yarnId) ?? yarns[0];
  const [colour] = yarn?.colourways ?? [];
  return {
    yarnId: yarn?.id ?? '',
    yarn: yarn ? null : BLANK_YARN,
    colourwayId: colour?.id ?? '',
    colour: colour ? null : BLANK_COLOUR,
    lot: BLANK_LOT,
  };
}

/** A lot to look at and change before it is kept. */
export const EXAMPLE_ENTRY: StashEntry = {
  yarnId: '',
  yarn: {
    name: 'Lindry Aran',
    maker: 'Lindry Mill',
    fibre: '100 % wool',
    weightCategory: 4,
    putUp: { massG: 100, lengthM: 200 },
    price: null,
  },
  colourwayId: '',
  colour: { name: 'Skerry', hex: '#2f5d73' },
  lot: {
    lotCode: '4471',
    location: 'Blue basket',
    pricePaid: null,
    wholeSkeins: 3,
    partSkeins: [{ massG: 62 }],
  },
};
