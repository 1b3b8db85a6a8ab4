import { PATTERN_LIMITS } from '../limits';
import type { Amount } from '../syntax';
import { numberWord } from '../terms/words';
import { amountOf, type ParseState } from './parseState';

/** Whether a number stands here, in digits or, up to twelve, in words. */
export const isAmount = (state: ParseState, ahead = 0): boolean => numberAt(state, ahead) !== null;

/** The number that stands here, in digits or words; null where none does. */
export function numberAt(state: ParseState, ahead = 0): number | null {
  const { kind, text, value } = state.peek(ahead);
  if (kind === 'number') return value;
  return kind === 'word' ? numberWord(text) : null;
}

/** A number, "10" or for several sizes "10 (12, 14)"; null where none stands. */
export function readAmount(state: ParseState): Amount | null {
  const value = numberAt(state);
  if (value === null) return null;
  const first = state.checked(value, state.peek());
  state.at += 1;
  const others = otherSizes(state);
  if (others.length === 0) return amountOf(first);
  const sizes = [first, ...others];
  return { value: sizes[Math.min(state.size, sizes.length - 1)] ?? first, sizes };
}

/**
 * "(12, 14)", "[12: 14]" or "/12/14" straight after a number: plain numbers, and nothing else in the
 * brackets. Where they are not that, nothing is read.
 */
function otherSizes(state: ParseState): number[] {
  const close = state.isMark('(') ? ')' : state.isMark('[') ? ']' : null;
  const sizes: number[] = [];
  let ahead = close === null ? 0 : 1;
  while (sizes.length < PATTERN_LIMITS.sizes) {
    const isFirst = close !== null && sizes.length === 0;
    const separated = close === null ? state.isMark('/', ahead) : isSeparator(state, ahead);
    const at = isFirst ? ahead : ahead + 1;
    if ((!isFirst && !separated) || state.peek(at).kind !== 'number') break;
    sizes.push(state.checked(state.peek(at).value, state.peek(at)));
    ahead = at + 1;
  }
  if (sizes.length === 0 || (close !== null && !state.isMark(close, ahead))) return [];
  state.at += close === null ? ahead : ahead + 1;
  return sizes;
}

/** What stands between the figures of several sizes. */
export const isSeparator = (state: ParseState, ahead = 0): boolean =>
  state.peek(ahead).kind === 'mark' && /^[,:;/-]$/.test(state.peek(ahead).text);
