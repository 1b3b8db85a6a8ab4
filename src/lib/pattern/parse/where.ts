import type { PlaceFilter, Until, Where } from '../syntax';
import { isAmount, readAmount } from './amount';
import { correctWord } from './correct';
import { ANY_STITCH, isNumberedChain, readFilter } from './filter';
import { amountOf, type ParseState } from './parseState';
import { readUntil } from './until';

const TO_THE_END: Until = { to: 'end', word: 'around' };
const REST: Until = { to: 'end', word: 'to end' };

/**
 * Where stitches are worked, all the places that are named one after another:
 * "in next 2 dc and in next ch-2 sp" is two. Empty where none is named.
 */
export function readWheres(state: ParseState, afterPreposition = false): Where[] {
  const wheres: Where[] = [];
  for (;;) {
    const start = state.at;
    state.skipLines();
    if (wheres.length > 0 && !takeAnd(state)) {
      state.at = start;
      return wheres;
    }
    const where = readWhere(state, afterPreposition || wheres.length > 0);
    if (!where) {
      state.at = start;
      return wheres;
    }
    wheres.push(where);
  }
}

function takeAnd(state: ParseState): boolean {
  state.takeMark(',');
  state.skipLines();
  return state.take('and') || state.takeMark('&');
}

/** One place; `bare` where "in" may be left out, after "and" or "to". */
function readWhere(state: ParseState, bare: boolean): Where | null {
  const start = state.at;
  const preposition = state.take('in') || state.take('around') || state.take('across') || bare;
  state.skipLines();
  readLoops(state);
  takePost(state);
  state.skipFillers();
  if (preposition) correctWord(state);
  const where = preposition ? placeNamed(state, preposition) : bareEach(state);
  if (!where) state.at = start;
  return where;
}

/** "each" and "next" may stand without "in": "dc next st", "sc each st around". */
const bareEach = (state: ParseState): Where | null =>
  state.means('each') || state.means('next') || state.means('same')
    ? placeNamed(state, false)
    : null;

function placeNamed(state: ParseState, preposition: boolean): Where | null {
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
  if (isRing(state)) return readRing(state);
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

const isTurningChain = (state: ParseState): boolean =>
  state.isWord('tch') ||
  (state.isWord('t') && state.isMark('-', 1) && state.isWord('ch', 2)) ||
  (state.isWord('turning') && state.isWord('ch', 1));

/** "beg ch-3", "beginning corner sp", "t-ch", "turning ch". */
function readBeginning(state: ParseState): Where | null {
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

/** "2nd ch from hook", "3rd ch of beg ch-3", "2nd sc of next 3-sc corner". */
function readOrdinal(state: ParseState): Where | null {
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

/** "center sc of corner", "middle st of next 3-sc group": the corner stitch. */
function readMiddle(state: ParseState): Where | null {
  state.take('middle');
  const filter = readFilter(state);
  const corner: PlaceFilter = { of: 'corner', code: null, chains: null };
  return filter && { kind: 'next', amount: amountOf(1), filter: corner };
}

function isRing(state: ParseState): boolean {
  const ahead = state.isWord('magic') || state.means('middle') ? 1 : 0;
  return (
    state.means('ring', ahead) ||
    (state.isWord('magic') && state.isWord('loop', 1)) ||
    isMagicLetters(state)
  );
}

const isMagicLetters = (state: ParseState): boolean => state.isWord('mr') || state.isWord('mc');

function readRing(state: ParseState): Where {
  const magic = state.isWord('magic') || isMagicLetters(state);
  if (state.isWord('magic') || state.means('middle')) state.at += 1;
  state.at += 1;
  return { kind: 'ring', magic };
}

/** "in ch-2 sp", "in corner", "in st": the next one. */
function readPlain(state: ParseState): Where | null {
  const amount = isPlainAmount(state) && !state.isMark('-', 1) ? readAmount(state) : null;
  const filter = readFilter(state);
  if (!filter) return amount && { kind: 'next', amount, filter: ANY_STITCH };
  return { kind: 'next', amount: amount ?? amountOf(1), filter };
}

/** "BLO of", "back loops only of": sets where the hook goes in for the stitch that is being read. */
function readLoops(state: ParseState): void {
  const start = state.at;
  state.skipFillers();
  const short = /^(blo?|flo?)$/.exec(state.peek().text)?.[1];
  const long = state.isWord('back') || state.isWord('front');
  if (!short && !(long && /^(loop|loops|lp|lps)$/.test(state.peek(1).text))) {
    state.at = start;
    return;
  }
  state.insertionHere = (short ?? state.peek().text).startsWith('b') ? 'BL' : 'FL';
  state.at += short ? 1 : 2;
  if (state.isWord('only')) state.at += 1;
  if (state.take('of')) state.skipFillers();
}

/** "around post of": says nothing that "FPdc" does not. */
function takePost(state: ParseState): void {
  const start = state.at;
  state.skipFillers();
  if (!state.isWord('post') && !state.isWord('posts')) {
    state.at = start;
    return;
  }
  state.at += 1;
  state.take('of');
  state.skipFillers();
}

/** A number of places, and not that of "2-ch sp". */
const isPlainAmount = (state: ParseState): boolean => isAmount(state) && !isNumberedChain(state);
