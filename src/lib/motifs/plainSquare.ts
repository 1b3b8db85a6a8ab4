import type { Motif, MotifRound } from './motif';

/** Stitches of the first round, in a magic ring; each further round has as many more. */
const GROWTH = 8;

/**
 * A square of single crochet, three in each corner: what fills a gap unless a person chooses better.
 * Its side has 2 × rounds - 1 stitches between corner centres.
 *
 * Example: `plainSquare(3)` makes 8, 16 and 24 sc, and has 5 on a side.
 */
export const plainSquare = (rounds: number): Motif => ({
  key: 'plain-square',
  version: null,
  name: 'Plain square',
  sides: 4,
  ring: { chains: 0, made: {} },
  rounds: Array.from({ length: rounds }, (_, i) => plainRound(i + 1)),
});

const plainRound = (number: number): MotifRound => ({
  label: `Rnd ${number}`,
  made: { ch: 1, sc: GROWTH * number, 'sl st': 1 },
  travel: {},
  tally: { sc: GROWTH * number },
  spaces: {},
  cornerSpace: null,
  perSide: 2 * number - 1,
  height: 'sc',
});
