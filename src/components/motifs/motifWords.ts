import { joinFit } from '../../lib/joins/fit';
import type { Join } from '../../lib/joins/join';
import { READY_JOINS } from '../../lib/joins/readyJoins';
import { joinStitches } from '../../lib/ledger/pieces';
import type { Motif, MotifSides } from '../../lib/motifs/motif';
import { EXAMPLE_PLAN } from '../../lib/plan/examplePlan';
import { stitch } from '../../lib/stitches/stitchTable';
import type { StitchCounts } from '../../lib/stitches/stitch';
import { codeWord, type Terms } from '../planner/stitchWord';

export const SHAPE_WORDS: Record<MotifSides, string> = {
  0: 'circle',
  3: 'triangle',
  4: 'square',
  6: 'hexagon',
  8: 'octagon',
};

/** How the size of a shape is measured. */
export const acrossWord = (sides: MotifSides): string =>
  sides === 0 ? 'across' : sides === 4 ? 'a side' : sides % 2 === 0 ? 'flat to flat' : 'tall';

/** Colours that motifs are drawn in, round after round. */
const DRAWN_IN = ['c2', 'c3', 'c4', 'c5', 'c1'];

export const roundHexes = (motif: Motif): string[] =>
  motif.rounds.map((_, i) => {
    const key = DRAWN_IN[i % DRAWN_IN.length];
    return EXAMPLE_PLAN.colours.find((colour) => colour.key === key)?.hex ?? '#888888';
  });

/** The first rounds of a motif. */
export const workedTo = (motif: Motif, rounds: number): Motif => ({
  ...motif,
  rounds: motif.rounds.slice(0, rounds),
});

/** "16 dc, 4 tr", tallest stitch last; nothing is "none". */
export function countsInWords(counts: StitchCounts, terms: Terms): string {
  const height = (code: string) => stitch(code)?.heightOverWidth ?? 0;
  return (
    Object.entries(counts)
      .filter(([, count]) => count > 0)
      .sort(([left], [right]) => height(left) - height(right))
      .map(([code, count]) => `${count}\u00a0${codeWord(code, terms)}`)
      .join(', ') || 'none'
  );
}

/** "4 ch-2, 12 ch-1" */
export const spacesInWords = (spaces: Readonly<Record<string, number>>): string =>
  Object.entries(spaces)
    .map(([kind, count]) => `${count}\u00a0${kind}`)
    .join(', ') || 'none';

export interface JoinFit {
  join: Join;
  fits: boolean;
  /** Why, and what would make it fit. */
  words: string;
}

/** Each ready-made join against the side of a motif, those that fit first. */
export function joinFits(motif: Motif, terms: Terms): JoinFit[] {
  const stitches = joinStitches(motif);
  return READY_JOINS.map((join) => {
    const { fits, words } = joinFit(join, motif, stitches);
    // The sentence names the one stitch that helps, in US terms.
    return { join, fits, words: words.replace(/\bsc\b/g, codeWord('sc', terms)) };
  }).sort((left, right) => Number(right.fits) - Number(left.fits));
}

/** "Fits every join.", or which it does not. */
export function fitSummary(fits: readonly JoinFit[]): string {
  const not = fits.filter((fit) => !fit.fits).map(({ join }) => join.name.toLowerCase());
  if (not.length === 0) return 'Fits every join.';
  return not.length <= 3
    ? `Fits every join but ${not.join(', ')}.`
    : `Fits ${fits.length - not.length} of ${fits.length} joins.`;
}
