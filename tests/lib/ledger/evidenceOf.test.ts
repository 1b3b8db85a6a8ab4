import { describe, expect, it } from 'vitest';
import { evidenceOf, motifUse, swatchUse, useOfPiece } from '../../../src/lib/ledger/evidenceOf';
import { buildPlan, unravelled, weighed } from '../../support/plans';

describe('swatchUse', () => {
  it('counts the swatch and what stays of its two tails', () => {
    // 20 × 18 sc: 720 loops and 38 chains; 2 × 0.15 m, three quarters kept
    const use = swatchUse(buildPlan());
    expect([...(use?.loops ?? [])]).toEqual([
      ['ch', 38],
      ['sc', 720],
    ]);
    expect(use?.cutM).toBeCloseTo(0.225, 12);
    expect(swatchUse(buildPlan({ swatch: null }))).toBeNull();
  });
});

describe('motifUse', () => {
  it('counts motifs as the first colourway works them', () => {
    // per motif ch 4 + 11 + 15 + 19 + 23, dc 11 + 23 + 35 + 47 of 4 loops, sl st 1 + 4; 8 tails
    const use = motifUse(buildPlan(), 0, 4);
    expect(Object.fromEntries(use?.loops ?? [])).toEqual({
      ch: 4 * 72,
      dc: 4 * 4 * 116,
      'sl st': 4 * 5,
    });
    expect(use?.cutM).toBeCloseTo(4 * 8 * 0.15 * 0.75, 12);
  });

  it('knows no motif that no colourway uses', () => {
    expect(motifUse(buildPlan(), 1, 4)).toBeNull();
  });
});

describe('useOfPiece', () => {
  it('takes a counted piece as it was counted', () => {
    const use = useOfPiece(buildPlan(), {
      piece: 'counted',
      label: 'border sample',
      made: { sc: 100 },
      tails: 2,
      reading: unravelled(9, 0.1),
    });
    expect(use?.seamM).toBe(0);
    expect(use?.cutM).toBeCloseTo(0.225, 12);
    expect(use?.loops.get('sc')).toBe(200);
  });
});

describe('evidenceOf', () => {
  it('turns readings into metres with their variance', () => {
    // 40 g at 2 m/g. Four motifs of 72 ch, 116 dc and 5 sl st, 541 loops, at 5.2 × 7.5 = 39 mm a loop,
    // and 8 tails each of which 112.5 mm stay: 87.996 m; 2/12 × 4 + (0.02 × 87.996)² + (0.03 × 87.996)²/4
    const [evidence] = evidenceOf(buildPlan(), 7.5);
    expect(evidence?.lengthM).toBe(80);
    expect(evidence?.varianceM2).toBeCloseTo(
      2 / 3 + (0.02 * 87.996) ** 2 + (0.03 * 87.996) ** 2 / 4,
      12,
    );
  });

  it('leaves out what the plan has no piece for', () => {
    const evidence = [
      { piece: 'swatch', reading: weighed(15, 1) },
      { piece: 'motifs', count: 2, motifIndex: 7, reading: weighed(20, 1) },
    ] as const;
    expect(evidenceOf(buildPlan({ swatch: null, evidence }), 7.5)).toEqual([]);
    expect(evidenceOf(buildPlan({ evidence: [] }), 7.5)).toEqual([]);
  });
});
