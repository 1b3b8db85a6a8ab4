import type { Reading, WorkedStitch } from '../../lib/pattern/reading';
import type { StitchRun } from '../../lib/chart/stitchRuns';
import type { ChartSymbol } from '../../lib/chart/symbol';
import { abbreviationOf } from '../../lib/stitches/ownStitch';
import { codeWord, type Terms } from '../planner/stitchWord';

const NB = '\u00a0';

/** Codes of places in the person's terms: "dc", "ch-2 space". */
export const placeWord = (code: string, terms: Terms): string =>
  /^ch-\d+$/.test(code) ? `${code}${NB}space` : codeWord(code, terms);

/** "Rnd 2, stitch 5 of 24: dc in ch-2 space, side 1" */
export function symbolInWords(symbol: ChartSymbol, reading: Reading, terms: Terms): string {
  const round = reading.rounds[symbol.round];
  const stitch = round?.stitches[symbol.stitch];
  if (!round || !stitch)
    return symbol.glyph.body === 'chain' ? 'Foundation: a chain' : 'Foundation: joined';
  const below = reading.rounds[symbol.round - 1]?.places ?? reading.ring.places;
  const { into } = stitch;
  const where =
    into.kind === 'place'
      ? ` ${into.gap ? 'between' : 'in'} ${placeWord(below[into.index]?.code ?? '', terms)}${into.gap ? ' and the next' : ''}`
      : isOnLast(stitch)
        ? ON_LAST
        : INTO[into.kind];
  const side = sideWords(stitch, reading.sides !== 0 && round.corner !== null);
  return `${round.label}, ${symbol.stitch + 1} of ${round.stitches.length}: ${codeWord(stitch.code, terms)}${where}${roleOf(stitch)}${side && `, ${side}`}`;
}

const INTO = {
  ring: ' in the ring',
  'round-start': ' in the first stitch',
  'own-chain': ' in its own chain',
  facing: ' in the motif beside it',
  none: '',
} as const;

const ROLE: Readonly<Record<WorkedStitch['role'], string>> = {
  stitch: '',
  standing: ', for the first stitch',
  turning: ', to reach the height',
  space: ', of a space',
  picot: ', of a picot',
  link: ', a link',
  travel: ', on the way',
  join: ', closes the round',
};

const ON_LAST = ' on the stitch before it';

/** A stitch of one's own that takes up none stands as a picot does, and is none. */
const isOnLast = ({ code, role }: Pick<WorkedStitch, 'code' | 'role'>): boolean =>
  role === 'picot' && abbreviationOf(code) !== code;

const roleOf = (stitch: Pick<WorkedStitch, 'code' | 'role'>): string =>
  isOnLast(stitch) ? '' : ROLE[stitch.role];

export const sideWords = (
  { side, corner }: Pick<WorkedStitch, 'side' | 'corner'>,
  hasSides: boolean,
): string => (!hasSides ? '' : corner === null ? `side ${side + 1}` : `corner ${corner + 1}`);

/** What a run of stitches is worked into: "ch-2 space, all in one", "dc, one in each". */
export function runInto(run: StitchRun, terms: Terms): string {
  const { into, count } = run;
  if (isOnLast(run)) return ON_LAST.trim();
  if (into.kind !== 'place' && into.kind !== 'gap')
    return INTO[into.kind].replace(/^ in /, '') || 'nothing';
  const each = count === 1 ? '' : into.inOne ? ', all in one' : ', one in each';
  const word = placeWord(into.code, terms);
  return (into.kind === 'gap' ? `between ${word} and the next` : word) + each;
}

export const runRole = (run: StitchRun): string => roleOf(run).replace(/^, /, '');
