import { PATTERN_LIMITS } from '../limits';
import type { CountEntry } from '../syntax';
import { isAmount, isSeparator, numberAt } from './amount';
import { isNumberedChain, readFilter } from './filter';
import { amountOf, type ParseState } from './parseState';

/** Words of a count that name nothing this reader counts: "4 corners", "8 petals". */
const UNCOUNTED: ReadonlySet<string> = new Set(
  (
    'corner corners group groups petal petals side sides increases point points leaf leaves ' +
    'set sets shell shells fan fans v motif motifs row rows round rounds rnds section sections wedge wedges'
  ).split(' '),
);
const BEFORE: ReadonlySet<string> = new Set(
  'a total of you will should now have there be are is stitch sts stitches count made and'.split(
    ' ',
  ),
);
const AFTER: ReadonlySet<string> = new Set(
  'total made in all around worked counted altogether'.split(' '),
);
/** Words after which the rest of a count only explains it: "12 dc, including beg ch-3". */
const EXPLAINS: ReadonlySet<string> = new Set(
  'including incl counting not count with excluding plus where'.split(' '),
);

type Of = CountEntry['of'] | 'uncounted';

/** The figures of a count, none of which may be counted here; null, wherever it got to, if this is no count. */
export function readCountEntries(state: ParseState, close: string | null): CountEntry[] | null {
  const entries: CountEntry[] = [];
  for (;;) {
    skipWords(state, BEFORE);
    state.takeMark(':');
    const entry = readEntry(state);
    if (entry === null || entries.length >= PATTERN_LIMITS.countEntries) return null;
    if (entry !== 'uncounted') entries.push(entry);
    const more = takeSeparator(state);
    if (EXPLAINS.has(state.peek().text)) {
      skipExplanation(state, close);
      return entries;
    }
    if (!more) return entries;
  }
}

function takeSeparator(state: ParseState): boolean {
  const start = state.at;
  for (const mark of [',', ';', '+', '&', '/', '-']) state.takeMark(mark);
  state.take('and');
  state.skipLines();
  const separated = state.at > start;
  // The dash of "12 dc -" belongs to what comes after the count.
  const ended = separated && !isAmount(state) && state.peek().kind !== 'word';
  if (ended) state.at = start;
  return separated && !ended;
}

function skipExplanation(state: ParseState, close: string | null): void {
  const ends = (): boolean =>
    /^(line|end)$/.test(state.peek().kind) || state.isMark('.') || state.isMark('(');
  while (!ends() && !(close !== null && state.isMark(close))) state.at += 1;
}

function readEntry(state: ParseState): CountEntry | 'uncounted' | null {
  const first = state.at;
  if (!isAmount(state)) return nounFirst(state);
  const numbers = readNumbers(state);
  const amountSpan = state.spanFrom(first);
  const multiplied = state.isWord('x');
  if (multiplied) state.at += 1;
  // "4 x 3 dc"
  const several = multiplied && isAmount(state) && !isNumberedChain(state);
  if (several) state.at += 1;
  const noun = readNoun(state);
  if (noun === null) return null;
  const of = several ? 'uncounted' : noun;
  skipWords(state, AFTER);
  const perSide = readPerSide(state);
  return of === 'uncounted' ? of : entryOf(state, first, { numbers, amountSpan, of, perSide });
}

/** "dc: 12", "Sts = 12". */
function nounFirst(state: ParseState): CountEntry | 'uncounted' | null {
  const first = state.at;
  if (state.peek().kind !== 'word') return null;
  const of = readNoun(state);
  if (of === null || !(state.takeMark(':') || state.takeMark('=')) || !isAmount(state)) return null;
  const at = state.at;
  const numbers = readNumbers(state);
  const amountSpan = state.spanFrom(at);
  const perSide = readPerSide(state);
  return of === 'uncounted' ? of : entryOf(state, first, { numbers, amountSpan, of, perSide });
}

function entryOf(
  state: ParseState,
  first: number,
  { numbers, ...rest }: { numbers: number[] } & Pick<CountEntry, 'amountSpan' | 'of' | 'perSide'>,
): CountEntry {
  const byRound = numbers.length > 1 && numbers.length === state.roundsOfLine ? numbers : null;
  const value = numbers[Math.min(byRound ? 0 : state.size, numbers.length - 1)] ?? 0;
  const amount = byRound || numbers.length === 1 ? amountOf(value) : { value, sizes: numbers };
  return { amount, byRound, ...rest, ...state.spanFrom(first) };
}

