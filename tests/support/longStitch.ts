import type { OwnStitch } from '../../src/lib/stitches/ownStitch';

/** A stitch of one's own to test with: a dc with one through more, 5 loops. */
export const LONG_STITCH: OwnStitch = {
  abbreviation: 'lst',
  name: 'long stitch',
  moves: { wraps: 1, draws: 1, throughs: 3 },
  heightOverWidth: null,
  takes: 1,
  symbol: null,
};
