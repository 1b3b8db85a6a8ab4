import { PATTERN_LIMITS } from '../limits';
import type { Amount } from '../syntax';
import { numberWord } from '../terms/words';
import { amountOf, type ParseState } from './parseState';

/** Whether a number stands here, in digits or, up to twelve, in words. */
export const isAmount = (state: ParseState, ahead = 0): boolean =>
  state.peek(ahead).kind === 'number' ||
  (state.peek(ahead).kind === 'word' && numberWord(state.peek(ahead).text) !== null);

/** A number, "10" or for several sizes "10 (12, 14)"; null where none stands. */
export function readAmount(state: ParseState): Amount | null {
  if (!isAmount(state)) return null;
  const token = state.peek();
  const first = state.checked(numberWord(token.text) ?? token.value, token);
  state.at += 1;
  const others = otherSizes(state);
  if (others.length === 0) return amountOf(first);
  const sizes = [first, ...others];
  return { value: sizes[Math.min(state.size, sizes.length - 1)] ?? first, sizes };
}

/** "(12, 14)" straight after a number: plain numbers, and nothing else in the brackets. */
function otherSizes(state: ParseState): number[] {
  const start = state.at;
  if (!state.isMark('(')) return [];
  const sizes: number[] = [];
  let ahead = 1;
  while (state.peek(ahead).kind === 'number' && sizes.length < PATTERN_LIMITS.sizes) {
    sizes.push(state.checked(state.peek(ahead).value, state.peek(ahead)));
    ahead += 1;
    if (!state.isMark(',', ahead) && !state.isMark('-', ahead) && !state.isMark('/', ahead)) break;
    ahead += 1;
  }
  if (sizes.length === 0 || !state.isMark(')', ahead)) return [];
  state.at = start + ahead + 1;
  return sizes;
}
