import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lotYarn, partLengthM } from '../../../src/lib/stash/lotYarn';

const skein = { massG: 100, lengthM: 200 };

describe('partLengthM', () => {
  it('goes by the weight of a whole skein', () => {
    expect(partLengthM(62, skein)).toBe(124);
  });
});

describe('lotYarn', () => {
  it('adds whole and part skeins', () => {
    expect(lotYarn({ wholeSkeins: 3, partSkeins: [{ massG: 62 }] }, skein)).toEqual({
      massG: 362,
      lengthM: 724,
    });
  });

  it('holds nothing when there is nothing', () => {
    expect(lotYarn({ wholeSkeins: 0, partSkeins: [] }, skein)).toEqual({ massG: 0, lengthM: 0 });
  });

  it('always has a length in proportion to its mass', () => {
    fc.assert(
      fc.property(
        fc.nat(100),
        fc.array(fc.double({ min: 0.1, max: 100, noNaN: true }), { maxLength: 8 }),
        (wholeSkeins, parts) => {
          const { massG, lengthM } = lotYarn(
            { wholeSkeins, partSkeins: parts.map((part) => ({ massG: part })) },
            skein,
          );
          expect(lengthM).toBeCloseTo(2 * massG, 6);
        },
      ),
    );
  });
});
