import fc from 'fast-check';
import * as math from 'mathjs';
import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import { gaugeOf, type Gauge } from '../../../src/lib/gauge/gauge';
import { motifGeometry, ringRadiusMm, roundHeightMm } from '../../../src/lib/motifs/geometry';
import {
  LEAST_TAPE_ERROR_MM,
  OWN_ROUND_SPREAD,
  RING_SPREAD,
  tapeErrorMm,
  type RoundSize,
} from '../../../src/lib/motifs/heightBelief';
import { measuredMotif } from '../../../src/lib/motifs/measuredMotif';
import type { Motif } from '../../../src/lib/motifs/motif';
import { READY_MOTIFS, readyMotif } from '../../../src/lib/motifs/readyMotifs';
import { FIXED_SEED, frozen } from '../../support/plans';

/** 7.5 mm wide; sc 6.9 and all else 13.8 mm tall, each known to 3 %. */
const gauge: Gauge = {
  stitchWidthMm: 7.5,
  source: 'swatch',
  heightMm: (code) => (code === 'sc' ? 6.9 : 13.8),
  heightSpread: () => 0.03,
};
const scaled = (factor: number): Gauge => ({
  ...gauge,
  stitchWidthMm: factor * gauge.stitchWidthMm,
  heightMm: (code) => factor * gauge.heightMm(code),
});

const buildMotif = (heights: string[]): Motif =>
  frozen({
    key: 'test',
    version: null,
    name: 'Test',
    sides: 4,
    ring: { chains: 0, made: {} },
    rounds: heights.map((height, i) => ({
      label: `Rnd ${i + 1}`,
      made: {},
      travel: {},
      tally: {},
      spaces: {},
      cornerSpace: null,
      perSide: 3 + 4 * i,
      height,
    })),
  });
const oneRound = buildMotif(['sc']);
const groupSquare = frozen(readyMotif('group-square', 5) as Motif);

/** Sizes after some of the rounds, each so much larger or smaller than by the gauge, still growing. */
const someSizes = (motif: Motif): fc.Arbitrary<RoundSize[]> =>
  fc
    .tuple(
      fc.subarray(motif.rounds.map((_, i) => i + 1)),
      fc.double({ min: 0.85, max: 1.2, noNaN: true }),
    )
    .map(([rounds, factor]) => {
      const computed = motifGeometry(motif, gauge, null).rounds;
      return rounds.map((round) => ({
        round,
        acrossMm: factor * (computed[round - 1]?.acrossMm as number),
      }));
    });

