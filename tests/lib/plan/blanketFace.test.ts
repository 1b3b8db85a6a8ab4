import { describe, expect, it } from 'vitest';
import { blanketFace } from '../../../src/lib/plan/blanketFace';
import { EXAMPLE_PLAN } from '../../../src/lib/plan/examplePlan';

describe('blanketFace', () => {
  it('puts colours where the plan puts them', () => {
    const face = blanketFace(EXAMPLE_PLAN);
    // The example's own colours: Skerry joins, Barley begins and ends every motif.
    expect(face.join).toBe('#2f5d73');
    expect(face.border).toBe('#2f5d73');
    expect(face.colourways[0]).toEqual(['#e6d9c2', '#bf4630', '#9aa653', '#e6d9c2']);
    expect(face.sides).toBe(4);
  });

  it('has no border colour without a border', () => {
    expect(blanketFace({ ...EXAMPLE_PLAN, border: [] }).border).toBeNull();
  });
});
