import type { PlaceFilter } from '../syntax';
import { betweenWhat } from './between';
import { tellForeign } from './foreign';
import type { ParseState } from './parseState';

const filterOf = (
  of: PlaceFilter['of'],
  code: string | null = null,
  chains: number | null = null,
) => ({
  of,
  code,
  chains,
});

export const ANY_STITCH: PlaceFilter = filterOf('stitch');

/**
 * What kind of place stands here: "st", "dc", "ch-2 sp", "corner sp", "dc and ch-1 sp".
 * Null, with nothing read, where none does.
 */
export function readFilter(state: ParseState): PlaceFilter | null {
  const start = state.at;
  state.skipFillers();
  const corner = state.take('corner');
  const first = plainFilter(state);
  if (!first) {
    if (corner) return filterOf('corner');
    state.at = start;
    return null;
  }
  // "ch-2 corner sp", "ch-2 sp of corner"
  const ofCorner = corner || state.take('corner') || takeOfCorner(state);
  state.take('sp');
  if (ofCorner) return first.of === 'space' ? { ...first, of: 'corner-space' } : filterOf('corner');
  if (first.of === 'stitch') return withSpaces(state, first);
  takeWhose(state);
  return first;
}

/** Without any word of corners. */
function plainFilter(state: ParseState): PlaceFilter | null {
  if (state.take('sp')) return spaceOrGap(state);
  if (state.take('st')) return ANY_STITCH;
  if (state.isWord('ch') || state.isWord('chain') || state.isWord('chs')) return chainSpace(state);
  if (state.isWord('chsp') || state.isWord('chsps')) {
    state.at += 1;
    return filterOf('space');
  }
  if (isNumberedChain(state)) return numberedChain(state);
  const term = state.stitchHere();
  if (!term || term.code === 'ch') return null;
  tellForeign(state, term);
  state.at = term.next;
  if (state.means('st')) state.at += 1;
  return filterOf('stitch', term.code);
}

/** "sp" is one of chains, and "sp between dc" none. */
function spaceOrGap(state: ParseState): PlaceFilter {
  const gap = state.means('between') ? betweenWhat(state) : null;
  return gap?.filter ?? filterOf('space');
}

/** "ch-2 sp", "ch 2 sp", "ch-sp", "ch-3 loop", "ch-2 corner sp", "ch-2"; "chs" of a foundation. */
function chainSpace(state: ParseState): PlaceFilter {
  state.at += 1;
  const hyphen = state.isMark('-');
  if (hyphen) state.at += 1;
  if (state.peek().kind === 'number') {
    const chains = state.checked(state.peek().value, state.peek());
    state.at += 1;
    takeHyphen(state);
    if (!state.means('corner')) state.take('sp');
    return filterOf('space', null, chains);
  }
  if (state.means('corner') || state.take('sp')) return filterOf('space');
  return hyphen ? filterOf('space') : filterOf('stitch', 'ch');
}

/** Whether "2-ch sp" or "2ch sp" stands here, as UK patterns write it. */
export function isNumberedChain(state: ParseState): boolean {
  if (state.peek().kind !== 'number') return false;
  const ahead = state.isMark('-', 1) ? 2 : 1;
  if (!state.isWord('ch', ahead)) return state.isWord('chsp', ahead);
  const then = state.isMark('-', ahead + 1) ? ahead + 2 : ahead + 1;
  return state.means('sp', then) || state.means('corner', then);
}

function numberedChain(state: ParseState): PlaceFilter {
  const chains = state.checked(state.peek().value, state.peek());
  state.at += state.isMark('-', 1) ? 3 : 2;
  takeHyphen(state);
  if (!state.means('corner')) state.take('sp');
  return filterOf('space', null, chains);
}

/** The second hyphen of "ch-2-sp"; the dash of "ch-3 - 12 dc" begins a count. */
function takeHyphen(state: ParseState): void {
  if (state.isMark('-') && (state.means('sp', 1) || state.means('corner', 1))) state.at += 1;
}

/** "each dc and ch-1 sp", "each st and each sp": both kinds. */
function withSpaces(state: ParseState, first: PlaceFilter): PlaceFilter {
  const start = state.at;
  takeWhose(state);
  const afterWhose = state.at;
  if (state.take('and') || state.takeMark('&')) {
    state.take('in');
    state.take('each');
    const second = state.means('st') ? null : plainFilter(state);
    if (second?.of === 'space') return filterOf('stitch-or-space');
  }
  state.at = Math.max(start, afterWhose);
  return first;
}

/** "of corner", "at corner", "in corner" after the kind of a place. */
function takeOfCorner(state: ParseState): boolean {
  let ahead = 0;
  const preposition = state.means('of') || state.means('in') || state.isWord('at');
  if (!preposition) return false;
  ahead += 1;
  while (state.means('filler', ahead) || state.means('next', ahead) || state.means('each', ahead))
    ahead += 1;
  // "of 3-sc corner", "of 3-sc group"
  if (state.peek(ahead).kind === 'number' && state.isMark('-', ahead + 1)) ahead += 3;
  const found = state.means('corner', ahead) || state.isWord('group', ahead);
  if (found) state.at += ahead + 1;
  return found;
}

/** "of previous rnd", "of next shell", "made": words that only tell which round or stitch it is. */
function takeWhose(state: ParseState): void {
  const preposition = state.means('of') || state.means('from') || state.isWord('on');
  if (!preposition) return;
  let ahead = 1;
  while (state.means('filler', ahead)) ahead += 1;
  if (state.means('previous', ahead) || state.means('last', ahead)) ahead += 1;
  if (!state.means('round', ahead) && !state.means('around', ahead) && !state.means('row', ahead))
    return;
  state.at += ahead + 1;
  if (state.peek().kind === 'number') state.at += 1;
}
