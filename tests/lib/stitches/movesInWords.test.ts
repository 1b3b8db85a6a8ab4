import { describe, expect, it } from 'vitest';
import { movesInWords } from '../../../src/lib/stitches/movesInWords';

describe('movesInWords', () => {
  it('counts the moves and leaves out those of which there are none', () => {
    expect(movesInWords({ wraps: 1, draws: 1, throughs: 3 })).toBe('1 wrap, 1 draw, 3 throughs');
    expect(movesInWords({ wraps: 0, draws: 2, throughs: 1 })).toBe('2 draws, 1 through');
    expect(movesInWords({ wraps: 0, draws: 0, throughs: 1 })).toBe('1 through');
  });
});
