import type { PlaceFilter, Until, Where } from '../syntax';
import { isAmount, readAmount } from './amount';
import { readBetween } from './between';
import { correctWord } from './correct';
import { ANY_STITCH, isNumberedChain, readFilter } from './filter';
import { amountOf, type ParseState } from './parseState';
import { readRing, ringLength } from './ring';
import { isTurningChain, readBeginning, readOrdinal } from './turningChain';
import { readUntil } from './until';

const TO_THE_END: Until = { to: 'end', word: 'around' };
const REST: Until = { to: 'end', word: 'to end' };

/** The place that stands here; `preposition` where one stood before it. Null, with nothing said, for none. */
export function placeNamed(state: ParseState, preposition: boolean): Where | null {
  if (state.means('same')) return readSame(state);
  if (state.means('each')) return readEach(state);
  if (state.means('next')) return readNext(state);
  if (state.means('last')) return readLast(state);
  if (state.means('remaining')) return readRemaining(state);
  if (state.means('any')) return readAny(state);
  if (state.means('first')) return readFirst(state);
  if (state.means('beginning') || isTurningChain(state)) return readBeginning(state);
  if (state.means('top')) return readTop(state);
  if (state.peek().kind === 'ordinal') return readOrdinal(state);
  if (state.means('middle')) return readMiddle(state);
  if (state.isWord('facing')) return readFacing(state);
  if (ringLength(state) > 0) return readRing(state);
  if (state.means('between')) return readBetween(state);
  if (!preposition) return null;
  return readPlain(state);
}

/** "next 3 dc", "next ch-2 sp". */
function readNext(state: ParseState): Where | null {
  state.take('next');
  state.skipFillers();
  correctWord(state);
  const amount = isPlainAmount(state) ? readAmount(state) : null;
  correctWord(state);
  const filter = readFilter(state) ?? (amount ? ANY_STITCH : null);
  return filter && { kind: 'next', amount: amount ?? amountOf(1), filter };
}

/** "facing ch-5 sp", "facing st": of whichever motif lies beside this one. */
function readFacing(state: ParseState): Where {
  state.at += 1;
  const filter = readFilter(state) ?? ANY_STITCH;
  return { kind: 'facing', filter };
}

function readSame(state: ParseState): Where {
  state.take('same');
  if (state.isWord('place')) state.at += 1;
  else readFilter(state);
  if (!state.isWord('as')) return { kind: 'same' };
  state.at += 1;
  state.skipFillers();
  const closes = state.means('join') || state.stitchHere()?.code === 'sl st' || state.means('last');
  skipAsPhrase(state);
  return closes
    ? { kind: 'same' }
    : { kind: 'first', filter: { of: 'stitch-or-space', code: null, chains: null } };
}

/** "as beg ch-3", "as first dc", "as joining sl st": up to the next comma. */
function skipAsPhrase(state: ParseState): void {
  while (/^(word|number|ordinal)$/.test(state.peek().kind) || state.isMark('-')) {
    if (state.means('and') || state.means('in')) return;
    state.at += 1;
  }
}

/** "each st around", "each of next 3 dc", "each dc to corner". */
function readEach(state: ParseState): Where | null {
  state.take('each');
  state.take('of');
  state.skipFillers();
  correctWord(state);
  if (state.means('next')) return eachNext(state);
  if (state.means('last')) return readLast(state);
  if (state.means('remaining')) return readRemaining(state);
  if (state.means('first')) {
    state.take('first');
    const amount = readAmount(state) ?? amountOf(1);
    const filter = readFilter(state) ?? ANY_STITCH;
    return { kind: 'next', amount, filter };
  }
  const amount = isPlainAmount(state) ? readAmount(state) : null;
  correctWord(state);
  const filter = readFilter(state);
  if (!filter) return null;
  if (amount) return { kind: 'next', amount, filter };
  let until = readUntil(state);
  if (!until && state.peek().text.length > 5 && correctWord(state)) until = readUntil(state);
  return { kind: 'each', filter, until: until ?? TO_THE_END };
}

/** "each of next 3 dc"; "each following dc around" is each of them. */
function eachNext(state: ParseState): Where | null {
  const where = readNext(state);
  if (where?.kind !== 'next' || where.amount.value !== 1) return where;
  const until = readUntil(state);
  return until ? { kind: 'each', filter: where.filter, until } : where;
}

function readLast(state: ParseState): Where | null {
  state.at += 1;
  const amount = isPlainAmount(state) ? readAmount(state) : null;
  correctWord(state);
  const filter = readFilter(state) ?? (amount ? ANY_STITCH : null);
  return filter && { kind: 'last', amount: amount ?? amountOf(1), filter };
}

/** "remaining sts", of which there may be none; "remaining 3 sts" is "last 3 sts". */
function readRemaining(state: ParseState): Where | null {
  state.take('remaining');
  if (isAmount(state)) {
    state.at -= 1;
    return readLast(state);
  }
  const filter = readFilter(state);
  return filter && { kind: 'each', filter, until: readUntil(state) ?? REST };
}

function readAny(state: ParseState): Where | null {
  state.take('any');
  const filter = readFilter(state);
  return filter && { kind: 'any', filter };
}

function readFirst(state: ParseState): Where | null {
  state.take('first');
  const amount = isPlainAmount(state) ? readAmount(state) : null;
  correctWord(state);
  const filter = readFilter(state);
  if (!filter) return null;
  return amount ? { kind: 'next', amount, filter } : { kind: 'first', filter };
}

/** "top of beg ch-3", "top ch of turning ch", "top of first dc". */
function readTop(state: ParseState): Where | null {
  state.take('top');
  if (state.isWord('ch')) state.at += 1;
  state.take('of');
  state.skipFillers();
  if (state.isWord('ch')) {
    readFilter(state);
    return { kind: 'turning-chain' };
  }
  return placeNamed(state, true);
}

/** "center sc of corner", "middle st of next 3-sc group": the corner stitch. */
function readMiddle(state: ParseState): Where | null {
  state.take('middle');
  const filter = readFilter(state);
  const corner: PlaceFilter = { of: 'corner', code: null, chains: null };
  return filter && { kind: 'next', amount: amountOf(1), filter: corner };
}

/** "in ch-2 sp", "in corner", "in st": the next one. */
function readPlain(state: ParseState): Where | null {
  if (state.means('sp') && state.means('between', 1)) {
    state.at += 1;
    return readBetween(state);
  }
  const amount = isPlainAmount(state) && !state.isMark('-', 1) ? readAmount(state) : null;
  const filter = readFilter(state);
  if (!filter) return amount && { kind: 'next', amount, filter: ANY_STITCH };
  return { kind: 'next', amount: amount ?? amountOf(1), filter };
}

/** A number of places, and not that of "2-ch sp". */
const isPlainAmount = (state: ParseState): boolean => isAmount(state) && !isNumberedChain(state);
