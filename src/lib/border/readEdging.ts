import type { Diagnostic, Fix } from '../pattern/diagnostic';
import { readPattern } from '../pattern/readPattern';
import type { Terms, WorkedRound } from '../pattern/reading';
import type { Span } from '../pattern/span';
import type { OwnStitch } from '../stitches/ownStitch';
import type { StitchCounts } from '../stitches/stitch';
import type { Edging } from './edging';

/** What is wrong at a place of the text. */
export interface EdgingProblem extends Span {
  readonly message: string;
  readonly fix?: Fix;
}

/** A round of border as read: what it makes of an edge, or why it makes nothing of any. */
export interface EdgingReading {
  readonly edging: Omit<Edging, 'name'> | null;
  readonly problems: readonly EdgingProblem[];
  /** What is wrong with the whole of it, in words. */
  readonly problem: string | null;
}

export interface EdgingOptions {
  readonly terms: Terms;
  readonly ownStitches?: readonly OwnStitch[];
}

/** Longest edge that a text is tried on: repeats of up to a third of it are found. */
const LONGEST_EDGE = 72;

const HEADER = /^\s*(?:rnd|round)s?\b\s*\d*\s*[:.]?\s*/i;
const EDGE = {
  us: (n: number) => `Ch ${n}.\nRnd 1: Sc in each ch around; join with sl st in first sc.\nRnd 2: `,
  uk: (n: number) => `Ch ${n}.\nRnd 1: Dc in each ch around; join with ss in first dc.\nRnd 2: `,
} as const;

/**
 * Works one round of border on closed edges of 1, 2, 3 … stitches and finds from where it comes out
 * even what it is a multiple of, and what each repeat makes. Never throws for any text.
 *
 * Example: "Ch 1, *sc in next st, ch 5, sk 3 sts; rep from * around; join with sl st in first sc." is
 * a multiple of 4, and makes { sc: 1, ch: 5 } in each.
 */
export function readEdging(text: string, options: EdgingOptions): EdgingReading {
  const body = text.replace(HEADER, '');
  if (body.trim() === '') return { edging: null, problems: [], problem: 'Write the round first.' };
  const tried = Array.from({ length: LONGEST_EDGE }, (_, i) => tryOn(i + 1, text, body, options));
  const even = tried.flatMap(({ round }, i) => (round ? [{ n: i + 1, round }] : []));
  const [last, second, third] = [even.at(-1), even.at(-2), even.at(-3)];
  if (!last) return withoutEdging(tried);
  if (topOf(last.round) === 0) return problem('It makes no stitch.');
  if (tried.some(({ rounds }) => rounds > 2))
    return problem('One round at a time: add each round of the border on its own.');
  if (!second || !third)
    return problem(`No repeat was found in it on edges of up to ${LONGEST_EDGE} stitches.`);
  const multipleOf = last.n - second.n;
  const perRepeat = countsLess(last.round.made, second.round.made);
  if (second.n - third.n !== multipleOf || !perRepeat)
    return problem('It does not repeat in the same way all round.');
  let first = even.length - 1;
  while (first > 0 && (even[first]?.n ?? 0) - (even[first - 1]?.n ?? 0) === multipleOf) first -= 1;
  const { n: least, round } = even[first] ?? last;
  return {
    edging: {
      text: text.trim(),
      terms: options.terms,
      over: { least, multipleOf },
      made: { least: round.made, perRepeat },
      top: { least: topOf(round), perRepeat: topOf(last.round) - topOf(second.round) },
      height: last.round.height,
    },
    problems: [],
    problem: null,
  };
}

const problem = (words: string): EdgingReading => ({
  edging: null,
  problems: [],
  problem: words,
});

interface Trial {
  readonly round: WorkedRound | null;
  readonly rounds: number;
  readonly problems: readonly EdgingProblem[];
}

function tryOn(n: number, text: string, body: string, options: EdgingOptions): Trial {
  const edge = EDGE[options.terms](n);
  const shift = text.length - body.length - edge.length;
  const { rounds, diagnostics } = readPattern(edge + body, { ...options, sides: 0 });
  // A bracketed count is of one blanket only.
  const wrong = diagnostics.filter(
    ({ severity, code }) => severity !== 'note' && code !== 'count-note',
  );
  const round = rounds.length === 2 && wrong.length === 0 ? (rounds[1] as WorkedRound) : null;
  return { round, rounds: rounds.length, problems: wrong.map((each) => shifted(each, shift)) };
}

const shifted = ({ begin, end, message, fix }: Diagnostic, by: number): EdgingProblem => ({
  begin: Math.max(0, begin + by),
  end: Math.max(0, end + by),
  message,
  ...(fix && { fix: { ...fix, begin: fix.begin + by, end: fix.end + by } }),
});

/** The edge on which least went wrong says best what is wrong with the text itself. */
function withoutEdging(tried: readonly Trial[]): EdgingReading {
  const several = tried.some(({ rounds }) => rounds > 2);
  if (several) return problem('One round at a time: add each round of the border on its own.');
  const [best] = tried.toSorted((a, b) => a.problems.length - b.problems.length);
  return {
    edging: null,
    problems: best?.problems ?? [],
    problem: `It comes out even on no edge of up to ${LONGEST_EDGE} stitches.`,
  };
}

/** Null where a longer edge takes less of a stitch. */
function countsLess(more: StitchCounts, less: StitchCounts): StitchCounts | null {
  const entries = Object.entries(more).map(([code, n]) => [code, n - (less[code] ?? 0)] as const);
  if (entries.some(([, n]) => n < 0) || Object.keys(less).some((code) => !(code in more)))
    return null;
  return Object.fromEntries(entries.filter(([, n]) => n > 0));
}

const topOf = ({ places }: WorkedRound): number =>
  places.reduce((sum, { kind, chains }) => sum + (kind === 'stitch' ? 1 : chains), 0);
