import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN } from '../../../src/lib';
import { motifsFromYarn } from '../../../src/lib/colour/fromYarn';
import { colourwayYarn } from '../../../src/lib/ledger/colourwayYarn';
import { FIXED_SEED } from '../../support/plans';

const metres = fc.double({ min: 0.1, max: 40, noNaN: true });
const uses: fc.Arbitrary<Record<string, number>[]> = fc.array(
  fc.dictionary(fc.constantFrom('a', 'b', 'c'), metres),
  { minLength: 1, maxLength: 6 },
);

describe('motifsFromYarn', () => {
  it('makes them by turns until a colour would not last', () => {
    // by hand: a for 10 motifs of 5 m; the first colourway stops there, the second goes on
    const perMotifM: Record<string, number>[] = [{ a: 5, b: 1 }, { b: 1 }];
    expect(
      motifsFromYarn({ perMotifM, besidesM: { a: 0 }, inHandM: { a: 52 }, motifs: 30 }),
    ).toEqual({ counts: [10, 20], missing: 0, short: ['a'] });
  });

  it('leaves motifs out rather than take what is not there', () => {
    const perMotifM = [{ a: 5 }];
    expect(
      motifsFromYarn({ perMotifM, besidesM: { a: 20 }, inHandM: { a: 44 }, motifs: 6 }),
    ).toEqual({ counts: [4], missing: 2, short: ['a'] });
  });

  it('never takes more than is in hand, and never more motifs than are wanted', () => {
    fc.assert(
      fc.property(
        uses,
        fc.record({ a: fc.nat(900), b: fc.nat(900) }),
        fc.nat(120),
        (perMotifM, inHandM, motifs) => {
          const { counts, missing, short } = motifsFromYarn({
            perMotifM,
            besidesM: {},
            inHandM,
            motifs,
          });
          const made = counts.reduce((sum, count) => sum + count, 0);
          expect(made + missing).toBe(motifs);
          for (const colour of ['a', 'b'] as const) {
            const used = perMotifM.reduce((sum, m, i) => sum + (m[colour] ?? 0) * counts[i]!, 0);
            expect(used).toBeLessThanOrEqual(inHandM[colour] + 1e-6);
          }
          if (missing > 0) expect(short.length).toBeGreaterThan(0);
        },
      ),
      FIXED_SEED,
    );
  });
});

describe('colourwayYarn', () => {
  it('shares a plan out into its motifs and what is besides', () => {
    const result = estimate(EXAMPLE_PLAN);
    const { perMotifM, besidesM } = colourwayYarn(EXAMPLE_PLAN, result);
    for (const { colour, neededM } of result.colours) {
      const inMotifs = perMotifM.reduce(
        (sum, m, i) => sum + (m[colour] ?? 0) * (result.colourwayMotifs[i] ?? 0),
        0,
      );
      expect(inMotifs + (besidesM[colour] ?? 0)).toBeCloseTo(neededM, 6);
    }
    expect(besidesM.c3).toBeCloseTo(0, 6); // Rosehip is in motifs only
  });
});
