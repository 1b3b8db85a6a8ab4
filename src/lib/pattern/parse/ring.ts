import type { Where } from '../syntax';
import type { ParseState } from './parseState';

/** Names of a ring of thread that is drawn closed: "magic circle", "adjustable ring", "sliding loop". */
const DRAWN: ReadonlySet<string> = new Set(['magic', 'adjustable', 'sliding', 'slip']);
const LOOP: ReadonlySet<string> = new Set(['loop', 'loops', 'lp']);

/** Tokens of the ring that is named here, "ring", "centre of ring", "magic circle", "mr"; 0 for none. */
export function ringLength(state: ParseState): number {
  if (isLetters(state)) return 1;
  let ahead = 0;
  if (state.means('middle')) ahead += 1;
  if (ahead > 0 && state.means('of', ahead)) ahead += 1;
  while (ahead > 0 && state.means('filler', ahead)) ahead += 1;
  const drawnAt = ahead;
  while (DRAWN.has(state.peek(ahead).text)) ahead += 1;
  const isLoop = ahead > drawnAt && LOOP.has(state.peek(ahead).text);
  return state.means('ring', ahead) || isLoop ? ahead + 1 : 0;
}

/** Whether the ring that is named here is one that is made by naming it. */
export const isMagic = (state: ParseState): boolean =>
  ringLength(state) > 0 && (isLetters(state) || DRAWN.has(state.peek().text));

const isLetters = (state: ParseState): boolean => state.isWord('mr') || state.isWord('mc');

export function readRing(state: ParseState): Where {
  const magic = isMagic(state);
  state.at += ringLength(state);
  return { kind: 'ring', magic };
}
