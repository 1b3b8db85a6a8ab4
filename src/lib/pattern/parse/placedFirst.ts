import type { Step } from '../syntax';
import type { ParseState } from './parseState';
import { readBracket } from './bracket';
import { readInstruction } from './instruction';
import { readWheres } from './where';
import { amountOf } from './parseState';
import { closerOf } from './countNote';

/**
 * A place before its stitches: "In next ch-2 sp, (3 dc, ch 2, 3 dc)", "in ring: ch 3, 11 dc",
 * "working in back loops only". Null, with nothing read, where no place stands here.
 */
export function readPlacedFirst(state: ParseState): Step[] | null {
  const start = state.at;
  if (!state.means('in') && !state.means('each')) return null;
  const where = readWheres(state);
  if (where.length === 0) {
    if (takesLoops(state)) {
      state.insertion = state.insertionHere;
      return [];
    }
    state.at = start;
    return null;
  }
  if (where[0]?.kind === 'ring') return [];
  while (
    /^[,:]$/.test(state.peek().text) ||
    state.means('filler') ||
    state.peek().kind === 'line'
  ) {
    state.at += 1;
  }
  const parts = closerOf(state.peek().text) === null ? listed(state) : readBracket(state);
  if (parts.length === 0) {
    state.at = start;
    return null;
  }
  return [{ kind: 'group', parts, times: amountOf(1), where, ...state.spanFrom(start) }];
}

/** "2 dc, ch 2, 2 dc" without brackets: up to the end of the clause. */
function listed(state: ParseState): Step[] {
  const parts: Step[] = [];
  do parts.push(...readInstruction(state));
  while (
    state.takeMark(',') &&
    /^(word|number)$/.test(state.peek().kind) &&
    !state.means('repeat')
  );
  return parts;
}

/** "in BLO" with no place after it. */
function takesLoops(state: ParseState): boolean {
  state.at += 1;
  while (state.means('filler')) state.at += 1;
  const short = /^(bl|fl)o?$/.exec(state.peek().text)?.[1];
  const long = /^(back|front)$/.exec(state.peek().text)?.[1];
  if (!short && !(long && /^(loop|lp)s?$/.test(state.peek(1).text))) return false;
  state.insertionHere = (short ?? long ?? '').startsWith('b') ? 'BL' : 'FL';
  state.at += short ? 1 : 2;
  if (state.isWord('only')) state.at += 1;
  return true;
}
