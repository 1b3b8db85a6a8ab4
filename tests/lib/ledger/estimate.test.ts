import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate } from '../../../src/lib/ledger/estimate';
import type { Estimate } from '../../../src/lib/ledger/ledger';
import { normalQuantile } from '../../../src/lib/stats/normal';
import { anyPlan, buildPlan, FIXED_SEED, plainPlan, weighed } from '../../support/plans';

const close = (actual: number, expected: number, relative = 1e-9): void => {
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(
    relative * Math.max(1, Math.abs(expected)),
  );
};

/** Loops of one stitch each, worked by hand for the front page's plan. */
type Loops = { ch: number; dc: number; sc: number; slst: number };

/**
 * The front page's plan worked by hand. Rounds of the group square, each attached in place: ring
 * and round 1 ch 15, dc 11, sl st 2; round 2 ch 15, dc 23, sl st 1; round 3 ch 19, dc 35, sl st 1;
 * round 4 ch 23, dc 47, sl st 1. Colourways: 27 of Barley Rosehip Bracken Barley, 27 of Barley
 * Sloe Rosehip Barley, 26 of Barley Bracken Sloe Barley.
 */
const BY_HAND: Record<string, { loops: Loops; tails: number; pieces: readonly [number, Loops][] }> =
  (() => {
    const loops = (ch: number, dc: number, sc: number, slst: number): Loops => ({
      ch,
      dc: 4 * dc,
      sc: 2 * sc,
      slst,
    });
    const middle = (first: number, second: number) => ({
      // one colour that is round 2 of some motifs and round 3 of others
      loops: loops(15 * first + 19 * second, 23 * first + 35 * second, 0, first + second),
      tails: 2 * (first + second),
      pieces: [
        [first, loops(15, 23, 0, 1)],
        [second, loops(19, 35, 0, 1)],
      ] as [number, Loops][],
    });
    const side = (sc: number): Loops => loops(1 / 36, 0, sc / 36, 1 / 36);
    return {
      // braid: 80 × (4 × 8 sc, 4 × 35 + 4 × 7 ch); 142 × 7 + 158 links; border 616 and 632
      c1: {
        loops: loops(80 * 168 + 2, 0, 80 * 32 + 616 + 632, 142 * 7 + 158 + 2),
        tails: 80 * 2 + 4,
        pieces: [
          [80, loops(168, 0, 32, 0)],
          [142, loops(0, 0, 0, 7)],
          [1, loops(0, 0, 0, 158)],
          [36, side(616)],
          [36, side(632)],
        ],
      },
      c2: {
        loops: loops(80 * 38 + 1, 80 * 58, 624, 80 * 3 + 1),
        tails: 80 * 4 + 2,
        pieces: [
          [80, loops(38, 58, 0, 3)],
          [36, side(624)],
        ],
      },
      c3: middle(27, 27),
      c4: middle(26, 27),
      c5: middle(27, 26),
    };
  })();

