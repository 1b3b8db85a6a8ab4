import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN, readyMotif, type Motif } from '../../../src/lib';
import { withFurtherMotif, withoutColourwayAndItsMotif } from '../../../src/lib/plan/furtherMotif';
import { mainMotif } from '../../../src/lib/plan/plan';

const solid = readyMotif('solid-square', 4) as Motif;
const mixed = withFurtherMotif(EXAMPLE_PLAN, solid);

describe('withFurtherMotif', () => {
  it('plans two motifs by turns, each with its own rounds', () => {
    const { colourwayMotifs, motifs } = estimate(mixed);
    expect(colourwayMotifs.reduce((sum, count) => sum + count)).toBe(80);
    expect(colourwayMotifs[3]).toBe(20);
    expect(motifs).toHaveLength(2);
    expect(mainMotif(mixed).key).toBe('group-square');
  });
});

describe('withoutColourwayAndItsMotif', () => {
  it('takes a motif out with the last colourway worked in it', () => {
    expect(withoutColourwayAndItsMotif(mixed, 3)).toEqual(EXAMPLE_PLAN);
    expect(withoutColourwayAndItsMotif(mixed, 0).motifs).toHaveLength(2);
  });

  it('keeps the last motif, and its last colourway', () => {
    const one = { ...EXAMPLE_PLAN, colourways: EXAMPLE_PLAN.colourways.slice(0, 1) };
    expect(withoutColourwayAndItsMotif(one, 0)).toBe(one);
  });
});
