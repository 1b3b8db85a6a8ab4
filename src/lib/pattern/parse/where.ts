import type { Where } from '../syntax';
import { correctWord } from './correct';
import { readLoops, takePost } from './insertion';
import { placeNamed } from './namedPlace';
import type { ParseState } from './parseState';

/**
 * Where stitches are worked, all the places that are named one after another:
 * "in next 2 dc and in next ch-2 sp" is two. Empty where none is named.
 */
export function readWheres(state: ParseState, afterPreposition = false): Where[] {
  const wheres: Where[] = [];
  for (;;) {
    const start = state.at;
    state.skipLines();
    if (wheres.length > 0 && !takeAnd(state)) {
      state.at = start;
      return wheres;
    }
    const where = readWhere(state, afterPreposition || wheres.length > 0);
    if (!where) {
      state.at = start;
      return wheres;
    }
    wheres.push(where);
  }
}

function takeAnd(state: ParseState): boolean {
  state.takeMark(',');
  state.skipLines();
  return state.take('and') || state.takeMark('&');
}

/** One place; `bare` where "in" may be left out, after "and" or "to". */
function readWhere(state: ParseState, bare: boolean): Where | null {
  const start = state.at;
  const preposition = state.take('in') || state.take('around') || state.take('across') || bare;
  state.skipLines();
  readLoops(state);
  takePost(state);
  state.skipFillers();
  if (preposition) correctWord(state);
  const where = preposition ? placeNamed(state, preposition) : bareEach(state);
  if (!where) state.at = start;
  return where;
}

/** "each" and "next" may stand without "in": "dc next st", "sc each st around". */
const bareEach = (state: ParseState): Where | null =>
  /^(each|next|same|between)$/.test(state.meaningHere() ?? '') ? placeNamed(state, false) : null;
