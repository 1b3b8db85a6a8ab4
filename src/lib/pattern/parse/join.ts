import type { AttachStep, JoinStep, Where } from '../syntax';
import { readColour } from './colour';
import type { ParseState } from './parseState';
import { readWheres } from './where';

/**
 * "join with sl st in top of beg ch-3", "join", "join to form ring", "sl st in first dc to join" closes;
 * "join B with sl st in any ch-2 sp", "attach yarn in corner" begins with a new yarn.
 */
export function readJoin(state: ParseState): JoinStep | AttachStep {
  const first = state.at;
  const attaches = /^(attach|rejoin)$/.test(state.peek().text);
  state.at += 1;
  if (state.isWord('round') || state.means('round')) state.at += 1;
  const colour = readColour(state);
  const unnamed = colour === null && /^(yarn|colour|color|new)$/.test(state.peek().text);
  while (unnamed && /^(yarn|colour|color|new)$/.test(state.peek().text)) state.at += 1;
  const namesYarn = colour !== null || unnamed;
  let code: string | null = null;
  if (state.take('with') || state.isWord('by')) {
    state.skipFillers();
    if (state.isWord('standing')) state.at += 1;
    const term = state.stitchHere();
    if (term) {
      code = term.code;
      state.at = term.next;
    }
  } else {
    const term = state.stitchHere();
    if (term) {
      code = term.code;
      state.at = term.next;
    }
  }
  const ring = takeToFormRing(state);
  const where = readTarget(state);
  const formsRing = ring || takeToFormRing(state);
  const span = state.spanFrom(first);
  if ((attaches || namesYarn || where[0]?.kind === 'any') && !formsRing) {
    return { kind: 'attach', code, colour, where, ...span };
  }
  return { kind: 'join', code: code ?? 'sl st', to: formsRing ? 'ring' : targetOf(where), ...span };
}

/** "in first dc", "to top of beg ch-3", "to first st". */
function readTarget(state: ParseState): Where[] {
  const start = state.at;
  if (state.take('to')) {
    // As "in": the place follows.
    state.at -= 1;
    const where = withIn(state);
    if (where.length > 0) return where;
    state.at = start;
    return [];
  }
  return readWheres(state);
}

/** Reads the places after "to" as if "in" stood there. */
function withIn(state: ParseState): Where[] {
  state.at += 1;
  return readWheres(state, true);
}

export function targetOf(where: readonly Where[]): JoinStep['to'] {
  const [first] = where;
  if (!first) return 'unsaid';
  if (first.kind === 'turning-chain') return 'turning-chain';
  return first.kind === 'ring' ? 'ring' : 'first';
}

/** "to form ring", "to form a ring", "forming a ring", "into a ring". */
export function takeToFormRing(state: ParseState): boolean {
  const start = state.at;
  state.takeMark(',');
  state.take('to');
  if (/^(form|make|forming|making)$/.test(state.peek().text)) state.at += 1;
  else if (!state.take('in')) {
    state.at = start;
    return false;
  }
  state.skipFillers();
  if (state.take('ring')) return true;
  state.at = start;
  return false;
}

/** "… in first dc to join", "… to close": the slip stitch closes the round. */
export function takeToJoin(state: ParseState): boolean {
  const start = state.at;
  if (state.take('to') && /^(join|close|finish)$/.test(state.peek().text)) {
    state.at += 1;
    if (state.means('round') || state.means('around')) state.at += 1;
    return true;
  }
  state.at = start;
  return false;
}
