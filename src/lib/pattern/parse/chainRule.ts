import type { ChainRule } from '../syntax';
import { readCountsAs } from './chain';
import type { ParseState } from './parseState';

const notCounted = (state: ParseState, end: number) =>
  state.at < end && state.peek().kind === 'word' ? readCountsAs(state) : null;

/**
 * "Ch 3 at beg of rnd counts as dc throughout.", "Beg ch-1 does not count as a st.": said of the
 * whole pattern, before its rounds. Null, with nothing read, for anything else.
 */
export function readChainRule(state: ParseState, end: number): ChainRule | null {
  const start = state.at;
  while (
    state.means('filler') ||
    state.means('beginning') ||
    state.means('first') ||
    state.isWord('turning')
  ) {
    state.at += 1;
  }
  const rule = ruleHere(state, end);
  state.at = rule ? end : start;
  return rule;
}

function ruleHere(state: ParseState, end: number): ChainRule | null {
  if (!state.isWord('ch') && !state.isWord('chain')) return null;
  state.at += 1;
  if (state.isMark('-')) state.at += 1;
  if (state.peek().kind !== 'number') return null;
  const chains = state.peek().value;
  state.at += 1;
  // "at beg of rnd", "at the start of each round"
  while (
    state.at < end &&
    !state.means('counts') &&
    !/^(does|do|doesn't|don't)$/.test(state.peek().text)
  ) {
    if (state.peek().kind !== 'word') return null;
    state.at += 1;
  }
  // "Ch 3 (counts as dc), 11 dc" is an instruction: a rule is a sentence of its own.
  const standsFor =
    state.at < end && state.means('counts') ? readCountsAs(state) : notCounted(state, end);
  while (standsFor && state.at < end && state.peek().kind === 'word') state.at += 1;
  return standsFor && state.at === end ? { chains, standsFor } : null;
}
