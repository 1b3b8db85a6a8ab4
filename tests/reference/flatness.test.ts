import { describe, expect, it } from 'vitest';
import { gaugeOf, motifGeometry, readyMotif, type Motif } from '../../src/lib';
import { FLAT_FULLNESS } from '../../src/lib/motifs/geometry';
import { knownStitch } from '../../src/lib/stitches/stitchTable';
import { referenceRows } from '../support/reference';

const rules = referenceRows<'stitch' | 'least' | 'most'>('flat-circle.csv');

/** A circle of one stitch that grows by so many stitches in every round. */
const circleOf = (stitch: string, increase: number): Motif => ({
  key: 'test',
  version: null,
  name: 'Test',
  sides: 0,
  ring: { chains: 0, made: {} },
  rounds: Array.from({ length: 12 }, (_, i) => ({
    label: `Rnd ${i + 1}`,
    made: {},
    travel: {},
    tally: { [stitch]: increase * (i + 1) },
    spaces: {},
    cornerSpace: null,
    perSide: increase * (i + 1),
    height: stitch,
  })),
});

describe('the law of the flat circle', () => {
  it.each(rules)('asks for $least to $most more $stitch in a round, within 8 %', (rule) => {
    // CALC: increases per round = 2π × height / width; rules READ in several makers' lessons
    const law = 2 * Math.PI * knownStitch(rule.stitch).heightOverWidth;
    expect(law).toBeGreaterThan(0.92 * Number(rule.least));
    expect(law).toBeLessThan(1.08 * Number(rule.most));
  });

  it.each(rules)('lets a circle that follows a published rule for $stitch lie flat', (rule) => {
    const flat = [];
    for (let increase = Number(rule.least); increase <= Number(rule.most); increase += 1) {
      const { trouble } = motifGeometry(circleOf(rule.stitch, increase), gaugeOf(null, 4), null);
      if (!trouble) flat.push(increase);
    }
    expect(flat.length).toBeGreaterThan(0);
  });

  it('has the ready circle lie flat in every round', () => {
    const { rounds } = motifGeometry(readyMotif('circle') as Motif, gaugeOf(null, 4), null);
    // 12 dc where 2π × 1.85 = 11.6 are asked for: 12 k / (2π (0.25 + 1.85 k)), towards 1.032
    rounds.forEach(({ fullness }, i) => {
      const k = i + 1;
      expect(fullness).toBeCloseTo((12 * k) / (2 * Math.PI * (0.25 + 1.85 * k)), 12);
      if (k > 1) expect(fullness).toBeGreaterThan(FLAT_FULLNESS[0]);
      expect(fullness).toBeLessThan(FLAT_FULLNESS[1]);
    });
  });

  it('sees a circle cup with half the stitches and ruffle with twice as many', () => {
    const kind = (increase: number) =>
      motifGeometry(circleOf('dc', increase), gaugeOf(null, 4), null).trouble?.kind;
    expect(kind(6)).toBe('cups');
    expect(kind(24)).toBe('ruffles');
  });
});