describe("estimate of the front page's plan", () => {
  /**
   * One weighing learnt by the textbook's formula for a single observation, without matrices:
   * prior of each loop 39 mm (5.2 × 7.5), common variance (0.2 × 39)², own (0.05 × 39)².
   */
  const common = (0.2 * 39) ** 2;
  const own = (0.05 * 39) ** 2;
  const covariance = (left: Loops, right: Loops): number => {
    const keys = Object.keys(left) as (keyof Loops)[];
    const total = (loops: Loops) => keys.reduce((sum, key) => sum + loops[key], 0);
    const each = keys.reduce((sum, key) => sum + left[key] * right[key], 0);
    return (common * total(left) * total(right) + own * each) / 1e6;
  };
  const weighedPiece: Loops = { ch: 4 * 72, dc: 4 * 464, sc: 0, slst: 4 * 5 };
  const readingM = 40 * 2 - 4 * 8 * 0.15 * 0.75;
  const priorM = (loops: Loops) => (39 * (loops.ch + loops.dc + loops.sc + loops.slst)) / 1000;
  // How much the piece may differ is a share of what it usually takes, tails included.
  const usualM = priorM(weighedPiece) + 4 * 8 * 0.15 * 0.75;
  const noise = 2 / 3 + (0.02 * usualM) ** 2 + (0.03 * usualM) ** 2 / 4;
  const spread = covariance(weighedPiece, weighedPiece) + noise;
  const meanOf = (loops: Loops) =>
    priorM(loops) + (covariance(loops, weighedPiece) * (readingM - priorM(weighedPiece))) / spread;
  const varianceOf = (loops: Loops) =>
    covariance(loops, loops) - covariance(loops, weighedPiece) ** 2 / spread;

  const result = estimate(buildPlan());

  it.each(Object.entries(BY_HAND))('needs for %s what is worked by hand', (key, byHand) => {
    const colour = result.colours.find(
      (each) => each.colour === key,
    ) as Estimate['colours'][number];
    const pieces = byHand.pieces.reduce(
      (sum, [count, loops]) => sum + count * (0.03 * meanOf(loops)) ** 2,
      0,
    );
    const variance = varianceOf(byHand.loops) + pieces + byHand.tails * 0.045 ** 2;
    close(colour.meanM, meanOf(byHand.loops) + byHand.tails * 0.15);
    close(colour.sdM ** 2, variance, 1e-7);
    close(colour.neededM, colour.meanM + 1.6448536269514722 * Math.sqrt(variance), 1e-7);
    close(colour.neededG, colour.neededM / 2);
    expect(colour.skeins).toBe(
      [1, 2, 3, 4, 5, 6].find(
        (n) => colour.meanM + 1.6448536 * Math.sqrt(variance + n * 9) <= n * 200,
      ),
    );
    expect(colour.costMinor).toBe(colour.skeins * 640);
  });

  it('needs in all what its colours need, with the hand in common', () => {
    const all = Object.values(BY_HAND).reduce<Loops>(
      (sum, { loops }) => ({
        ch: sum.ch + loops.ch,
        dc: sum.dc + loops.dc,
        sc: sum.sc + loops.sc,
        slst: sum.slst + loops.slst,
      }),
      { ch: 0, dc: 0, sc: 0, slst: 0 },
    );
    const apart = Object.values(BY_HAND).reduce(
      (sum, { pieces, tails }) =>
        sum +
        tails * 0.045 ** 2 +
        pieces.reduce((each, [count, loops]) => each + count * (0.03 * meanOf(loops)) ** 2, 0),
      0,
    );
    const { totals } = result;
    expect(totals.tails).toBe(164 + 322 + 108 + 106 + 106);
    close(totals.meanM, meanOf(all) + 806 * 0.15);
    close(totals.sdM ** 2, varianceOf(all) + apart, 1e-7);
    close(totals.marginFraction, (1.6448536269514722 * totals.sdM) / totals.meanM);
    close(totals.massG, totals.meanM / 2);
    expect(totals.skeins).toBe(16);
    expect(totals.costMinor).toBe(16 * 640);
    close(totals.stitches, all.ch + all.dc / 4 + all.sc / 2 + all.slst);
  });

  it('takes its time: moves at 0.9 s and tails at 45 s', () => {
    const moves = Object.values(BY_HAND).reduce(
      (sum, { loops }) => sum + loops.ch + loops.dc + loops.sc + loops.slst,
      0,
    );
    close(result.totals.durationS, moves * 0.9 + 806 * 45);
    close(result.totals.joinDurationS, (80 * (168 + 64) + 142 * 7 + 158) * 0.9 + 160 * 45);
  });

  it('fits its join with seven repeats', () => {
    expect(result.fit).toEqual({ fits: true, repeats: 7 });
    expect(result.notices.every(({ severity }) => severity === 'caution')).toBe(true);
  });
});

