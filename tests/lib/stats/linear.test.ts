import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dot, inverse, times, type Matrix } from '../../../src/lib/stats/linear';
import { FIXED_SEED, frozen } from '../../support/plans';

/** Largest distance of left · right from the identity. */
function distanceFromIdentity(left: Matrix, right: Matrix): number {
  const products = left.map((row) =>
    right.map((_, j) =>
      dot(
        row,
        right.map((line) => line[j] as number),
      ),
    ),
  );
  return Math.max(
    ...products.flatMap((row, i) => row.map((value, j) => Math.abs(value - (i === j ? 1 : 0)))),
  );
}

describe('dot', () => {
  it('multiplies and adds; a shorter right side counts as zeros', () => {
    expect(dot([1, 2, 3], [4, 5, 6])).toBe(32);
    expect(dot([1, 2, 3], [4])).toBe(4);
    expect(dot([], [4])).toBe(0);
  });
});

describe('times', () => {
  it('multiplies a matrix by a vector', () => {
    expect(
      times(
        [
          [1, 2],
          [3, 4],
        ],
        [5, 6],
      ),
    ).toEqual([17, 39]);
  });
});

describe('inverse', () => {
  it('inverts its worked example, and a single number', () => {
    expect(
      inverse([
        [4, 0],
        [0, 0.25],
      ]),
    ).toEqual([
      [0.25, 0],
      [0, 4],
    ]);
    expect(inverse([[8]])).toEqual([[0.125]]);
  });

  it('inverts the 3 × 3 Hilbert matrix to its known whole numbers', () => {
    // Textbook: inverse of 1/(i+j-1) is [[9,-36,30],[-36,192,-180],[30,-180,180]]
    const hilbert = frozen([1, 2, 3].map((i) => [1, 2, 3].map((j) => 1 / (i + j - 1))));
    const known = [
      [9, -36, 30],
      [-36, 192, -180],
      [30, -180, 180],
    ];
    inverse(hilbert).forEach((row, i) =>
      row.forEach((value, j) => expect(value).toBeCloseTo(known[i]?.[j] as number, 9)),
    );
  });

  it('puts rows back in place where the decomposition has exchanged them', () => {
    // After the first step the second pivot is 1 - 0.99² = 0.0199 and the entry below it
    // 0.1 - 0.0099 = 0.0901: partial pivoting exchanges rows 2 and 3.
    const matrix = frozen([
      [1, 0.99, 0.01, 0],
      [0.99, 1, 0.1, 0],
      [0.01, 0.1, 1, 0.3],
      [0, 0, 0.3, 1],
    ]);
    expect(distanceFromIdentity(matrix, inverse(matrix))).toBeLessThan(1e-12);
  });

  it('loses no digits to units that differ by many powers of ten', () => {
    const scale = [1e-9, 1, 1e9];
    const base = [
      [2, 1, 0.5],
      [1, 3, 1],
      [0.5, 1, 4],
    ];
    const scaled = base.map((row, i) =>
      row.map((value, j) => value * (scale[i] as number) * (scale[j] as number)),
    );
    const plain = inverse(base);
    inverse(scaled).forEach((row, i) =>
      row.forEach((value, j) =>
        expect(value * (scale[i] as number) * (scale[j] as number)).toBeCloseTo(
          plain[i]?.[j] as number,
          13,
        ),
      ),
    );
  });

  it('undoes every well-conditioned positive definite matrix of up to eight rows', () => {
    const entries = fc.integer({ min: -9, max: 9 });
    const size = fc.integer({ min: 1, max: 8 });
    fc.assert(
      fc.property(
        size.chain((n) =>
          fc.array(fc.array(entries, { minLength: n, maxLength: n }), {
            minLength: n,
            maxLength: n,
          }),
        ),
        (rows) => {
          // A Gram matrix with a ridge is positive definite.
          const matrix = rows.map((left, i) =>
            rows.map((right, j) => dot(left, right) + (i === j ? 1 : 0)),
          );
          expect(distanceFromIdentity(matrix, inverse(matrix))).toBeLessThan(1e-8);
        },
      ),
      FIXED_SEED,
    );
  });
});
