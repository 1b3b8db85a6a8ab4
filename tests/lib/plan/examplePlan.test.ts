import { describe, expect, it } from 'vitest';
import { EXAMPLE_PLAN } from '../../../src/lib/plan/examplePlan';
import { CONFIDENCES } from '../../../src/lib/plan/plan';

describe('EXAMPLE_PLAN', () => {
  const keys = EXAMPLE_PLAN.colours.map(({ key }) => key);

  it('works every round, the join and the border in colours that it has', () => {
    const used = [
      ...EXAMPLE_PLAN.colourways.flatMap(({ roundColours }) => roundColours),
      EXAMPLE_PLAN.join.colour,
      ...EXAMPLE_PLAN.border.map(({ colour }) => colour),
    ];
    expect(new Set(used)).toEqual(new Set(keys));
    for (const { motifIndex, roundColours } of EXAMPLE_PLAN.colourways) {
      expect(roundColours).toHaveLength(EXAMPLE_PLAN.motifs[motifIndex]?.rounds.length as number);
    }
  });

  it('asks for one of the confidences there are', () => {
    expect(CONFIDENCES).toContain(EXAMPLE_PLAN.confidence);
  });
});
