import type { RoundText } from '../syntax';
import type { Span } from '../span';
import { readColour } from './colour';
import type { ParseState } from './parseState';

/** "Rnd 2 (RS):" as read. */
export interface Header {
  readonly kind: RoundText['kind'];
  readonly from: number;
  readonly to: number;
  readonly span: Span;
  readonly side: 'RS' | 'WS' | null;
  readonly colour: string | null;
}

/** Whether a round begins here: at the beginning of a line or sentence, or with a colon after it. */
export function isHeader(state: ParseState): boolean {
  const length = headerLength(state);
  if (length === 0) return isRepeatLine(state);
  if (state.at === 0) return true;
  const { kind, text } = state.last();
  if (kind === 'line') return true;
  const sentence = kind === 'mark' && /^[.)\];:]$/.test(text);
  return (
    (sentence && hasColon(state, length)) || (sentence && text === '.' && hasStop(state, length))
  );
}

/** "Rep Rnd 2 two more times." on a line of its own: rounds that have no header. */
export const isRepeatLine = (state: ParseState): boolean =>
  state.at > 0 &&
  state.last().kind === 'line' &&
  state.means('repeat') &&
  [1, 2, 3, 4].some((ahead) => state.means('round', ahead) || state.means('row', ahead));

/** Tokens of "Rnd 1", "Rnds 3-5", "1st Rnd", "Next rnd", "R4"; 0 where none of them stands. */
function headerLength(state: ParseState): number {
  const ordinal = state.peek().kind === 'ordinal';
  if (ordinal || state.means('next') || state.means('last') || state.means('first')) {
    const word = state.peek(1).text;
    const found =
      /^(rnd|round|rd|row)$/.test(word) &&
      (ordinal || state.isMark(':', 2) || state.isMark('(', 2));
    return found ? 2 : 0;
  }
  const letter = state.isWord('r') && state.peek(1).kind === 'number';
  if (!letter && !state.means('round') && !state.means('row')) return 0;
  if (state.peek(1).kind !== 'number') return 0;
  if (letter && !state.isMark(':', 2) && !state.isMark('.', 2) && !state.isMark('(', 2)) return 0;
  const range =
    state.isMark('-', 2) || state.means('to', 2) || state.means('and', 2) || state.isMark('&', 2);
  return range && state.peek(3).kind === 'number' && !state.stitchHere(4) ? 4 : 2;
}

function hasColon(state: ParseState, length: number): boolean {
  let ahead = length;
  if (state.isMark('(', ahead)) {
    while (ahead < length + 8 && !state.isMark(')', ahead) && state.peek(ahead).kind !== 'end')
      ahead += 1;
    ahead += 1;
  }
  return state.isMark(':', ahead);
}

const hasStop = (state: ParseState, length: number): boolean =>
  state.isMark('.', length) || state.isMark('-', length) || state.peek(length).text === 'with';

/** Reads a header; `previous` is the number of the round before. */
export function readHeader(state: ParseState, previous: number): Header {
  const first = state.at;
  const length = headerLength(state);
  const kind = state.means('row') || state.means('row', 1) ? 'row' : 'round';
  const numbers = [0, 1, 3].map((ahead) => state.peek(ahead));
  const [zeroth, one, three] = numbers;
  const from =
    zeroth?.kind === 'ordinal' ? zeroth.value : one?.kind === 'number' ? one.value : previous + 1;
  const to = length === 4 && three?.kind === 'number' ? three.value : from;
  state.at += length;
  const span = state.spanFrom(first);
  const { side, colour } = readAside(state);
  if (!state.takeMark(':')) if (!state.takeMark('.')) state.takeMark('-');
  return { kind, from, to, span, side, colour };
}

/** "(RS)", "(WS, with B)", "(colour C)" after the number. */
function readAside(state: ParseState): Pick<Header, 'side' | 'colour'> {
  const start = state.at;
  const bracket = state.takeMark('(');
  let side: Header['side'] = null;
  let colour: string | null = null;
  if (state.isWord('rs') || state.isWord('ws')) {
    side = state.isWord('rs') ? 'RS' : 'WS';
    state.at += 1;
  } else if (/^(right|wrong)$/.test(state.peek().text) && state.isWord('side', 1)) {
    side = state.isWord('right') ? 'RS' : 'WS';
    state.at += 2;
  }
  if (side && state.isWord('facing')) state.at += 1;
  state.takeMark(',');
  const named = state.take('with') || bracket;
  if (named && !state.isMark(')')) colour = readColour(state);
  if (bracket && state.takeMark(')')) return { side, colour };
  if (!bracket && (side || colour)) return { side, colour };
  state.at = start;
  return { side: null, colour: null };
}
