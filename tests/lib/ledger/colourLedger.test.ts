import { describe, expect, it } from 'vitest';
import { learnHand } from '../../../src/lib/hand/hand';
import { colourLedger, useOfGroup } from '../../../src/lib/ledger/colourLedger';
import type { PieceGroup } from '../../../src/lib/ledger/pieces';
import { frozen } from '../../support/plans';

const hand = learnHand(10, ['ch', 'sc'], []); // 52 mm a loop
const group = frozen<PieceGroup>({
  colour: 'c1',
  count: 10,
  lines: [
    { part: 'rounds', label: 'Rnd 1', made: { sc: 8, ch: 1 }, tails: 2, seamMm: 0 },
    { part: 'join', label: 'Whip stitch', made: {}, tails: 0, seamMm: 50 },
  ],
});

describe('useOfGroup', () => {
  it('adds up the lines of one piece', () => {
    const use = useOfGroup(group);
    expect(Object.fromEntries(use.loops)).toEqual({ sc: 16, ch: 1 });
    expect(use).toMatchObject({ seamM: 0.05, cutM: 0.3 });
  });
});

describe('colourLedger', () => {
  it('writes a line for each part, label and stitch, with what one of each takes', () => {
    const { lines } = colourLedger(hand, 'c1', [group]);
    expect(lines.map(({ part, label, stitch, count }) => [part, label, stitch, count])).toEqual([
      ['rounds', 'Rnd 1', 'sc', 80],
      ['rounds', 'Rnd 1', 'ch', 10],
      ['tails', 'rounds', null, 20],
      ['join', 'Whip stitch', null, 0.5],
    ]);
    const [sc, ch, tails, seam] = lines;
    expect(sc).toMatchObject({ loopsEach: 2, loops: 160, source: 'published' });
    expect(sc?.eachMm).toBeCloseTo(52, 10);
    expect(sc?.lengthM).toBeCloseTo(8.32, 10);
    expect(ch?.lengthM).toBeCloseTo(0.52, 10);
    expect(tails).toMatchObject({ eachMm: 150, lengthM: 3, source: 'not loops' });
    expect(seam?.lengthM).toBeCloseTo(1.5, 10); // 0.5 m sewn with three times its length
  });

  it('adds up to its mean and its variance', () => {
    const ledger = colourLedger(hand, 'c1', [group]);
    const sum = (of: 'lengthM' | 'varianceM2'): number =>
      ledger.lines.reduce((total, line) => total + line[of], 0);
    expect(sum('lengthM')).toBeCloseTo(ledger.meanM, 12);
    expect(sum('varianceM2')).toBeCloseTo(
      ledger.handVarianceM2 + ledger.pieceVarianceM2 + ledger.tailVarianceM2,
      12,
    );
  });

  it('has variances as worked by hand', () => {
    // hand: t0 = 52: 0.17 m of loops × 1000: (0.2 × 8.84)² + (0.05 × 8.32)² + (0.05 × 0.52)²,
    // sewing (0.6 × 0.5)²; pieces: 10 × (0.03 × (0.884 + 0.15))²; tails: 20 × (0.3 × 0.15)²
    const ledger = colourLedger(hand, 'c1', [group]);
    expect(ledger.handVarianceM2).toBeCloseTo(1.768 ** 2 + 0.416 ** 2 + 0.026 ** 2 + 0.09, 10);
    expect(ledger.pieceVarianceM2).toBeCloseTo(10 * (0.03 * 1.034) ** 2, 12);
    expect(ledger.tailVarianceM2).toBeCloseTo(20 * 0.045 ** 2, 12);
    expect(ledger.tails).toBe(20);
  });

  it('lets pieces average out but not the hand', () => {
    const few = colourLedger(hand, 'c1', [group]);
    const many = colourLedger(hand, 'c1', [{ ...group, count: 40 }]);
    expect(many.meanM).toBeCloseTo(4 * few.meanM, 10);
    expect(many.handVarianceM2).toBeCloseTo(16 * few.handVarianceM2, 9);
    expect(many.pieceVarianceM2).toBeCloseTo(4 * few.pieceVarianceM2, 12);
  });

  it('puts equal lines of several groups together', () => {
    const { lines } = colourLedger(hand, 'c1', [group, { ...group, count: 5 }]);
    expect(lines).toHaveLength(4);
    expect(lines[0]?.count).toBe(120);
  });

  it('is empty for a colour never used and for pieces that are not made', () => {
    const unused = colourLedger(hand, 'c2', [group]);
    expect(unused).toMatchObject({ lines: [], meanM: 0, tails: 0, handVarianceM2: 0 });
    expect(colourLedger(hand, 'c1', [{ ...group, count: 0 }]).lines).toEqual([]);
  });

  it('says where its yarn per loop comes from', () => {
    const use = { loops: new Map([['sc', 100]]), seamM: 0, cutM: 0 };
    const learnt = learnHand(10, ['ch', 'sc'], [{ use, lengthM: 5, varianceM2: 0.1 }]);
    const sources = colourLedger(learnt, 'c1', [group]).lines.map(({ source }) => source);
    expect(sources).toEqual(['measured', 'carried over', 'not loops', 'not loops']);
  });
});
