import { isKnown, nearestKnown } from './comment';
import type { ParseState } from './parseState';

/**
 * A word that is a slip of a known one is told, with the known one, and read as if that stood there, so
 * that one slip is one problem. False, with nothing told, where the word is known or nothing is near.
 */
export function correctWord(state: ParseState): boolean {
  const token = state.peek();
  if (token.kind !== 'word' || isKnown(state, state.at) || state.means('filler')) return false;
  const near = nearestKnown(state, token.text);
  if (near === null) return false;
  const message = `"${token.written}" is not an abbreviation. Is "${near}" meant?`;
  const { begin, end } = token;
  const fix = { label: `Write "${near}"`, begin, end, replacement: near };
  state.error('unknown-word', token, message, fix);
  state.replace(state.at, { ...token, text: near });
  return true;
}
