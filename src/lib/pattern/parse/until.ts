import type { Until } from '../syntax';
import { isAmount, readAmount } from './amount';
import { readFilter } from './filter';
import { amountOf, type ParseState } from './parseState';

/** How far: "around", "across", "to end", "to corner", "to next ch-2 sp", "to last 2 sts". Null for none. */
export function readUntil(state: ParseState): Until | null {
  const start = state.at;
  let word: 'around' | 'across' | 'to end' = 'to end';
  let found = false;
  if (state.means('around') || state.means('across') || state.isWord('around')) {
    word = state.means('across') ? 'across' : 'around';
    state.at += 1;
    found = true;
    // "around the post" is a place, not a range.
    state.skipFillers();
    if (state.isWord('side') || state.means('row') || state.means('ring')) state.at += 1;
  }
  const further = readTo(state);
  if (further) return further;
  if (found) return { to: 'end', word };
  state.at = start;
  return null;
}

function readTo(state: ParseState): Until | null {
  const start = state.at;
  if (state.isWord('up')) state.at += 1;
  if (!state.take('to')) {
    state.at = start;
    return null;
  }
  state.skipFillers();
  if (state.take('end')) {
    if (state.take('of')) {
      state.skipFillers();
      if (state.means('round') || state.means('around') || state.means('row')) state.at += 1;
    }
    return { to: 'end', word: 'to end' };
  }
  const last = state.take('last');
  if (!last) state.take('next');
  if (last) return readLeft(state, start);
  const filter = readFilter(state);
  if (!filter) {
    state.at = start;
    return null;
  }
  if (filter.of === 'corner' || filter.of === 'corner-space') return { to: 'corner' };
  return { to: 'space', filter };
}

/** "to last 2 sts", "to last st". */
function readLeft(state: ParseState, start: number): Until | null {
  const amount = isAmount(state) ? readAmount(state) : amountOf(1);
  if (amount && readFilter(state)) {
    return { to: 'left', amount, before: takeBeforeCorner(state) ? 'corner' : 'end' };
  }
  state.at = start;
  return null;
}

/** "before corner", "before next corner sp". */
function takeBeforeCorner(state: ParseState): boolean {
  const start = state.at;
  if (state.isWord('before')) {
    state.at += 1;
    state.skipFillers();
    state.take('next');
    const filter = readFilter(state);
    if (filter?.of === 'corner' || filter?.of === 'corner-space') return true;
  }
  state.at = start;
  return false;
}
