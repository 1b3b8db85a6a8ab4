import type { CountNote } from '../syntax';
import { isAmount } from './amount';
import { readCountEntries } from './countEntries';
import { isHeader } from './header';
import type { ParseState } from './parseState';

/** Words that a count begins with: "You will have 12 dc", "Stitch count: 12". */
const LEADS: ReadonlySet<string> = new Set('total you there stitch stitches sts count'.split(' '));

/** The bracket that closes this one, or null. */
export const closerOf = (open: string): string | null =>
  open === '(' ? ')' : open === '[' ? ']' : open === '{' ? '}' : null;

/** Counts are set in more kinds of brackets than groups: "<12>", "*12 dc*", in quotes. */
const noteCloserOf = (open: string): string | null =>
  open === '<' ? '>' : /^(\*\*?|")$/.test(open) ? open : closerOf(open);

/**
 * A count of what a round makes, in brackets or after a dash at its end: "(12 dc, 4 ch-2 sps)",
 * "[16 sts]", "— 48 dc", "= 48 dc", "Total: 48 dc"; and a sentence of its own, "48 dc.", where `bare`
 * says that one may stand here. Null, with nothing read, where it is something else.
 */
export function readCountNote(state: ParseState, bare: 'no' | 'at-end' | 'yes'): CountNote | null {
  const start = state.at;
  const close = noteCloserOf(state.peek().text);
  if (close !== null) state.at += 1;
  const dashed = takeDashes(state);
  const isBare = close === null && !dashed;
  if (isBare && (bare === 'no' || !beginsBare(state))) return null;
  const entries = readCountEntries(state, close);
  takeDashes(state);
  const whole =
    entries !== null &&
    (close === null ? endsSentence(state) : state.takeMark(close) && ends(state));
  if (whole && (!isBare || bare === 'yes' || endsRound(state)))
    return { entries, ...state.spanFrom(start) };
  state.at = start;
  return null;
}

const beginsBare = (state: ParseState): boolean => isAmount(state) || LEADS.has(state.peek().text);

function takeDashes(state: ParseState): boolean {
  const start = state.at;
  while (state.peek().kind === 'mark' && /^[-=:~|/]$/.test(state.peek().text)) state.at += 1;
  return state.at > start;
}

/** After a bracket the join may still follow: "(12 sc), join". */
function ends(state: ParseState): boolean {
  const separated = state.isMark(',') || state.isMark(';');
  const then = separated ? 1 : 0;
  const finishes = state.means('join', then) || state.means('turn', then);
  return (
    (separated && (finishes || state.isWord('sl', 1) || state.isWord('ss', 1))) ||
    endsSentence(state)
  );
}

function endsSentence(state: ParseState): boolean {
  const { kind } = state.peek();
  return (
    kind === 'end' ||
    kind === 'line' ||
    state.isMark('.') ||
    state.isMark('[') ||
    state.means('turn') ||
    state.isWord('fasten') ||
    state.means('round') ||
    state.means('row') ||
    (state.isMark(';') && state.peek(1).kind === 'line')
  );
}

/** Whether nothing of the round comes after: a number of stitches there is a count and no instruction. */
function endsRound(state: ParseState): boolean {
  const start = state.at;
  while (state.isMark('.') || state.peek().kind === 'line') state.at += 1;
  const found =
    state.peek().kind === 'end' ||
    isHeader(state) ||
    state.means('turn') ||
    state.isWord('fasten') ||
    state.means('join');
  state.at = start;
  return found;
}
