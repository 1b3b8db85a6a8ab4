import { describe, expect, it } from 'vitest';
import { countedMotifs, madeYarn, type WeighedMotifs } from '../../../src/lib/motifs/madeYarn';
import type { Motif } from '../../../src/lib/motifs/motif';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';
import { lengthM, massG } from '../../../src/lib/units/quantities';
import { frozen } from '../../support/plans';

/** 50 sc: 100 loops. */
const hundredLoops: Motif = frozen({
  key: 'test',
  version: null,
  name: 'Test',
  sides: 4,
  ring: { chains: 0, made: {} },
  rounds: [
    {
      label: 'Rnd 1',
      made: { sc: 50 },
      travel: {},
      tally: { sc: 50 },
      spaces: {},
      cornerSpace: null,
      perSide: 12,
      height: 'sc',
    },
  ],
});
const metrePerGram = { massG: massG(100), lengthM: lengthM(100) };
const four: WeighedMotifs = { count: 4, massG: 17.6, resolutionG: 0.1, yarns: 1 };
const learn = (change: Partial<WeighedMotifs> = {}, motif = hundredLoops) =>
  madeYarn(motif, { ...four, ...change }, metrePerGram, 8);

describe('madeYarn', () => {
  it('gives its worked example', () => {
    const { readM, before, after, questioned } = learn();
    expect(readM).toBeCloseTo(4.4, 12);
    // 100 loops of 5.2 × 8 mm, and two tails of 0.15 m of which 0.75 stays
    expect(before.meanM).toBeCloseTo(4.16 + 0.225, 12);
    // 20 % of the hand and 5 % of the stitch
    expect(before.sdM).toBeCloseTo(4.16 * Math.hypot(0.2, 0.05), 12);
    // As by hand, of four: prior variance p; the scale 2 × 0.1²/12, the piece 2 %, four motifs 3 %
    const usualM = 4 * 4.385;
    const prior = (4 * before.sdM) ** 2;
    const noise = (2 * 0.01) / 12 + (0.02 * usualM) ** 2 + (0.03 * usualM) ** 2 / 4;
    const gain = prior / (prior + noise);
    expect(after.meanM).toBeCloseTo(4.385 + (gain * (17.6 - usualM)) / 4, 10);
    expect(after.sdM).toBeCloseTo(Math.sqrt(prior * (1 - gain)) / 4, 10);
    expect(
      [before, after].map(({ meanM, sdM }) => `${meanM.toFixed(3)} ${sdM.toFixed(3)}`),
    ).toEqual(['4.385 0.858', '4.400 0.109']);
    expect(questioned).toBe(false);
  });

  it('is surer of four motifs weighed together than of one', () => {
    expect(learn().after.sdM).toBeLessThan(learn({ count: 1, massG: 4.4 }).after.sdM);
  });

  it('knows that every yarn attached leaves two tails', () => {
    expect(learn({ yarns: 3 }).before.meanM).toBeCloseTo(4.16 + 3 * 0.225, 12);
  });

  it('counts the ring and every round', () => {
    const motif = readyMotif('group-square', 2) as Motif;
    const { before } = learn({}, motif);
    const loops =
      // ch 1, sl st 1, dc 4 (trade's moves), over all that the hook makes
      [motif.ring.made, ...motif.rounds.map(({ made }) => made)]
        .flatMap((made) => Object.entries(made))
        .reduce((sum, [code, count]) => sum + count * (code === 'dc' ? 4 : 1), 0);
    expect(before.meanM).toBeCloseTo(loops * 0.0416 + 0.225, 10);
  });

  it('questions a weight that no hand would take', () => {
    expect(learn({ massG: 40 }).questioned).toBe(true);
  });
});

describe('countedMotifs', () => {
  it('is all their stitches and tails under one name', () => {
    expect(countedMotifs(hundredLoops, { ...four, yarns: 2 })).toEqual({
      piece: 'counted',
      label: '4 × Test',
      made: { sc: 200 },
      tails: 16,
      reading: { by: 'weighing', massG: 17.6, resolutionG: 0.1 },
    });
  });
});
