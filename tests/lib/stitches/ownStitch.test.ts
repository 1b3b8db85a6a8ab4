import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  abbreviationOf,
  OWN_STITCH_LIMITS,
  ownStitchCode,
  ownStitchOf,
  usualHeightOverWidth,
} from '../../../src/lib/stitches/ownStitch';
import { BASIC_STITCHES, knownStitch, stitch } from '../../../src/lib/stitches/stitchTable';

const moves = { wraps: 1, draws: 1, throughs: 3 };
const { wraps, draws, throughs, heightOverWidth: tall } = OWN_STITCH_LIMITS;

describe('ownStitchCode', () => {
  it('says the moves, and the height where it was measured', () => {
    const lst = { abbreviation: 'lst', moves };
    expect(ownStitchCode({ ...lst, heightOverWidth: null })).toBe('lst{1,1,3}');
    expect(ownStitchCode({ ...lst, heightOverWidth: 2.2 })).toBe('lst{1,1,3,2.2}');
  });

  it('tells two stitches of one abbreviation apart', () => {
    const other = { ...moves, throughs: 4 };
    const [left, right] = [moves, other].map((each) =>
      ownStitchCode({ abbreviation: 'lst', moves: each, heightOverWidth: null }),
    );
    expect(left).not.toBe(right);
  });

  it('is read back as the same stitch, whatever it is within the limits', () => {
    const stitches = fc.record({
      abbreviation: fc.stringMatching(/^[a-z]{2,12}$/),
      moves: fc
        .record({
          wraps: fc.integer({ min: 0, max: wraps }),
          draws: fc.integer({ min: 0, max: draws }),
          throughs: fc.integer({ min: 0, max: throughs }),
        })
        .filter((each) => each.draws + each.throughs > 0),
      heightOverWidth: fc.option(
        fc.integer({ min: 10_000 * tall.least, max: 10_000 * tall.most }).map((n) => n / 10_000),
      ),
    });
    fc.assert(
      fc.property(stitches, (own) => {
        const code = ownStitchCode(own);
        const read = ownStitchOf(code);
        expect(read).toMatchObject({ code, ...own.moves });
        expect(abbreviationOf(code)).toBe(own.abbreviation);
        expect(read?.heightOverWidth).toBe(own.heightOverWidth ?? usualHeightOverWidth(own.moves));
        expect(read?.heightOverWidth).toBeLessThanOrEqual(tall.most);
        expect(Number.isInteger(read?.turningChains)).toBe(true);
      }),
      { seed: 3, numRuns: 500 },
    );
  });
});

describe('ownStitchOf', () => {
  it('is known wherever stitches are', () => {
    expect(stitch('lst{1,1,3}')).toEqual(ownStitchOf('lst{1,1,3}'));
    expect(knownStitch('lst{1,1,3}').us).toBe('lst');
  });

  it.each([
    '__proto__{1,1,1}',
    'constructor',
    'x{99,99,99}',
    'x{1,1,3}',
    'lst{21,1,1}',
    'lst{1,21,1}',
    'lst{1,1,61}',
    'lst{1,1,3,0.04}',
    'lst{1,1,3,20.1}',
    'lst{0,0,0}',
    'lst{1,0,0}',
    'lst{01,1,3}',
    'lst{1,1,3,2.20}',
    'lst{1,1,3,}',
    'lst{1,1}',
    'lst{1,1,3,2,2}',
    'lst{-1,1,3}',
    'lst{1e1,1,3}',
    'LST{1,1,3}',
    'lst {1,1,3}',
    'lst{1,1,3}\n',
    'abcdefghijklm{1,1,3}',
    'lst{1,1,3}{1,1,3}',
  ])('takes %j for no stitch', (code) => {
    expect(ownStitchOf(code)).toBeNull();
    expect(stitch(code)).toBeNull();
  });

  it('gives up at once on a very long code', () => {
    expect(ownStitchOf(`${'a'.repeat(100_000)}{1,1,1}`)).toBeNull();
  });
});

describe('what a stitch of one’s own comes to', () => {
  // The bound is what the fit claims of itself; the heights are those of the stitch table.
  it.each(BASIC_STITCHES.map((each) => [each.code, each] as const))(
    'puts the moves of %s within 7 % of its height in the table',
    (_, each) => {
      expect(Math.abs(usualHeightOverWidth(each) / each.heightOverWidth - 1)).toBeLessThan(0.07);
    },
  );

  // Turning chains of the table: published, see its own tests.
  it.each(BASIC_STITCHES.map((each) => [each.code, each] as const))(
    'begins a round of the moves of %s with the chains of the table, measured or not',
    (_, { wraps, draws, throughs, heightOverWidth, turningChains }) => {
      const own = { abbreviation: 'own', moves: { wraps, draws, throughs } };
      for (const height of [null, heightOverWidth]) {
        const code = ownStitchCode({ ...own, heightOverWidth: height });
        expect(ownStitchOf(code)?.turningChains).toBe(turningChains);
      }
    },
  );

  it('stands as tall as one of its legs where it gathers several', () => {
    // Three dc together: 3 wraps, 3 draws, 4 throughs, as tall as the dc it gathers.
    const together = usualHeightOverWidth({ wraps: 3, draws: 3, throughs: 4 });
    expect(together).toBe(usualHeightOverWidth({ wraps: 1, draws: 1, throughs: 2 }));
    expect(together).toBe(1.75);
  });

  it('does not let a coil of wraps stand as tall as wraps drawn off one by one', () => {
    // 0.52 + 0.43 + 6 × 0.1 + 0.40 by its own rule; from memory, a bullion of seven wraps is about a dc tall.
    const bullion = { wraps: 7, draws: 1, throughs: 1 };
    expect(usualHeightOverWidth(bullion)).toBe(1.95);
    expect(ownStitchOf('bul{7,1,1}')?.turningChains).toBe(3);
  });

  it('never stands taller than a height may be', () => {
    expect(usualHeightOverWidth({ wraps: 20, draws: 1, throughs: 60 })).toBe(tall.most);
  });
});

describe('abbreviationOf', () => {
  it('is what patterns write', () => {
    expect(abbreviationOf('lst{1,1,3}')).toBe('lst');
    expect(abbreviationOf('dc')).toBe('dc');
    expect(abbreviationOf('')).toBe('');
  });
});
