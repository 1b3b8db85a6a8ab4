import { describe, expect, it } from 'vitest';
import { learnHand } from '../../../src/lib/hand/hand';
import { colourLedger } from '../../../src/lib/ledger/colourLedger';
import { CAUSES } from '../../../src/lib/ledger/ledger';
import type { PieceGroup } from '../../../src/lib/ledger/pieces';
import { uncertaintyOf } from '../../../src/lib/ledger/uncertainty';

const hand = learnHand(10, ['sc'], []);
const group: PieceGroup = {
  colour: 'c1',
  count: 10,
  lines: [{ part: 'join', label: 'sewn', made: { sc: 50 }, tails: 2, seamMm: 500 }],
};

describe('uncertaintyOf', () => {
  it('shares the variance among its causes, largest first', () => {
    const ledger = colourLedger(hand, 'c1', [group]);
    const shares = uncertaintyOf(hand, [ledger], 2.5);
    // 1000 loops of 52 mm: common (0.2 × 52)², stitch (0.05 × 52)²; 5 m sewn: (0.6 × 5)²
    const of = (cause: string) => shares.find((share) => share.cause === cause)?.varianceM2;
    expect(of('hand')).toBeCloseTo(10.4 ** 2, 6);
    expect(of('stitch')).toBeCloseTo(2.6 ** 2, 6);
    expect(of('sewing')).toBeCloseTo(9, 9);
    expect(of('motifs')).toBeCloseTo(10 * (0.03 * 6.7) ** 2, 10);
    expect(of('tails')).toBeCloseTo(20 * 0.045 ** 2, 12);
    expect(of('skeins')).toBe(2.5);
    expect(shares.map(({ cause }) => cause).toSorted()).toEqual([...CAUSES].toSorted());
    const variances = shares.map(({ varianceM2 }) => varianceM2);
    expect(variances).toEqual(variances.toSorted((left, right) => right - left));
    expect(shares.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
  });

  it('has no shares where nothing is uncertain', () => {
    expect(uncertaintyOf(hand, [], 0).every(({ share }) => share === 0)).toBe(true);
  });
});
