import { describe, expect, it } from 'vitest';
import { placeNames } from '../../../src/lib/joining/placeNames';
import type { Face } from '../../../src/lib/layout/face';
import { layoutFaces } from '../../../src/lib/layout/layoutFaces';
import { ARRANGEMENTS, HEXAGONS } from '../../support/arrangements';

describe('placeNames', () => {
  it('calls the sides and corners of a square as they lie', () => {
    const [square] = layoutFaces({ layout: 'square', edge: 'toothed' }, 1, 1);
    expect(placeNames('square', square as Face)).toEqual({
      sides: ['top', 'right', 'bottom', 'left'],
      corners: ['top left', 'top right', 'bottom right', 'bottom left'],
    });
  });

  it('calls those of hexagons, and the halves of a side that two motifs meet', () => {
    const [hexagon] = layoutFaces(HEXAGONS, 1, 1);
    expect(placeNames('offset-hexagons', hexagon as Face).sides).toEqual([
      'top right',
      'right',
      'bottom right',
      'bottom left',
      'left',
      'top left',
    ]);
    const [brick] = layoutFaces({ layout: 'brick', edge: 'toothed' }, 2, 2);
    const names = placeNames('brick', brick as Face);
    expect(names.sides).toContain('bottom, left half');
    expect(names.corners).toContain('middle of bottom');
  });

  it.each(ARRANGEMENTS)('never calls two alike in $layout, $edge', (arrangement) => {
    for (const face of layoutFaces(arrangement, 4, 4)) {
      const { sides, corners } = placeNames(arrangement.layout, face);
      expect(new Set(sides).size).toBe(sides.length);
      expect(new Set(corners).size).toBe(corners.length);
    }
  });
});
