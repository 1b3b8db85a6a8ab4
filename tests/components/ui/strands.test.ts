import { describe, expect, it } from 'vitest';
import {
  CARD,
  plyPitchPx,
  strandThickness,
  woundStrands,
} from '../../../src/components/ui/strands';
import type { WeightCategory } from '../../../src/lib/plan/plan';

const weights: WeightCategory[] = [0, 1, 2, 3, 4, 5, 6, 7];

describe('woundStrands', () => {
  it('winds seven strands whatever the weight', () => {
    for (const weight of weights) expect(woundStrands(weight).middle.match(/M/g)).toHaveLength(7);
  });

  it('grows thicker with every category and still fits the card', () => {
    const thicknesses = weights.map(strandThickness);
    expect(thicknesses).toEqual([...thicknesses].sort((a, b) => a - b));
    expect(new Set(thicknesses).size).toBe(8);
    expect(7 * strandThickness(7)).toBeLessThan(CARD.height - 4);
  });

  it('lets strands of every weight overhang both edges of the card alike, inside the drawing', () => {
    for (const weight of weights) {
      const [, left, right] =
        /^M([\d.]+) .*? ([\d.]+) [\d.]+M/.exec(woundStrands(weight).middle) ?? [];
      const round = strandThickness(weight) / 2;
      const overhang = CARD.edge - (Number(left) - round);
      expect(overhang).toBeCloseTo(3.2, 6);
      expect(overhang).toBeLessThan(CARD.edge);
      expect(Number(left) + Number(right)).toBeCloseTo(CARD.width, 6);
    }
  });
});

describe('plyPitchPx', () => {
  it('sets the lines of bulky yarn further apart', () => {
    const pitches = weights.map(plyPitchPx);
    expect(pitches).toEqual([...pitches].sort((a, b) => a - b));
  });
});
