import { PATTERN_LIMITS } from '../limits';
import type { RepeatStep, Step, Times } from '../syntax';
import { timesWord } from '../terms/words';
import { isAmount, readAmount } from './amount';
import { amountOf, type ParseState } from './parseState';
import { readSteps } from './steps';
import { readTimes } from './times';
import { readUntil } from './until';

/** "* … ** …; rep from * 3 more times, ending last rep at **". */
export function readStar(state: ParseState, close: string | null): Step[] {
  const first = state.at;
  const star = state.peek();
  state.at += 1;
  if (state.depth >= PATTERN_LIMITS.nesting) {
    state.error(
      'limit',
      star,
      `Repeats may stand inside one another ${PATTERN_LIMITS.nesting} deep.`,
    );
    return [];
  }
  state.depth += 1;
  state.openStars += 1;
  const outer = state.endMark;
  state.endMark = null;
  const parts = readSteps(state, close);
  const partsBeforeEnd = state.endMark;
  state.endMark = outer;
  state.openStars -= 1;
  state.depth -= 1;
  if (closesStar(state)) {
    state.at += 1;
    const times = readTimes(state);
    if (times) {
      return [
        {
          kind: 'repeat',
          mark: 'star',
          parts,
          times,
          partsBeforeEnd: null,
          ...state.spanFrom(first),
        },
      ];
    }
    isRepeatedAfter(state);
  }
  if (!repeatsFromStar(state)) {
    const message = 'Nothing repeats from this *: "rep from *" is missing. It is worked once.';
    state.error('star-without-repeat', star, message);
    return parts;
  }
  const { times, endsAtMark } = readRepeat(state);
  const repeat: RepeatStep = {
    kind: 'repeat',
    mark: 'star',
    parts,
    times,
    partsBeforeEnd: endsAtMark ? partsBeforeEnd : null,
    ...state.spanFrom(first),
  };
  if (endsAtMark && partsBeforeEnd === null) {
    const message = 'The last repeat ends at **, but there is no ** in it.';
    state.error('repeat-without-star', state.spanFrom(first), message);
  }
  return [repeat];
}

/** Whether a second star ends the repeat, with its times after it: "*sc in next st, inc* 6 times". */
export function closesStar(state: ParseState): boolean {
  if (!state.isMark('*')) return false;
  const start = state.at;
  state.at += 1;
  const found = readTimes(state) !== null || isRepeatedAfter(state);
  state.at = start;
  return found;
}

/** "*sc in next st, inc*, rep between * and * around": steps over the mark between. */
function isRepeatedAfter(state: ParseState): boolean {
  if (!state.takeMark(',')) state.takeMark(';');
  return repeatsFromStar(state);
}

/** Whether "rep from *" stands here; also "rep between *s", "rep * to *". */
export function repeatsFromStar(state: ParseState): boolean {
  if (!state.means('repeat')) return false;
  for (let ahead = 1; ahead <= 4; ahead += 1) {
    if (state.isMark('*', ahead) || state.isMark('**', ahead)) return true;
    if (state.peek(ahead).kind !== 'word') return false;
  }
  return false;
}

/** From "rep" to the last word of the clause. */
export function readRepeat(state: ParseState): { times: Times; endsAtMark: boolean } {
  while (state.peek().kind === 'word') state.at += 1;
  if (!state.takeMark('*')) state.takeMark('**');
  // "between * and *" names both ends.
  if (state.means('and') && state.isMark('*', 1)) state.at += 2;
  let endsAtMark = takeToMark(state);
  const times = readTotal(state);
  endsAtMark = takeEnding(state) || endsAtMark;
  return { times, endsAtMark };
}

/** "to **" straight after the star. */
function takeToMark(state: ParseState): boolean {
  if (state.means('to') && (state.isMark('**', 1) || state.isMark('*', 1))) {
    const found = state.isMark('**', 1);
    state.at += 2;
    return found;
  }
  return false;
}

/** "3 more times" is four in all, and so is "3 times": what is repeated has been worked once. */
function readTotal(state: ParseState): Times {
  const start = state.at;
  state.skipLines();
  if (isAmount(state)) {
    const amount = readAmount(state) ?? amountOf(1);
    state.take('more');
    if (state.take('times')) {
      const sizes = amount.sizes?.map((each) => each + 1) ?? null;
      return { kind: 'count', amount: { value: amount.value + 1, sizes } };
    }
    state.at = start;
  }
  const more = timesWord(state.peek().text);
  if (more !== null) {
    state.at += 1;
    state.take('more');
    return { kind: 'count', amount: amountOf(more + 1) };
  }
  const until = readUntil(state);
  if (!until) state.at = start;
  return { kind: 'until', until: until ?? { to: 'end', word: 'around' } };
}

/** ", ending last rep at **", ", ending at **", ", end last rep at **". */
function takeEnding(state: ParseState): boolean {
  const start = state.at;
  state.takeMark(',');
  state.takeMark(';');
  state.skipLines();
  if (/^(ending|end|omitting|finishing|stopping)$/.test(state.peek().text)) {
    for (let ahead = 1; ahead <= 8 && state.peek(ahead).kind !== 'end'; ahead += 1) {
      if (state.isMark('**', ahead)) {
        state.at += ahead + 1;
        return true;
      }
      if (state.peek(ahead).kind !== 'word') break;
    }
  }
  state.at = start;
  return false;
}
