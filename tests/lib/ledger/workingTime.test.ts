import { describe, expect, it } from 'vitest';
import { blanketOf } from '../../../src/lib/ledger/blanketOf';
import type { LedgerLine } from '../../../src/lib/ledger/ledger';
import { SECONDS_PER_MOVE, workingTimeS } from '../../../src/lib/ledger/workingTime';
import { plainPlan } from '../../support/plans';

const line = (
  part: LedgerLine['part'],
  label: string,
  count: number,
  loops: number,
): LedgerLine => ({
  colour: 'c1',
  part,
  label,
  stitch: loops > 0 ? 'sc' : null,
  count,
  loopsEach: 2,
  loops,
  eachMm: 40,
  lengthM: 1,
  varianceM2: 0,
  source: 'published',
});
const lines = [
  line('rounds', 'Rnd 1', 500, 1000),
  line('join', 'Slip stitch', 200, 400),
  line('tails', 'rounds', 10, 0),
  line('tails', 'join', 4, 0),
  line('allowance', 'Allowance', 1, 0),
];

describe('workingTimeS', () => {
  it('counts moves and tails, and of them what the join takes', () => {
    const plan = plainPlan('solid-square');
    const time = workingTimeS(plan, blanketOf(plan), lines);
    // 1400 moves × 0.9 s, 14 tails × 45 s; join 400 × 0.9 + 4 × 45
    expect(SECONDS_PER_MOVE).toBe(0.9);
    expect(time.durationS).toBeCloseTo(1260 + 630, 9);
    expect(time.joinDurationS).toBeCloseTo(360 + 180, 9);
  });

  it("takes the maker's own pace, and four seconds for every sewn stitch", () => {
    const plan = plainPlan('solid-square', {
      secondsPerMove: 2,
      join: { key: 'whip-stitch', colour: 'c1' },
    });
    const time = workingTimeS(plan, blanketOf(plan), lines);
    // 17 sides × 23 stitches × 4 s = 1564
    expect(time.durationS).toBeCloseTo(2800 + 630 + 1564, 9);
    expect(time.joinDurationS).toBeCloseTo(800 + 180 + 1564, 9);
  });
});
