import {
  usualHeightOverWidth,
  type OwnStitch,
  type SymbolBody,
} from '../../../lib/stitches/ownStitch';
import { loopsOf } from '../../../lib/stitches/loops';
import { movesInWords } from '../../../lib/stitches/movesInWords';
import type { Moves } from '../../../lib/stitches/stitch';
import { BASIC_STITCHES, stitch } from '../../../lib/stitches/stitchTable';
import { stitchWord, type Terms } from '../../planner/stitchWord';
import { countInWords } from '../../ui/inWords';
import type { Wording } from '../form/differences';

const widths = new Intl.NumberFormat('en', { maximumFractionDigits: 2 });
const NB = '\u00a0';

/** "5 loops, about 2.15 stitch widths tall". */
export function movesComeTo(moves: Moves, heightOverWidth: number | null): string {
  const loops = loopsOf(moves);
  const tall = widths.format(heightOverWidth ?? usualHeightOverWidth(moves));
  const about = heightOverWidth === null ? 'about ' : '';
  return `${loops}${NB}${loops === 1 ? 'loop' : 'loops'}, ${about}${tall}${NB}stitch widths tall`;
}

/** A likeness is of no help where more moves than these differ. */
const MOST_APART = 4;
const LEGS = [2, 3, 4, 5, 6];

/** "like dc, with one through more"; null where no known stitch is near. */
export function likeness(moves: Moves, terms: Terms): string | null {
  const [nearest] = [...KNOWN].sort((a, b) => apart(a, moves) - apart(b, moves));
  if (!nearest || apart(nearest, moves) > MOST_APART) return null;
  const word = stitchWord(nearest, terms);
  const parts = (['wraps', 'draws', 'throughs'] as const).flatMap((move) => {
    const more = moves[move] - nearest[move];
    if (more === 0) return [];
    const noun = Math.abs(more) === 1 ? move.slice(0, -1) : move;
    return [`${countInWords(Math.abs(more))} ${noun} ${more > 0 ? 'more' : 'fewer'}`];
  });
  return parts.length === 0 ? `the moves of ${word}` : `like ${word}, with ${parts.join(' and ')}`;
}

/** What a stitch may be like, the commonest first. */
const KNOWN = [
  ...BASIC_STITCHES.filter(({ us }) => !us.startsWith('extended')),
  ...['hdc', 'dc', 'tr'].flatMap((code) => LEGS.flatMap((n) => stitch(`${code}${n}tog`) ?? [])),
  ...BASIC_STITCHES.filter(({ us }) => us.startsWith('extended')),
];

const apart = (a: Moves, b: Moves): number =>
  Math.abs(a.wraps - b.wraps) + Math.abs(a.draws - b.draws) + Math.abs(a.throughs - b.throughs);

/** "takes up no stitch", "takes up 2 stitches"; nothing for the usual one. */
export function takesInWords(takes: number): string | null {
  if (takes === 1) return null;
  return takes === 0 ? 'takes up no stitch' : `takes up ${takes} stitches`;
}

export const BODY_WORDS: Readonly<Record<SymbolBody, string>> = {
  chain: 'oval',
  dot: 'dot',
  cross: 'cross',
  legs: 'stems',
  popcorn: 'popcorn',
  puff: 'puff',
  picot: 'picot',
};

function symbolInWords(symbol: OwnStitch['symbol']): string {
  if (!symbol) return 'by its moves';
  const { body, legs, bars } = symbol;
  if (body === 'picot') return `picot of ${legs}`;
  if (body === 'chain' || body === 'dot' || body === 'cross') return BODY_WORDS[body];
  return `${BODY_WORDS[body]}: ${legs}, with ${bars} strokes each`;
}

export const stitchWording: Wording<OwnStitch> = [
  ['Abbreviation', ({ abbreviation }) => abbreviation],
  ['Name', ({ name }) => name],
  ['Moves', ({ moves }) => movesInWords(moves)],
  [
    'Height',
    ({ heightOverWidth }) =>
      heightOverWidth === null ? 'by its moves' : `${widths.format(heightOverWidth)} stitch widths`,
  ],
  ['Takes up', ({ takes }) => `${takes}`],
  ['Symbol', ({ symbol }) => symbolInWords(symbol)],
];
