import { describe, expect, it } from 'vitest';
import { readyMotif } from '../../../../src/lib';

/** What one side of a round holds, by hand; a circle is one side. */
type Side = Readonly<Record<string, number>>;

interface Derived {
  key: string;
  sides: number;
  /** Why, as a practitioner counts it. */
  because: string;
  rounds: readonly Side[];
}

/**
 * Each count is that of one side times the sides. "+4" is (2 dc, ch 2, 2 dc) in every corner, which
 * gives each side two dc at either end; "+2" is (dc, ch 2, dc).
 */
const DERIVED: readonly Derived[] = [
  {
    key: 'window-square',
    sides: 4,
    because:
      'solid sides of 3 and 7; over 7 dc a dc, a chain, in turn: 4 dc, 3 ch, +4 dc; solid over those 11, +4; over 15, 8 dc and 7 ch, +4; solid over 19, +4',
    rounds: [
      { dc: 3 },
      { dc: 7 },
      { dc: 8, 'ch-1': 3 },
      { dc: 15 },
      { dc: 12, 'ch-1': 7 },
      { dc: 23 },
    ],
  },
  {
    key: 'cluster-square',
    sides: 4,
    because: 'as the window square, with a cluster wherever that has a chain',
    rounds: [
      { dc: 3 },
      { dc: 7 },
      { dc: 8, dc3cl: 3 },
      { dc: 15 },
      { dc: 12, dc3cl: 7 },
      { dc: 23 },
    ],
  },
  {
    key: 'popcorn-square',
    sides: 4,
    because: 'one of 7 is a popcorn, 6 + 4 dc; three of 15 are, 12 + 4 dc',
    rounds: [
      { dc: 3 },
      { dc: 7 },
      { dc: 10, '5-dc pc': 1 },
      { dc: 15 },
      { dc: 16, '5-dc pc': 3 },
      { dc: 23 },
    ],
  },
  {
    key: 'ridged-square',
    sides: 4,
    because: 'one post stitch to a side, on the one below: 6 + 4, 10 + 4, 14 + 4 dc beside it',
    rounds: [{ dc: 3 }, { dc: 7 }, { dc: 10, FPdc: 1 }, { dc: 14, FPdc: 1 }, { dc: 18, FPdc: 1 }],
  },
  {
    key: 'hdc-circle',
    sides: 1,
    because: '9 more in every round',
    rounds: [9, 18, 27, 36, 45].map((hdc) => ({ hdc })),
  },
  {
    key: 'sc-circle',
    sides: 1,
    because: '6 more in every round, as the published rule for sc',
    rounds: [6, 12, 18, 24, 30, 36, 42, 48].map((sc) => ({ sc })),
  },
  {
    key: 'lattice-hexagon',
    sides: 6,
    because:
      'solid sides of 2 and 4; over 4 dc a chain and a dc in turn, 2 of each, +2 dc; solid over those 6, +2; over 8, 4 of each, +2',
    rounds: [{ dc: 2 }, { dc: 4 }, { dc: 4, 'ch-1': 2 }, { dc: 8 }, { dc: 6, 'ch-1': 4 }],
  },
  {
    key: 'popcorn-hexagon',
    sides: 6,
    because: 'one of 4 is a popcorn, 3 + 2 dc; then solid, +2',
    rounds: [{ dc: 2 }, { dc: 4 }, { dc: 5, '5-dc pc': 1 }, { dc: 8 }, { dc: 10 }],
  },
  {
    key: 'circle-in-hexagon',
    sides: 6,
    because:
      'a circle of 12 and 24; of each 4 of those one is a corner of 2 dc, one is doubled, 6; then solid, +2',
    rounds: [{ dc: 2 }, { dc: 4 }, { dc: 6 }, { dc: 8 }, { dc: 10 }],
  },
  {
    key: 'triangle',
    sides: 3,
    because: '4 in the ring; 3 dc and a tr at either end of each side, 8 more a round',
    rounds: [{ dc: 4 }, { dc: 10, tr: 2 }, { dc: 18, tr: 2 }, { dc: 26, tr: 2 }],
  },
  {
    key: 'octagon',
    sides: 8,
    because: '2 in the ring; a tr at either end of each side, 2 more a round',
    rounds: [2, 4, 6, 8].map((tr) => ({ tr })),
  },
];

describe.each(DERIVED)('$key: $because', ({ key, sides, rounds }) => {
  const motif = readyMotif(key);

  it('has as many rounds', () => expect(motif?.rounds).toHaveLength(rounds.length));

  it.each(rounds.map((side, i) => ({ label: `Rnd ${i + 1}`, side, i })))(
    '$label counts $side to a side',
    ({ side, i }) => {
      const round = motif?.rounds[i];
      const found: Record<string, number> = { ...round?.tally };
      for (const [kind, count] of Object.entries(round?.spaces ?? {}))
        if (kind !== round?.cornerSpace) found[kind] = count;
      const whole = Object.entries(side).map(([code, count]) => [code, count * sides]);
      expect(found).toEqual(Object.fromEntries(whole));
    },
  );
});
