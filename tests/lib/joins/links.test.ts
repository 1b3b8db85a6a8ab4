import { describe, expect, it } from 'vitest';
import { cornerLinks } from '../../../src/lib/joins/links';
import { gridCounts } from '../../../src/lib/layout/gridCounts';

const squares = gridCounts('square', 10, 8);

describe('cornerLinks', () => {
  it('gives its worked example', () => {
    // inside (10 - 1)(8 - 1) = 63; on the edge 2 × 9 + 2 × 7 = 32
    expect(cornerLinks('square', squares, 'crossed')).toBe(63 * 2 + 32);
    expect(cornerLinks('square', squares, 'gathered')).toBe(63 * 3 + 32);
  });

  it('gathers three corners of hexagons whatever is asked for', () => {
    const hexagons = gridCounts('offset-hexagons', 3, 4);
    const links = 2 * hexagons.insideJunctions + hexagons.edgeJunctions;
    expect(cornerLinks('offset-hexagons', hexagons, 'crossed')).toBe(links);
    expect(cornerLinks('offset-hexagons', hexagons, 'gathered')).toBe(links);
  });

  it('links nothing on a single motif and once at either end of one seam', () => {
    expect(cornerLinks('square', gridCounts('square', 1, 1), 'crossed')).toBe(0);
    expect(cornerLinks('square', gridCounts('square', 1, 2), 'gathered')).toBe(2);
  });
});
