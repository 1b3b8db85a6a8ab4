import type { CountEntry, CountNote } from '../syntax';
import { readFilter } from './filter';
import { amountOf, type ParseState } from './parseState';
import { PATTERN_LIMITS } from '../limits';

/** Words of a count that name nothing this reader counts: "4 corners", "8 petals". */
const UNCOUNTED: ReadonlySet<string> = new Set(
  'corner corners group groups petal petals side sides total made increases point points leaf leaves'.split(
    ' ',
  ),
);

/**
 * A count of what a round makes, in brackets or after a dash at its end: "(12 dc, 4 ch-2 sps)",
 * "[16 sts]", "— 48 dc", "= 48 dc", and `bare` after the join "48 dc". Null, with nothing read, where it is something else.
 */
export function readCountNote(state: ParseState, bare = false): CountNote | null {
  const start = state.at;
  const close = closerOf(state.peek().text);
  const dash = state.isMark('-') || state.isMark('=') || state.isMark(':');
  if (close === null && !dash && !(bare && state.peek().kind === 'number')) return null;
  while (state.isMark('-') || state.isMark('=') || state.isMark(':')) state.at += 1;
  if (close !== null && state.at === start) state.at += 1;
  const entries = readEntries(state);
  const ended =
    entries.length > 0 && (close === null ? endsSentence(state) : state.takeMark(close));
  if (ended && (close === null || endsSentence(state)))
    return { entries, ...state.spanFrom(start) };
  state.at = start;
  return null;
}

/** Whether a number, in words of its own and not as the beginning of an instruction, is a count: "48 dc." */
export const closerOf = (open: string): string | null =>
  open === '(' ? ')' : open === '[' ? ']' : open === '{' ? '}' : null;

function endsSentence(state: ParseState): boolean {
  const { kind } = state.peek();
  return (
    kind === 'end' ||
    kind === 'line' ||
    state.isMark('.') ||
    state.isMark('[') ||
    state.means('turn') ||
    state.isWord('fasten') ||
    state.means('round') ||
    state.means('row') ||
    (state.isMark(';') && state.peek(1).kind === 'line')
  );
}

function readEntries(state: ParseState): CountEntry[] {
  const entries: CountEntry[] = [];
  for (;;) {
    skipWords(state, ['total', 'of', 'you', 'have', 'now', 'should', 'sts', 'stitches', 'count']);
    state.takeMark(':');
    const entry = readEntry(state);
    if (entry === null) return [];
    if (entry !== 'uncounted') entries.push(entry);
    if (entries.length > PATTERN_LIMITS.countEntries) return [];
    const more =
      state.takeMark(',') ||
      state.takeMark(';') ||
      state.takeMark('+') ||
      state.takeMark('&') ||
      state.takeMark('/');
    const and = state.take('and') || state.takeMark('&');
    state.skipLines();
    if (!more && !and) return entries;
  }
}

function readEntry(state: ParseState): CountEntry | 'uncounted' | null {
  const first = state.at;
  if (state.peek().kind !== 'number') return null;
  const numbers = readNumbers(state);
  const amountSpan = state.spanFrom(first);
  const of = readNoun(state);
  if (of === null) return null;
  skipWords(state, ['total', 'made', 'in', 'all', 'around', 'worked']);
  const perSide = readPerSide(state);
  if (of === 'uncounted') return 'uncounted';
  const byRound = numbers.length > 1 && numbers.length === state.roundsOfLine ? numbers : null;
  const value = numbers[Math.min(byRound ? 0 : state.size, numbers.length - 1)] ?? 0;
  const amount = byRound || numbers.length === 1 ? amountOf(value) : { value, sizes: numbers };
  return { amount, amountSpan, byRound, of, perSide, ...state.spanFrom(first) };
}

/** "48", "48 (60, 72)", "24, 36, 48". */
function readNumbers(state: ParseState): number[] {
  const numbers = [state.peek().value];
  state.at += 1;
  const bracket = state.isMark('(') && state.peek(1).kind === 'number';
  if (bracket) state.at += 1;
  for (;;) {
    const separated = state.isMark(',') || state.isMark('/') || state.isMark('-');
    const ahead = bracket && numbers.length === 1 ? 0 : separated ? 1 : -1;
    if (ahead < 0 || state.peek(ahead).kind !== 'number' || numbers.length >= PATTERN_LIMITS.sizes)
      break;
    // "12 dc, 4 ch-2 sps" is two entries; "24, 36, 48 dc" three numbers of one.
    if (!bracket && !numberFollowedByNumbersOrNoun(state, ahead)) break;
    numbers.push(state.peek(ahead).value);
    state.at += ahead + 1;
  }
  if (bracket) state.takeMark(')');
  return numbers;
}

const numberFollowedByNumbersOrNoun = (state: ParseState, ahead: number): boolean =>
  state.peek(ahead + 1).kind === 'word' ||
  state.isMark(',', ahead + 1) ||
  state.isMark('/', ahead + 1);

function readNoun(state: ParseState): CountEntry['of'] | 'uncounted' | null {
  const { kind, text } = state.peek();
  if (kind === 'word' && UNCOUNTED.has(text)) {
    state.at += 1;
    return 'uncounted';
  }
  if (kind !== 'word' && kind !== 'number') return { kind: 'all' };
  if (
    state.isMark('-', 1) &&
    state.peek(2).kind === 'word' &&
    /^groups?$/.test(state.peek(3).text)
  ) {
    state.at += 4;
    return 'uncounted';
  }
  const counted = kind === 'number' ? state.stitchHere() : null;
  if (counted) {
    state.at = counted.next;
    return { kind: 'stitch', code: counted.code };
  }
  const filter = readFilter(state);
  if (!filter) return null;
  if (filter.of === 'space' || filter.of === 'corner-space')
    return { kind: 'space', chains: filter.chains };
  if (filter.of === 'corner') return 'uncounted';
  return filter.code === null ? { kind: 'all' } : { kind: 'stitch', code: filter.code };
}

/** "per side", "on each side", "each side", "along each side". */
function readPerSide(state: ParseState): boolean {
  let ahead = 0;
  while (/^(per|on|each|along|every|a|between)$/.test(state.peek(ahead).text)) ahead += 1;
  const found = ahead > 0 && /^(side|sides|corners)$/.test(state.peek(ahead).text);
  if (found) state.at += ahead + 1;
  return found;
}

function skipWords(state: ParseState, words: readonly string[]): void {
  while (state.peek().kind === 'word' && words.includes(state.peek().text)) state.at += 1;
}
