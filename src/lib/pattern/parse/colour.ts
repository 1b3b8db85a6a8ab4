import { meaningOf } from '../terms/words';
import type { ParseState } from './parseState';

const COLOUR_WORDS: ReadonlySet<string> = new Set([
  'colour',
  'color',
  'col',
  'yarn',
  'shade',
  'new',
]);

/**
 * The name of a colour that stands here: "B", "MC", "colour C", "coral", "Sea Green". Null where
 * what stands here is something else. "next", "new" and "first" colour are not names.
 */
export function readColour(state: ParseState): string | null {
  const start = state.at;
  while (state.means('filler') && !isLetter(state)) state.at += 1;
  while (COLOUR_WORDS.has(state.peek().text)) state.at += 1;
  const words: string[] = [];
  while (state.peek().kind === 'word' && words.length < 3 && isName(state)) {
    words.push(state.peek().written);
    state.at += 1;
  }
  if (
    words.length > 0 &&
    state.peek().kind === 'number' &&
    /^(col|colour|color)$/.test(words[0] ?? '')
  ) {
    words.push(state.peek().written);
    state.at += 1;
  }
  while (words.length > 0 && COLOUR_WORDS.has(state.peek().text)) state.at += 1;
  if (words.length > 0) return words.join(' ');
  const number = state.at > start && state.peek().kind === 'number' ? state.peek().written : null;
  if (number !== null) {
    state.at += 1;
    return `colour ${number}`;
  }
  state.at = start;
  return null;
}

const isName = (state: ParseState): boolean => {
  const { text, written } = state.peek();
  if (written.length === 1) return isLetter(state);
  if (/^(mc|cc)$/.test(text)) return true;
  return meaningOf(text) === null && state.stitchHere() === null;
};

/** "A" is a colour where "a" is not. */
const isLetter = (state: ParseState): boolean => /^[A-Z]$/.test(state.peek().written);
