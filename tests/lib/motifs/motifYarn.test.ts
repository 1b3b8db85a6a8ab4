import { describe, expect, it } from 'vitest';
import { gaugeOf, motifYarnM, readyMotif, type Motif } from '../../../src/lib';

describe('motifYarnM', () => {
  it('is loops times 5.2 stitch widths before anything is weighed', () => {
    // By hand: the ring makes 4 ch and 1 sl st, 5 loops; round 1 makes 11 ch, 11 dc of 4 loops and
    // 1 sl st, 56 loops; 61 in all. 5.2 widths to a loop: published rows, worsted, 5 mm hook.
    const gauge = gaugeOf(null, 4);
    const metres = motifYarnM(readyMotif('group-square', 1) as Motif, gauge);
    expect(metres).toBeCloseTo((61 * 5.2 * gauge.stitchWidthMm) / 1000, 10);
  });

  it('grows with the rounds', () => {
    const metres = [1, 2, 3, 4].map((rounds) =>
      motifYarnM(readyMotif('hexagon', rounds) as Motif, gaugeOf(null, 4)),
    );
    expect([...metres].sort((a, b) => a - b)).toEqual(metres);
  });
});