describe('measuredMotif', () => {
  it('gives its worked example, as by hand', () => {
    // Ring 1.875 mm ± 20 %; sc 6.9 mm ± 3 % of its kind and ± 4 % of its own; twice both across:
    // 17.55 mm, variance 4 × (0.375² + (6.9 × 0.05)²) = 1.0386; the tape reads 20 ± 0.5 mm.
    const variance = 4 * (0.375 ** 2 + (6.9 * 0.05) ** 2);
    const gain = variance / (variance + 0.25);
    const { acrossMm, acrossSdMm, rounds } = measuredMotif(oneRound, gauge, [
      { round: 1, acrossMm: 20 },
    ]);
    expect(acrossMm).toBeCloseTo(17.55 + gain * 2.45, 10);
    expect(acrossSdMm).toBeCloseTo(Math.sqrt(variance * (1 - gain)), 10);
    expect([acrossMm.toFixed(3), acrossSdMm.toFixed(2)]).toEqual(['19.525', '0.45']);
    // Of the surprise, the height has its share of the variance.
    const share = (4 * (6.9 * 0.05) ** 2) / variance;
    expect(rounds[0]?.heightMm).toBeCloseTo(6.9 + (share * gain * 2.45) / 2, 10);
  });

  it.each(READY_MOTIFS)('is the computed geometry of $key before anything is measured', (entry) => {
    const motif = readyMotif(entry.key) as Motif;
    for (const known of [gauge, gaugeOf(null, 4)]) {
      const computed = motifGeometry(motif, known, null);
      const measured = measuredMotif(motif, known, []);
      expect(measured.acrossMm).toBeCloseTo(computed.acrossMm, 9);
      expect(measured.sideMm).toBeCloseTo(computed.sideMm, 9);
      expect(measured.trouble).toEqual(computed.trouble);
      measured.rounds.forEach((round, i) =>
        expect(round).toMatchObject({
          label: computed.rounds[i]?.label,
          heightMm: expect.closeTo(computed.rounds[i]?.heightMm as number, 9),
          acrossMm: expect.closeTo(computed.rounds[i]?.acrossMm as number, 9),
          fullness: expect.closeTo(computed.rounds[i]?.fullness as number, 9),
          measuredMm: null,
          questioned: false,
        }),
      );
    }
  });

  it('is then as sure as the gauge is, less what rounds and ring differ of themselves', () => {
    const heightsMm = groupSquare.rounds.map((round) => roundHeightMm(round, gauge));
    const ownMm = 2 * OWN_ROUND_SPREAD * Math.hypot(...heightsMm);
    const ofRingMm = 2 * RING_SPREAD * ringRadiusMm(groupSquare, gauge);
    const byGaugeMm = motifGeometry(groupSquare, gauge, null).acrossSdMm;
    expect(measuredMotif(groupSquare, gauge, []).acrossSdMm).toBeCloseTo(
      Math.hypot(byGaugeMm, ownMm, ofRingMm),
      9,
    );
  });

  it('lets rounds that were not measured follow those of like height', () => {
    const motif = buildMotif(['dc', 'dc', 'sc', 'dc']);
    const [first, second] = motifGeometry(motif, gauge, null).rounds;
    const larger = measuredMotif(motif, gauge, [
      { round: 1, acrossMm: 1.1 * (first?.acrossMm as number) },
      { round: 2, acrossMm: 1.1 * (second?.acrossMm as number) },
    ]);
    const heights = larger.rounds.map(({ heightMm }) => heightMm);
    expect(heights[2]).toBeCloseTo(6.9, 10);
    expect(heights[3]).toBeGreaterThan(1.02 * 13.8);
    expect(heights[3]).toBeLessThan(heights[1] as number);
  });

  it('is drawn to the tape as far as the tape is surer than the gauge', () => {
    const { acrossMm: computedMm } = motifGeometry(groupSquare, gauge, null);
    const measured = measuredMotif(groupSquare, gauge, [{ round: 5, acrossMm: 1.1 * computedMm }]);
    expect(measured.acrossMm / computedMm).toBeGreaterThan(1.09);
    expect(measured.acrossMm / computedMm).toBeLessThan(1.1);
    expect(measured.acrossSdMm).toBeLessThan(tapeErrorMm(measured.acrossMm));
    expect(measured.sideMm).toBeCloseTo(measured.acrossMm, 10);
  });

  it('agrees with the same posterior by mathjs, in heights and with full covariances', () => {
    const heightsMm = groupSquare.rounds.map((round) => roundHeightMm(round, gauge));
    const means = [ringRadiusMm(groupSquare, gauge), ...heightsMm];
    const prior = means.map((_, i) =>
      means.map((__, j) => {
        if (i === 0 || j === 0) return i === j ? (RING_SPREAD * (means[0] as number)) ** 2 : 0;
        const together = 0.03 ** 2 * (means[i] as number) * (means[j] as number);
        return together + (i === j ? (OWN_ROUND_SPREAD * (means[i] as number)) ** 2 : 0);
      }),
    );
    const sizes = [
      { round: 2, acrossMm: 71 },
      { round: 4, acrossMm: 128.5 },
    ];
    const design = sizes.map(({ round }) => means.map((_, i) => (i <= round ? 2 : 0)));
    const noise = math.diag(sizes.map(({ acrossMm }) => tapeErrorMm(acrossMm) ** 2));
    const inner = math.multiply(math.multiply(design, prior), math.transpose(design));
    const spread = math.add(inner, noise) as unknown as number[][];
    const gain = math.multiply(math.multiply(prior, math.transpose(design)), math.inv(spread));
    const surprise = math.subtract(
      sizes.map(({ acrossMm }) => acrossMm),
      math.multiply(design, means),
    );
    const expected = math.add(means, math.multiply(gain, surprise)) as unknown as number[];
    const left = math.subtract(
      prior,
      math.multiply(math.multiply(gain, design), prior),
    ) as unknown as number[][];
    const measured = measuredMotif(groupSquare, gauge, sizes);
    measured.rounds.forEach(({ heightMm, acrossMm, acrossSdMm }, i) => {
      expect(heightMm).toBeCloseTo(expected[i + 1] as number, 9);
      const row = means.map((_, j) => (j <= i + 1 ? 2 : 0));
      expect(acrossMm).toBeCloseTo(math.dot(row, expected), 9);
      const variance = math.dot(row, math.multiply(left, row));
      expect(acrossSdMm).toBeCloseTo(Math.sqrt(variance), 9);
    });
  });

  it('never becomes less sure of any round by one more size', () => {
    fc.assert(
      fc.property(someSizes(groupSquare), (sizes) => {
        const all = measuredMotif(groupSquare, gauge, sizes).rounds;
        const fewer = measuredMotif(groupSquare, gauge, sizes.slice(1)).rounds;
        all.forEach(({ acrossSdMm }, i) =>
          expect(acrossSdMm).toBeLessThanOrEqual((fewer[i]?.acrossSdMm as number) + 1e-9),
        );
      }),
      FIXED_SEED,
    );
  });

  it('does not depend on the order of the sizes', () => {
    fc.assert(
      fc.property(someSizes(groupSquare), (sizes) => {
        const there = measuredMotif(groupSquare, gauge, sizes);
        const back = measuredMotif(groupSquare, gauge, sizes.toReversed());
        expect(back.acrossMm).toBeCloseTo(there.acrossMm, 9);
        expect(back.acrossSdMm).toBeCloseTo(there.acrossSdMm, 9);
      }),
      FIXED_SEED,
    );
  });

  it('grows with everything: a larger yarn measured larger gives the same shape', () => {
    fc.assert(
      fc.property(
        someSizes(groupSquare),
        fc.double({ min: 1, max: 20, noNaN: true }),
        (sizes, factor) => {
          // Below 50 mm a tape is not finer for being shorter.
          const large = sizes.filter(({ acrossMm }) => 0.01 * acrossMm > LEAST_TAPE_ERROR_MM);
          const grown = large.map((each) => ({ ...each, acrossMm: factor * each.acrossMm }));
          const small = measuredMotif(groupSquare, gauge, large);
          const wide = measuredMotif(groupSquare, scaled(factor), grown);
          expect(wide.acrossMm / factor).toBeCloseTo(small.acrossMm, 7);
          expect(wide.acrossSdMm / factor).toBeCloseTo(small.acrossSdMm, 7);
          wide.rounds.forEach(({ fullness }, i) =>
            expect(fullness).toBeCloseTo(small.rounds[i]?.fullness as number, 9),
          );
        },
      ),
      FIXED_SEED,
    );
  });

  describe('fullness', () => {
    const motif = buildMotif(['dc', 'dc', 'dc', 'dc']);
    const measuredBy = (factor: number, known: Gauge) =>
      measuredMotif(
        motif,
        known,
        motifGeometry(motif, known, null).rounds.map(({ acrossMm }, i) => ({
          round: i + 1,
          acrossMm: factor * acrossMm,
        })),
      ).rounds.at(-1)?.fullness as number;
    const computed = (known: Gauge) =>
      motifGeometry(motif, known, null).rounds.at(-1)?.fullness as number;

    it('falls where rounds came out taller than the swatch’s width can fill', () => {
      expect(measuredBy(1.1, gauge) / computed(gauge)).toBeCloseTo(1 / 1.1, 1);
    });

    it('hardly changes where the width came from the category: the stitches are larger all over', () => {
      const usual = gaugeOf(null, 4);
      const change = measuredBy(1.1, usual) / computed(usual);
      // 0.12² / (0.12² + 0.08²) = 0.69 of a surprise of 10 % is the width's: some 1.07 / 1.1
      expect(change).toBeGreaterThan(0.96);
      expect(change).toBeLessThan(0.98);
    });

    it('names the trouble that the tape shows', () => {
      const flat = buildMotif(['sc', 'sc', 'sc', 'sc']);
      const byGauge = motifGeometry(flat, gauge, null);
      expect(byGauge.trouble?.kind).toBe('ruffles');
      const taller = byGauge.rounds.map(({ acrossMm }, i) => ({
        round: i + 1,
        acrossMm: 2.4 * acrossMm,
      }));
      expect(measuredMotif(flat, gauge, taller).trouble?.kind).not.toBe('ruffles');
    });
  });

  it('questions a size that no hand would make', () => {
    const { acrossMm } = motifGeometry(groupSquare, gauge, null);
    const questioned = (factor: number) =>
      measuredMotif(groupSquare, gauge, [{ round: 5, acrossMm: factor * acrossMm }]).rounds.map(
        (round) => round.questioned,
      );
    expect(questioned(1.05)).toEqual([false, false, false, false, false]);
    expect(questioned(1.5)).toEqual([false, false, false, false, true]);
  });

  it.each<[string, RoundSize[]]>([
    ['no-such-round', [{ round: 0, acrossMm: 40 }]],
    ['no-such-round', [{ round: 6, acrossMm: 40 }]],
    ['no-such-round', [{ round: 1.5, acrossMm: 40 }]],
    ['sizes-do-not-grow', [{ round: 1, acrossMm: 0 }]],
    ['sizes-do-not-grow', [{ round: 1, acrossMm: NaN }]],
    ['sizes-do-not-grow', [{ round: 1, acrossMm: Infinity }]],
    [
      'sizes-do-not-grow',
      [
        { round: 3, acrossMm: 60 },
        { round: 2, acrossMm: 60 },
      ],
    ],
    [
      'sizes-do-not-grow',
      [
        { round: 2, acrossMm: 60 },
        { round: 2, acrossMm: 61 },
      ],
    ],
  ])('refuses with %s: %j', (code, sizes) => {
    expect(() => measuredMotif(groupSquare, gauge, sizes)).toThrow(DomainError);
    expect(() => measuredMotif(groupSquare, gauge, sizes)).toThrow(
      expect.objectContaining({ code }),
    );
  });
});

describe('tapeErrorMm', () => {
  it('is a hundredth, and half a millimetre of anything small', () => {
    expect([tapeErrorMm(120), tapeErrorMm(30)]).toEqual([1.2, 0.5]);
  });
});
