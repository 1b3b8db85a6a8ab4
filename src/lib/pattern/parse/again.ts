import type { RoundsAgain } from '../syntax';
import { isAmount, readAmount } from './amount';
import type { ParseState } from './parseState';
import { readHowMany } from './times';

export interface Again extends RoundsAgain {
  /** How often, of "rep Rnd 3 four more times"; 1 where nothing is said. */
  readonly times: number;
}

/** "Rep Rnd 2", "as Rnd 2", "same as Rnds 2 and 3", "rep last rnd", "rep Rnd 3 four more times". */
export function readAgain(state: ParseState, previous: number): Again | null {
  const first = state.at;
  state.skipFillers();
  const asRound = state.take('repeat') || takeAs(state);
  if (!asRound) {
    state.at = first;
    return null;
  }
  state.skipFillers();
  const rounds =
    state.means('last') || state.means('previous') ? lastRounds(state, previous) : numbered(state);
  if (!rounds) {
    state.at = first;
    return null;
  }
  return { ...rounds, times: readHowOften(state), ...state.spanFrom(first) };
}

function takeAs(state: ParseState): boolean {
  const start = state.at;
  state.take('same');
  const found = state.isWord('as');
  if (found) state.at += 1;
  if (state.isWord('for')) state.at += 1;
  if (!found) state.at = start;
  return found;
}

function lastRounds(state: ParseState, previous: number): { from: number; to: number } | null {
  state.at += 1;
  const count = isAmount(state) ? (readAmount(state)?.value ?? 1) : 1;
  if (!state.means('round') && !state.means('row')) return null;
  state.at += 1;
  return { from: Math.max(1, previous - count + 1), to: previous };
}

function numbered(state: ParseState): { from: number; to: number } | null {
  if (!state.take('round') && !state.take('row')) return null;
  if (state.peek().kind !== 'number') return null;
  const from = state.peek().value;
  state.at += 1;
  const range = state.isMark('-') || state.means('to') || state.means('and') || state.isMark('&');
  if (!range || state.peek(1).kind !== 'number') return { from, to: from };
  const to = state.peek(1).value;
  state.at += 2;
  return { from, to };
}

/** How often, of "rep Rnd 3 four more times"; 1 where nothing is said. */
const readHowOften = (state: ParseState): number => readHowMany(state)?.value ?? 1;