/** "48", "48 (60, 72)", "24, 36, 48", "four". */
function readNumbers(state: ParseState): number[] {
  const numbers = [numberAt(state) ?? 0];
  state.at += 1;
  const open = state.isMark('(') ? ')' : state.isMark('[') ? ']' : null;
  const bracket = open !== null && state.peek(1).kind === 'number';
  if (bracket) state.at += 1;
  for (;;) {
    const ahead = bracket && numbers.length === 1 ? 0 : isSeparator(state) ? 1 : -1;
    if (ahead < 0 || state.peek(ahead).kind !== 'number') break;
    // "12 dc, 4 ch-2 sps" is two entries; "24, 36, 48 dc" three numbers of one.
    if (!bracket && !numberFollowedByNumbersOrNoun(state, ahead)) break;
    if (numbers.length >= PATTERN_LIMITS.sizes) break;
    numbers.push(state.peek(ahead).value);
    state.at += ahead + 1;
  }
  if (bracket && open) state.takeMark(open);
  return numbers;
}

const numberFollowedByNumbersOrNoun = (state: ParseState, ahead: number): boolean =>
  state.peek(ahead + 1).kind === 'word' ||
  state.isMark(',', ahead + 1) ||
  state.isMark('/', ahead + 1);

function readNoun(state: ParseState): Of | null {
  if (state.isWord('ch') || state.isWord('chs') || state.isWord('chain')) return ofFilter(state);
  if (isUncounted(state)) return readUncounted(state);
  const { kind, text } = state.peek();
  if (kind !== 'word' && kind !== 'number') return { kind: 'all' };
  if (AFTER.has(text) || EXPLAINS.has(text)) return { kind: 'all' };
  // "3-dc groups", "dc groups"
  const legs = kind === 'number' && state.isMark('-', 1) ? 2 : 0;
  const term = state.stitchHere(legs);
  if (term && UNCOUNTED.has(state.tokens[term.next]?.text ?? '')) {
    state.at = term.next + 1;
    return 'uncounted';
  }
  const counted = kind === 'number' ? state.stitchHere() : null;
  if (counted) {
    state.at = counted.next;
    return { kind: 'stitch', code: counted.code };
  }
  if (term && term.perPlace > 1) {
    state.at = term.next;
    return 'uncounted';
  }
  return ofFilter(state);
}

const isUncounted = (state: ParseState): boolean =>
  state.peek().kind === 'word' && UNCOUNTED.has(state.peek().text);

/** "4 corners", "4 corner sps", "4 groups of 3 dc", "8 V-sts". */
function readUncounted(state: ParseState): 'uncounted' {
  state.at += 1;
  state.takeMark('-');
  if (!state.take('sp')) state.take('st');
  if (state.take('of')) {
    if (isAmount(state)) state.at += 1;
    state.takeMark('-');
    if (!isUncounted(state)) readFilter(state);
    else state.at += 1;
  }
  return 'uncounted';
}

function ofFilter(state: ParseState): Of | null {
  const filter = readFilter(state);
  if (!filter) return null;
  if (filter.of === 'space' || filter.of === 'corner-space')
    return { kind: 'space', chains: filter.chains };
  if (filter.of === 'corner') return 'uncounted';
  return filter.code === null ? { kind: 'all' } : { kind: 'stitch', code: filter.code };
}

/** "per side", "on each side", "each side", "along each side", "between corners". */
function readPerSide(state: ParseState): boolean {
  let found = false;
  for (let ahead = 0; ahead <= 4; ahead += 1) {
    const { text } = state.peek(ahead);
    if (/^(side|sides|corner|corners)$/.test(text) && ahead > 0) {
      state.at += ahead + 1;
      found = true;
      ahead = -1;
    } else if (!/^(per|on|in|each|along|every|a|between|bet|the)$/.test(text)) break;
  }
  return found;
}

function skipWords(state: ParseState, words: ReadonlySet<string>): void {
  while (state.peek().kind === 'word' && words.has(state.peek().text)) state.at += 1;
}
