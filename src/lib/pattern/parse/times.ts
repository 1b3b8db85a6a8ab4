import type { Amount, Times } from '../syntax';
import { timesWord } from '../terms/words';
import { isAmount, readAmount } from './amount';
import { amountOf, type ParseState } from './parseState';
import { readUntil } from './until';

/** "6 times", "x 6", "twice", "around", "to corner"; null, with nothing read, for none. */
export function readTimes(state: ParseState): Times | null {
  const amount = readHowMany(state);
  if (amount) return { kind: 'count', amount };
  const until = isAmount(state) ? null : readUntil(state);
  return until && { kind: 'until', until };
}

/** "6 times", "6 times more", "two more times", "x 6", "6x", "twice"; null, with nothing read, for none. */
export function readHowMany(state: ParseState): Amount | null {
  const start = state.at;
  if (state.isWord('for')) state.at += 1;
  takeTotal(state);
  const x = state.isWord('x') && isAmount(state, 1);
  if (x) state.at += 1;
  const times = timesWord(state.peek().text);
  const amount = times === null ? readAmount(state) : amountOf(times);
  if (times !== null) state.at += 1;
  state.take('more');
  const said = state.take('times');
  if (said) state.take('more');
  if (amount && (times !== null || said || x)) return amount;
  state.at = start;
  return null;
}

/** "a total of". */
function takeTotal(state: ParseState): void {
  const ahead = state.means('filler') ? 1 : 0;
  if (state.isWord('total', ahead) && state.means('of', ahead + 1)) state.at += ahead + 2;
}
