import type { PlaceFilter, Until, Where } from '../syntax';
import { isAmount, readAmount } from './amount';
import { ANY_STITCH, readFilter } from './filter';
import { amountOf, type ParseState } from './parseState';
import { isTurningChain, readBeginning, readOrdinal } from './turningChain';
import { readUntil } from './until';

const TO_THE_END: Until = { to: 'end', word: 'around' };

/** What several stitches in one place are called: "3-dc groups". */
const GROUPS: ReadonlySet<string> = new Set(
  'group groups set sets shell shells fan fans block blocks'.split(' '),
);
const GAP: PlaceFilter = { of: 'gap', code: null, chains: null };
const BETWEEN_GROUPS: PlaceFilter = { of: 'gap-of-groups', code: null, chains: null };

interface Between {
  readonly filter: PlaceFilter;
  /** Which of them: "between each st", "between any 2 dc", "between the last 2 groups". */
  readonly which: 'next' | 'each' | 'any' | 'last';
}

/** "between next 2 dc", "between each st around", "between 3-dc groups". */
export function readBetween(state: ParseState): Where | null {
  const between = betweenWhat(state);
  if (!between) return null;
  const { filter, which } = between;
  if (which === 'any') return { kind: 'any', filter };
  if (which === 'each') return { kind: 'each', filter, until: readUntil(state) ?? TO_THE_END };
  return { kind: which, amount: amountOf(1), filter };
}

/** From "between" on: what kind of gap it is. Null, with nothing read, where it is none. */
export function betweenWhat(state: ParseState): Between | null {
  const start = state.at;
  state.take('between');
  const which = readWhich(state);
  const filter = readNeighbours(state);
  if (filter) return { filter, which };
  state.at = start;
  return null;
}

function readWhich(state: ParseState): Between['which'] {
  let which: Between['which'] = 'next';
  for (;;) {
    state.skipFillers();
    if (state.take('each')) which = 'each';
    else if (state.take('any')) which = 'any';
    else if (state.take('last')) which = 'last';
    else if (!state.take('next') && !state.take('of')) return which;
  }
}

/** "3-dc groups", "2 dc", "sts", "beg ch-3 and first dc", "first and second sts". */
function readNeighbours(state: ParseState): PlaceFilter | null {
  const start = state.at;
  if (isAmount(state) && !state.isMark('-', 1)) readAmount(state);
  if (readGroups(state)) return BETWEEN_GROUPS;
  state.at = start;
  if (readGroups(state)) return BETWEEN_GROUPS;
  if (isNeighbour(state)) {
    readNeighbour(state);
    if (state.take('and')) {
      state.skipFillers();
      state.take('next');
      readNeighbour(state);
    }
    return GAP;
  }
  if (isAmount(state)) readAmount(state);
  const filter = readFilter(state) ?? (state.at > start ? ANY_STITCH : null);
  return filter?.of === 'stitch' ? { ...GAP, code: filter.code } : null;
}

function readGroups(state: ParseState): boolean {
  const start = state.at;
  if (isAmount(state)) readAmount(state);
  state.takeMark('-');
  const term = state.stitchHere();
  if (term && !GROUPS.has(state.peek().text)) state.at = term.next;
  // "5-dc shells" is one term by its name.
  const named = term !== null && GROUPS.has(state.last().text);
  if (named || GROUPS.has(state.peek().text)) {
    if (!named) state.at += 1;
    return true;
  }
  state.at = start;
  return false;
}

const isNeighbour = (state: ParseState): boolean =>
  state.means('beginning') ||
  state.means('first') ||
  state.peek().kind === 'ordinal' ||
  isTurningChain(state);

function readNeighbour(state: ParseState): void {
  if (state.means('beginning') || isTurningChain(state)) readBeginning(state);
  else if (state.peek().kind === 'ordinal') readOrdinal(state);
  else {
    state.take('first');
    if (isAmount(state)) readAmount(state);
    readFilter(state);
  }
}
