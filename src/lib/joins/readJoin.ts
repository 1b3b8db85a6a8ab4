import { readPattern } from '../pattern/readPattern';
import type { WorkedRound, WorkedStitch } from '../pattern/reading';
import { addCounts, scaleCounts } from '../stitches/counts';
import type { StitchCounts } from '../stitches/stitch';
import type { Fit } from './join';
import type { JoinText } from './joinTexts';

/** A join as its text works out, on any side that it fits. */
export interface JoinReading {
  readonly fit: Fit;
  readonly rounds: number;
  /** Made along one side of n stitches; of a seam, along the whole of it. */
  readonly onSide: (n: number) => StitchCounts;
  /** Made at one corner. */
  readonly atCorner: StitchCounts;
  /** Links along one side of n stitches, where it links; 0 for a seam. */
  readonly linksOnSide: (n: number) => number;
}

/** Sides that a text is tried on. */
const SIDES = Array.from({ length: 36 }, (_, i) => i + 5);
const CORNERS = 4;

/**
 * Works the text of a join on sides of 5 to 40 stitches and finds which of them it fits. Null where
 * it fits none, or not at regular steps.
 *
 * Example: of the flat braid, odd sides: 8 sc and 35 ch on 15, and 7 ch at a corner.
 */
export function readJoin(join: JoinText): JoinReading | null {
  const even = SIDES.filter((n) => worked(join, n, join.text) !== null);
  const [first, second] = even;
  if (first === undefined || second === undefined) return null;
  const multipleOf = second - first;
  if (even.some((n, i) => n !== first + i * multipleOf)) return null;
  const sample = worked(join, first, join.text) ?? [];
  return {
    fit: { multipleOf, plus: first % multipleOf },
    rounds: join.worked === 'seam' ? 0 : sample.length,
    onSide: (n) => along(join, worked(join, n, join.text) ?? []),
    atCorner: cornersOf(sample),
    linksOnSide: (n) => linksOf(join, n),
  };
}

/** The rounds that a text adds to a square of n stitches a side; null where they do not come out. */
function worked({ worked: how }: JoinText, n: number, text: string): WorkedRound[] | null {
  const edge =
    how === 'seam'
      ? `Ch ${n}.\nRow 1: Sc in each ch across, turn.\nRow 2: `
      : `Ch ${CORNERS * n}.\nRnd 1: Ch 1, *sc in next ${n} ch, ch 2; rep from * 3 more times; join with sl st in first sc.\n`;
  const numbered = text.replace(/Rnd (\d+)/g, (_, number: string) => `Rnd ${Number(number) + 1}`);
  const reading = readPattern(edge + numbered, { terms: 'us', sides: how === 'seam' ? 0 : 4 });
  const isWrong = reading.diagnostics.some(({ severity }) => severity !== 'note');
  return isWrong || reading.rounds.length < 2 ? null : reading.rounds.slice(1);
}

/** Neither the chain that begins a round nor the stitch that closes it: once for each motif, not each side. */
const counts = ({ role }: WorkedStitch): boolean => role !== 'turning' && role !== 'join';

const countOf = (stitches: readonly WorkedStitch[]): StitchCounts =>
  stitches.reduce<StitchCounts>((sum, { code }) => addCounts(sum, { [code]: 1 }), {});

function along(join: JoinText, rounds: readonly WorkedRound[]): StitchCounts {
  const made = rounds.flatMap(({ stitches }) =>
    stitches.filter((stitch) => counts(stitch) && stitch.corner === null),
  );
  return scaleCounts(countOf(made), join.worked === 'seam' ? 1 : 1 / CORNERS);
}

const cornersOf = (rounds: readonly WorkedRound[]): StitchCounts =>
  scaleCounts(
    countOf(
      rounds.flatMap(({ stitches }) =>
        stitches.filter((stitch) => counts(stitch) && stitch.corner !== null),
      ),
    ),
    1 / CORNERS,
  );

function linksOf(join: JoinText, n: number): number {
  if (join.linked === null) return 0;
  const before = join.text.split('\n').slice(0, -1);
  const text = [...before, `Rnd ${before.length + 1}: ${join.linked}`].join('\n');
  const stitches = worked(join, n, text)?.at(-1)?.stitches ?? [];
  // A link stands where the chain before it stands: at a corner or along a side.
  const links = stitches.filter(
    ({ role }, i) => role === 'link' && (stitches[i - 1]?.corner ?? null) === null,
  );
  return links.length / CORNERS;
}
