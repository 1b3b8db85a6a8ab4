import { describe, expect, it } from 'vitest';
import { planeMap } from '../../../src/lib/layout/planeMap';
import { frozen } from '../../support/plans';

describe('planeMap', () => {
  it('gives its worked example', () => {
    const map = planeMap(
      frozen([
        ['a', 'b', 'e', 'd'],
        ['b', 'c', 'f', 'e'],
      ]),
    );
    expect(map.sides).toHaveLength(7);
    expect(map.corners).toHaveLength(6);
    expect(map.sides.filter(({ motifs }) => motifs.length === 2)).toEqual([
      { ends: ['b', 'e'], motifs: [0, 1] },
    ]);
    expect(map.corners.find(({ name }) => name === 'b')).toEqual({
      name: 'b',
      motifs: [0, 1],
      outer: true,
    });
  });

  it('knows a corner with motifs all round it from one on the edge', () => {
    // three hexagon-like outlines round the corner "m"
    const map = planeMap([
      ['m', 'a', 'b', 'c'],
      ['m', 'c', 'd', 'e'],
      ['m', 'e', 'f', 'a'],
    ]);
    expect(map.corners.filter(({ outer }) => !outer).map(({ name }) => name)).toEqual(['m']);
  });

  it('is empty for no motifs', () => {
    expect(planeMap([])).toEqual({ outlines: [], sides: [], corners: [] });
  });
});
