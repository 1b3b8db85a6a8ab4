import type { Times } from '../syntax';
import { timesWord } from '../terms/words';
import { isAmount, readAmount } from './amount';
import { amountOf, type ParseState } from './parseState';
import { readUntil } from './until';

/** "6 times", "x 6", "twice", "around", "to corner"; null, with nothing read, for none. */
export function readTimes(state: ParseState): Times | null {
  const start = state.at;
  const x = state.isWord('x') && isAmount(state, 1);
  if (x) state.at += 1;
  if (isAmount(state)) {
    const amount = readAmount(state);
    state.take('more');
    if (amount && (state.take('times') || x)) return { kind: 'count', amount };
    state.at = start;
    return null;
  }
  const times = timesWord(state.peek().text);
  if (times !== null) {
    state.at += 1;
    state.take('more');
    return { kind: 'count', amount: amountOf(times) };
  }
  const until = readUntil(state);
  return until && { kind: 'until', until };
}