describe('estimate', () => {
  it('adds up, colour by colour, part by part and cause by cause, for any plan', () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const result = estimate(plan);
        const sum = <T>(items: readonly T[], of: (item: T) => number): number =>
          items.reduce((total, item) => total + of(item), 0);
        for (const colour of result.colours) {
          const lines = result.ledger.filter((line) => line.colour === colour.colour);
          const worked = lines.filter(({ part }) => part !== 'allowance');
          close(
            sum(worked, ({ lengthM }) => lengthM),
            colour.meanM,
          );
          close(
            sum(worked, ({ varianceM2 }) => varianceM2),
            colour.sdM ** 2,
            1e-7,
          );
          close(
            sum(lines, ({ lengthM }) => lengthM),
            Math.max(0, colour.neededM),
          );
          for (const line of worked) {
            const times = line.stitch === null ? line.count : line.loops;
            close(line.lengthM, (times * line.eachMm) / 1000);
          }
        }
        for (const part of result.parts) {
          const lines = result.ledger.filter(
            (line) => line.part === part.part && line.colour === part.colour,
          );
          close(
            part.lengthM,
            sum(lines, ({ lengthM }) => lengthM),
          );
        }
        close(
          sum(result.uncertainty, ({ share }) => share),
          result.totals.meanM > 0 ? 1 : 0,
        );
        const skeins = result.uncertainty.find(({ cause }) => cause === 'skeins');
        const causes = sum(result.uncertainty, ({ varianceM2 }) => varianceM2);
        close(causes - (skeins?.varianceM2 ?? 0), result.totals.sdM ** 2, 1e-6);
        close(
          result.totals.meanM,
          sum(result.colours, ({ meanM }) => meanM),
        );
        expect(result.totals.skeins).toBe(sum(result.colours, ({ skeins: each }) => each));
      }),
      FIXED_SEED,
    );
  });

  it('gives the chance of running short around the skeins it asks for', () => {
    for (const { chances, skeins } of estimate(buildPlan()).colours) {
      expect(chances.map((chance) => chance.skeins)).toEqual(
        [skeins - 1, skeins, skeins + 1].filter((n) => n > 0),
      );
      expect(chances.find((chance) => chance.skeins === skeins)?.probabilityShort).toBeLessThan(
        0.05,
      );
    }
  });

  it('has no margin at 50 %', () => {
    const { totals, colours, next } = estimate(buildPlan({ confidence: 0.5 }));
    expect(totals.marginFraction).toBe(0);
    for (const { neededM, meanM } of colours) expect(neededM).toBe(meanM);
    expect(next.every(({ marginNow }) => marginNow > 0)).toBe(true);
  });

  it('answers without a swatch and without evidence, and says that it is less sure', () => {
    const blind = estimate(buildPlan({ swatch: null, evidence: [] }));
    expect(blind.stitchWidthMm).toBeCloseTo(8.128, 12);
    expect(blind.totals.marginFraction).toBeGreaterThan(0.3); // 1.645 × 20 % and more
    expect(blind.ledger.some(({ source }) => source === 'measured')).toBe(false);
    const known = estimate(buildPlan());
    expect(known.totals.marginFraction).toBeLessThan(0.06);
  });

  it('asks for no yarn of a colour that is never used', () => {
    const colours = [...buildPlan().colours, { key: 'c9', name: 'Fescue', hex: '#80a080' }];
    const unused = estimate(buildPlan({ colours })).colours.at(-1);
    expect(unused).toEqual({
      colour: 'c9',
      meanM: 0,
      sdM: 0,
      neededM: 0,
      neededG: 0,
      skeins: 0,
      chances: [],
      costMinor: 0,
    });
  });

  it('knows no cost without a price', () => {
    const yarn = { ...buildPlan().yarn, price: null };
    const result = estimate(buildPlan({ yarn }));
    expect(result.totals.costMinor).toBeNull();
    expect(result.colours[0]?.costMinor).toBeNull();
  });

  it('plans a single motif without a border', () => {
    const plan = plainPlan('two-colour-square', { size: { by: 'grid', rows: 1, columns: 1 } });
    const result = estimate(plan);
    expect(result.counts).toMatchObject({ motifs: 1, joinedSides: 0 });
    expect(result.parts.map(({ part }) => part)).toEqual(['rounds', 'tails', 'allowance']);
  });

  it('plans circles and hexagons with any join', () => {
    for (const key of ['circle', 'hexagon']) {
      for (const join of ['whip-stitch', 'zigzag-chain', 'last-round', 'lantern-lace']) {
        const { totals, size } = estimate(plainPlan(key, { join: { key: join, colour: 'c1' } }));
        expect(totals.meanM).toBeGreaterThan(0);
        expect(Number.isFinite(size.widthMm + size.heightMm + totals.sdM)).toBe(true);
      }
    }
  });

  it('plans the largest blanket', () => {
    const plan = buildPlan({ size: { by: 'grid', rows: 400, columns: 400 } });
    const { counts, totals } = estimate(plan);
    expect(counts.motifs).toBe(160_000);
    expect(totals.meanM).toBeGreaterThan(4_000_000);
  });

  it('gives a finite answer to a reading that contradicts everything, and questions it', () => {
    const evidence = [
      { piece: 'motifs', count: 4, motifIndex: 0, reading: weighed(0.01, 0.001) },
    ] as const;
    const { totals, notices } = estimate(buildPlan({ evidence }));
    expect(Number.isFinite(totals.meanM)).toBe(true);
    expect(notices.map(({ code }) => code)).toContain('reading-contradicts-gauge');
  });

  it('throws for a stitch that is not in the table', () => {
    const border = [{ stitch: 'zz', colour: 'c1' }];
    expect(() => estimate(buildPlan({ border }))).toThrow('got "zz"');
  });

  it('uses the quantile of the confidence asked for', () => {
    for (const confidence of [0.8, 0.9, 0.99] as const) {
      const { colours } = estimate(buildPlan({ confidence }));
      for (const { neededM, meanM, sdM } of colours) {
        close(neededM, meanM + normalQuantile(confidence) * sdM);
      }
    }
  });
});
