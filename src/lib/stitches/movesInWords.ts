import type { Moves } from './stitch';

/** Moves as the trade counts them: "1 wrap, 1 draw, 3 throughs"; those of which there are none are left out. */
export const movesInWords = ({ wraps, draws, throughs }: Moves): string =>
  [counted(wraps, 'wrap'), counted(draws, 'draw'), counted(throughs, 'through')]
    .filter((each) => each !== null)
    .join(', ');

const counted = (count: number, noun: string): string | null =>
  count === 0 ? null : `${count} ${noun}${count === 1 ? '' : 's'}`;
