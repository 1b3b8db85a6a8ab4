import type { Step } from '../syntax';
import { isKnown } from './comment';
import { correctWord } from './correct';
import { readInstruction } from './instruction';
import { TOLD_WORDS } from '../terms/words';
import type { ParseState } from './parseState';

/**
 * What no rule reads. A slip of a known word is told and read as that word; a number or an abbreviation
 * that nobody knows is told and left out; plain words are stepped over as a remark.
 */
export function readUnknown(state: ParseState, first: number): Step[] {
  const token = state.peek();
  const afterNumber = state.at > first && state.last().kind === 'number';
  const isTold = TOLD_WORDS.has(token.text);
  const looksWorked = !isTold && (afterNumber || followedByPlace(state));
  if (!isTold && (looksWorked || token.text.length <= 6) && correctWord(state)) {
    state.at = first;
    return readInstruction(state);
  }
  const isWord = token.kind === 'word';
  if (isWord && !isKnown(state, state.at) && !looksWorked) {
    const message = 'These words are read as a remark and not worked.';
    state.report.say('note', 'not-understood', skipped(state, state.at), message);
    return [];
  }
  if (isWord && !isKnown(state, state.at)) {
    const message = `"${token.written}" is not an abbreviation this reader knows.`;
    state.error('unknown-word', token, message);
  } else if (afterNumber) {
    const message = `"${state.last().written}" of what? A stitch is missing after the number.`;
    state.error('not-understood', state.last(), message);
  } else {
    const message = `It is not clear what "${token.written}" means here.`;
    state.report.say(isWord ? 'warning' : 'error', 'not-understood', token, message);
  }
  skipped(state, state.at);
  return [];
}

/** "… in next st", "… around": what stands here was meant to be a stitch. */
const followedByPlace = (state: ParseState): boolean =>
  (state.means('in', 1) || state.means('each', 1) || state.means('next', 1)) &&
  state.peek().text.length <= 8;

/** Steps over the rest of the clause. */
function skipped(state: ParseState, first: number): { begin: number; end: number } {
  while (!/^(mark|line|end)$/.test(state.peek().kind)) state.at += 1;
  if (state.at === first && state.peek().kind === 'mark' && !/^[()[\]{}*]/.test(state.peek().text))
    state.at += 1;
  return state.spanFrom(first);
}
