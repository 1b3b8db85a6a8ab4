import { spanFrom, type Span } from '../span';
import type { ChainStep, StandsFor } from '../syntax';
import { isAmount, readAmount } from './amount';
import { amountOf, type ParseState } from './parseState';

/** "ch 3", "ch-3", "chain"; "3 ch" has read its number before. What it counts as may follow. */
export function readChain(state: ParseState, first: number): ChainStep {
  const word = state.peek();
  state.at += 1;
  if (state.isMark('-') && isAmount(state, 1)) state.at += 1;
  const numberAt = state.at;
  const amount = readAmount(state);
  const amountSpan: Span = amount ? state.spanFrom(numberAt) : word;
  if (state.means('st') && amount) state.at += 1;
  return finished(state, first, amount ?? amountOf(1), amountSpan);
}

/** "3 ch": the number is read, the word is next. */
export function readCountedChain(
  state: ParseState,
  first: number,
  amount: ChainStep['amount'],
  amountSpan: Span,
): ChainStep {
  state.at += 1;
  return finished(state, first, amount, amountSpan);
}

function finished(
  state: ParseState,
  first: number,
  amount: ChainStep['amount'],
  amountSpan: Span,
): ChainStep {
  const span = state.spanFrom(first);
  const beforeCounts = state.at;
  const standsFor = readCountsAs(state);
  if (standsFor && saidThroughout(state, beforeCounts)) {
    state.chainRules.push({ chains: amount.value, standsFor });
  }
  return {
    kind: 'chain',
    ...(standsFor ? spanFrom(span, state.last()) : span),
    amount,
    amountSpan,
    standsFor,
  };
}

const saidThroughout = (state: ParseState, from: number): boolean =>
  state.tokens.slice(from, state.at).some(({ text }) => text === 'throughout');

/**
 * "(counts as dc)", ", counts as first dc and ch-2 sp,", "(does not count as a st)".
 * Null, with nothing read, where no such words follow.
 */
export function readCountsAs(state: ParseState): StandsFor | null {
  const start = state.at;
  state.skipLines();
  const bracket = state.takeMark('(') || state.takeMark('[');
  if (!bracket) state.takeMark(',');
  state.skipLines();
  const standsFor = countsAs(state);
  if (!standsFor) {
    state.at = start;
    return null;
  }
  if (bracket) {
    while (!state.isMark(')') && !state.isMark(']') && !endsText(state)) state.at += 1;
    if (!state.takeMark(')')) state.takeMark(']');
  } else takeThroughout(state);
  return standsFor;
}

const endsText = (state: ParseState): boolean =>
  state.peek().kind === 'end' || state.isMark('(') || state.isMark('.') || state.isMark('*');

/** "here and throughout", "now and throughout", "throughout". */
function takeThroughout(state: ParseState): void {
  let ahead = 0;
  while (/^(here|now|and|throughout)$/.test(state.peek(ahead).text)) ahead += 1;
  if (ahead > 0 && state.isWord('throughout', ahead - 1)) state.at += ahead;
}

function countsAs(state: ParseState): StandsFor | null {
  if (isWordOf(state, 'does', 'do')) {
    const negative = isWordOf(state, 'not', 'nt', 1) && state.means('counts', 2);
    return negative ? noStitch(state, 3) : null;
  }
  if (isWordOf(state, "doesn't", "don't") && state.means('counts', 1)) return noStitch(state, 2);
  if (isWordOf(state, 'not') && state.means('counts', 1)) return noStitch(state, 2);
  const stands = isWordOf(state, 'stands', 'acts');
  if (!state.means('counts') && !stands) return null;
  state.at += 1;
  if (!state.means('as') && !isWordOf(state, 'for')) return null;
  state.at += 1;
  return what(state);
}

function noStitch(state: ParseState, words: number): StandsFor {
  state.at += words;
  if (state.take('as')) {
    state.skipFillers();
    state.take('first');
    if (state.means('st')) state.at += 1;
    else {
      const term = state.stitchHere();
      if (term) state.at = term.next;
    }
  }
  return { code: null, chains: 0 };
}

/** "first dc", "dc and ch-2 sp", "1 dc + 2 ch", "dc, ch 2". */
function what(state: ParseState): StandsFor | null {
  state.skipFillers();
  state.take('first');
  if (state.peek().kind === 'number' && state.peek().value === 1) state.at += 1;
  const term = state.stitchHere();
  if (!term || term.code === 'ch') return null;
  state.at = term.next;
  const afterStitch = state.at;
  const plus =
    state.take('and') || state.takeMark('+') || state.takeMark('&') || state.takeMark(',');
  state.skipFillers();
  const chains = plus ? chainsThere(state) : null;
  if (chains === null) state.at = afterStitch;
  return { code: term.code, chains: chains ?? 0 };
}

function chainsThere(state: ParseState): number | null {
  const number = state.peek().kind === 'number' ? state.peek() : null;
  if (number) state.at += 1;
  if (!state.isWord('ch') && !state.isWord('chain')) return null;
  state.at += 1;
  if (!number && state.isMark('-')) state.at += 1;
  const after = !number && state.peek().kind === 'number' ? state.peek() : null;
  if (after) state.at += 1;
  state.take('sp');
  return Math.min(20, (number ?? after)?.value ?? 1);
}

const isWordOf = (state: ParseState, ...wordsAndAhead: (string | number)[]): boolean => {
  const last = wordsAndAhead.at(-1);
  const token = state.peek(typeof last === 'number' ? last : 0);
  return token.kind === 'word' && wordsAndAhead.includes(token.text);
};
