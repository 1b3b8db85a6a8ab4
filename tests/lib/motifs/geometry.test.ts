import { describe, expect, it } from 'vitest';
import type { Gauge } from '../../../src/lib/gauge/gauge';
import { motifGeometry, ringRadiusMm, roundHeightMm } from '../../../src/lib/motifs/geometry';
import type { Motif, MotifRound, MotifSides } from '../../../src/lib/motifs/motif';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';
import { frozen } from '../../support/plans';

/** 7.5 mm wide; sc 6.9 and dc 13.8 mm tall, each known to 3 %. */
const gauge: Gauge = {
  stitchWidthMm: 7.5,
  source: 'swatch',
  heightMm: (code) => (code === 'dc' ? 13.8 : 6.9),
  heightSpread: () => 0.03,
};

const buildRound = (perSide: number, height: MotifRound['height'], n = 1): MotifRound => ({
  label: `Rnd ${n}`,
  made: {},
  travel: {},
  tally: {},
  spaces: {},
  cornerSpace: null,
  perSide,
  height,
});

const buildMotif = (sides: MotifSides, perSide: number[], height = 'sc', chains = 0): Motif =>
  frozen({
    key: 'test',
    version: null,
    name: 'Test',
    sides,
    ring: { chains, made: {} },
    rounds: perSide.map((count, i) => buildRound(count, height, i + 1)),
  });

describe('motifGeometry', () => {
  it('gives its worked example', () => {
    // magic ring 0.25 × 7.5 = 1.875; (1.875 + 6.9) × 2 = 17.55
    const geometry = motifGeometry(buildMotif(4, [1]), gauge, null);
    expect(geometry.acrossMm).toBeCloseTo(17.55, 12);
    expect(geometry.sideMm).toBeCloseTo(17.55, 12);
  });

  it('adds two heights across for every round', () => {
    const across = motifGeometry(buildMotif(4, [3, 7, 11], 'dc', 4), gauge, null).rounds.map(
      ({ acrossMm }) => acrossMm,
    );
    // 4 chains of 6.75 mm bent to a ring: radius 4.297
    expect(across[0]).toBeCloseTo(2 * (27 / (2 * Math.PI) + 13.8), 10);
    expect((across[1] as number) - (across[0] as number)).toBeCloseTo(27.6, 10);
    expect((across[2] as number) - (across[1] as number)).toBeCloseTo(27.6, 10);
  });

  it.each<[MotifSides, number]>([
    // Textbook: side = across × tan(π / sides); a quarter of π × across for a circle; a triangle by its height
    [3, 2 / Math.sqrt(3)],
    [4, 1],
    [6, 1 / Math.sqrt(3)],
    [8, Math.SQRT2 - 1],
    [0, Math.PI / 4],
  ])('gives the side of a shape of %i sides from its width', (sides, sideOverAcross) => {
    const { acrossMm, sideMm } = motifGeometry(buildMotif(sides, [3]), gauge, 100);
    expect(acrossMm).toBe(100);
    expect(sideMm).toBeCloseTo(100 * sideOverAcross, 10);
  });

  it('takes a measured width, surer than a computed one, and keeps the fullness', () => {
    const motif = buildMotif(4, [1, 3, 5]);
    const computed = motifGeometry(motif, gauge, null);
    const measured = motifGeometry(motif, gauge, 60);
    expect(measured.acrossSdMm).toBeCloseTo(0.6, 12);
    // three sc rounds err together: 2 × 3 × 6.9 × 0.03
    expect(computed.acrossSdMm).toBeCloseTo(1.242, 12);
    expect(measured.rounds).toEqual(computed.rounds);
  });

  it('lets rounds of different stitches err apart', () => {
    const motif = { ...buildMotif(4, []), rounds: [buildRound(3, 'sc'), buildRound(7, 'dc', 2)] };
    // 2 × hypot(0.207, 0.414)
    expect(motifGeometry(motif, gauge, null).acrossSdMm).toBeCloseTo(
      2 * Math.hypot(0.207, 0.414),
      12,
    );
  });

  it('finds the round at which too few stitches make it cup', () => {
    // sc circle with 2 more a round from the third, where 2π × 0.92 = 5.8 are needed
    const { trouble, rounds } = motifGeometry(buildMotif(0, [7, 14, 16, 18, 20]), gauge, null);
    expect(trouble).toEqual({ label: 'Rnd 3', kind: 'cups' });
    expect(rounds[1]?.fullness).toBeCloseTo((14 * 7.5) / (2 * Math.PI * 15.675), 12);
  });

  it('finds the round at which too many stitches make it ruffle', () => {
    const { trouble } = motifGeometry(buildMotif(0, [6, 12, 18, 30, 42]), gauge, null);
    expect(trouble).toEqual({ label: 'Rnd 4', kind: 'ruffles' });
  });

  it('says nothing of one or two rounds, nor where the last round lies flat again', () => {
    expect(motifGeometry(buildMotif(0, [30, 60]), gauge, null).trouble).toBeNull();
    expect(motifGeometry(buildMotif(0, [12, 24, 20]), gauge, null).trouble).toBeNull();
  });

  it('names the first round where none lies flat', () => {
    expect(motifGeometry(buildMotif(0, [30, 60, 90]), gauge, null).trouble?.label).toBe('Rnd 1');
  });

  it('gives a motif without rounds the size of its ring', () => {
    expect(motifGeometry(buildMotif(4, []), gauge, null)).toMatchObject({
      acrossMm: 3.75,
      rounds: [],
      trouble: null,
    });
  });
});

describe('roundHeightMm', () => {
  it('takes the height of its stitch', () => {
    expect(roundHeightMm({ height: 'dc' }, gauge)).toBe(13.8);
  });

  it('takes a chain loop as two sides of a flat triangle', () => {
    // 5 chains of 6.75 over 2 stitches of 7.5: sqrt(16.875² - 7.5²)
    expect(roundHeightMm({ height: { chains: 5, gapStitches: 2 } }, gauge)).toBeCloseTo(
      Math.sqrt(16.875 ** 2 - 7.5 ** 2),
      12,
    );
  });

  it('is nothing where the chains are pulled straight', () => {
    expect(roundHeightMm({ height: { chains: 2, gapStitches: 4 } }, gauge)).toBe(0);
  });
});

describe('ringRadiusMm', () => {
  it('bends the chains to a circle, or is a quarter stitch for a magic ring', () => {
    expect(ringRadiusMm(buildMotif(4, [], 'sc', 6), gauge)).toBeCloseTo(40.5 / (2 * Math.PI), 12);
    expect(ringRadiusMm(readyMotif('hexagon') as Motif, gauge)).toBe(1.875);
  });
});
