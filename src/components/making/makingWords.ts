import type { MakingOrder } from '../../lib/joining/makingOrder';
import type { Plan } from '../../lib/plan/plan';

export const ORDER_WORDS: Readonly<Record<MakingOrder, string>> = {
  'row-by-row': 'row by row',
  'in-columns': 'in columns',
  outwards: 'outwards from the middle',
  continuous: 'rows there and back, yarn uncut',
};

export const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

export const colourName = ({ colours }: Plan, key: string): string =>
  colours.find((colour) => colour.key === key)?.name ?? 'no colour';
