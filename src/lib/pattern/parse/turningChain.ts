import type { Where } from '../syntax';
import { readFilter } from './filter';
import { amountOf, type ParseState } from './parseState';

export const isTurningChain = (state: ParseState): boolean =>
  state.isWord('tch') ||
  (state.isWord('t') && state.isMark('-', 1) && state.isWord('ch', 2)) ||
  (state.isWord('turning') && state.isWord('ch', 1));

/** "beg ch-3", "beginning corner sp", "t-ch", "turning ch". */
export function readBeginning(state: ParseState): Where | null {
  if (state.isWord('tch')) state.at += 1;
  else if (state.isWord('t')) state.at += 3;
  else {
    const turning = state.isWord('turning');
    state.at += 1;
    const corner = state.means('corner');
    const filter = readFilter(state);
    if (!filter) return null;
    const isSpace = corner || state.last().text.startsWith('sp');
    if (!turning && (filter.of !== 'space' || isSpace) && filter.code !== 'ch') {
      return { kind: 'first', filter };
    }
  }
  if (state.isMark('-') && state.last().kind === 'word' && state.peek(1).kind === 'number')
    state.at += 2;
  return { kind: 'turning-chain' };
}

/** "2nd ch from hook", "3rd ch of beg ch-3", "2nd sc of next 3-sc corner". */
export function readOrdinal(state: ParseState): Where | null {
  const nth = state.checked(state.peek().value, state.peek());
  state.at += 1;
  const isChain = state.isWord('ch') || state.isWord('chain');
  const filter = readFilter(state);
  if (!filter) return null;
  if (isChain && state.means('from')) {
    state.at += 1;
    state.skipFillers();
    state.take('hook');
    return { kind: 'chain-from-hook', nth };
  }
  if (isChain && state.take('of')) {
    state.skipFillers();
    state.take('beginning');
    if (state.isWord('turning')) state.at += 1;
    readFilter(state);
    return { kind: 'turning-chain' };
  }
  return filter.of === 'corner' ? { kind: 'next', amount: amountOf(1), filter } : null;
}
