import { describe, expect, it } from 'vitest';
import {
  countsInWords,
  fitSummary,
  joinFits,
  spacesInWords,
  workedTo,
} from '../../../src/components/motifs/motifWords';
import type { Motif } from '../../../src/lib/motifs/motif';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';

const motif = (key: string, rounds: number) => workedTo(readyMotif(key) as Motif, rounds);
const plain = (text: string) => text.replaceAll('\u00a0', ' ');

describe('countsInWords', () => {
  it('lists stitches from the shortest to the tallest, in the person’s terms', () => {
    const counts = { dc: 11, 'sl st': 1, ch: 11, tr: 0 };
    expect(plain(countsInWords(counts, 'us'))).toBe('1 sl st, 11 ch, 11 dc');
    expect(plain(countsInWords(counts, 'uk'))).toBe('1 ss, 11 ch, 11 tr');
  });

  it('says so when there are none', () => {
    expect(countsInWords({}, 'us')).toBe('none');
    expect(spacesInWords({})).toBe('none');
  });
});

describe('joinFits', () => {
  it('finds every ready-made join to fit a square of 15 stitches a side', () => {
    // Common practice, no source: n = 3 modulo 4 holds the groups of the laces; 15 is 4 × 3 + 3.
    const fits = joinFits(motif('group-square', 4), 'us');
    expect(fits.every(({ fits: each }) => each)).toBe(true);
    expect(fitSummary(fits)).toBe('Fits every join.');
  });

  it('puts those that fit first, and says of the others what would', () => {
    // 12 stitches a side: neither odd nor 3 modulo 4.
    const fits = joinFits(motif('circle-in-square', 4), 'us');
    const firstNot = fits.findIndex((each) => !each.fits);
    expect(firstNot).toBeGreaterThan(0);
    expect(fits.slice(firstNot).every((each) => !each.fits)).toBe(true);
    expect(fits.at(-1)?.words).toMatch(/^12 stitches a side do not fit/);
  });
});
