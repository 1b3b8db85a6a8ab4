import type { Step } from '../syntax';
import { readBracket } from './bracket';
import { isComment, sentenceEnd, skipComment } from './comment';
import { readChainRule } from './chainRule';
import { closerOf, readCountNote } from './countNote';
import { isHeader } from './header';
import { readInstruction } from './instruction';
import type { ParseState } from './parseState';
import { closesStar, readRepeat, readStar, repeatsFromStar } from './star';

/**
 * Reads instructions up to the closing bracket `close`, the "rep from *" of an open star, the next
 * round or the end. Whatever cannot be read is told and stepped over.
 */
export function readSteps(state: ParseState, close: string | null): Step[] {
  const steps: Step[] = [];
  for (;;) {
    const before = state.at;
    if (stopsHere(state, close)) return steps;
    if (!readOne(state, close, steps)) return steps;
    if (state.at === before) state.at += 1;
  }
}

function stopsHere(state: ParseState, close: string | null): boolean {
  if (state.peek().kind === 'end') return true;
  if (close !== null && state.isMark(close)) return true;
  return isHeader(state) || (state.openStars > 0 && (repeatsFromStar(state) || closesStar(state)));
}

/** Reads whatever stands here; false where the steps end. */
function readOne(state: ParseState, close: string | null, steps: Step[]): boolean {
  const token = state.peek();
  if (token.kind === 'line') {
    state.at += 1;
    return true;
  }
  if (state.depth === 0) {
    const note = readCountNote(state, bareCount(state, steps));
    if (note) {
      if (note.entries.length > 0) state.note ??= note;
      return true;
    }
  }
  if (beginsSentence(state)) {
    const end = sentenceEnd(state);
    const rule = readChainRule(state, end);
    if (rule) {
      state.chainRules.push(rule);
      return true;
    }
    if (isComment(state, end)) {
      state.comments.push(skipComment(state, end));
      return true;
    }
  }
  if (token.kind === 'mark') return readMark(state, close, steps);
  if (repeatsFromStar(state)) {
    const first = state.at;
    readRepeat(state);
    const message = 'This repeats from a *, but there is no * before it.';
    state.error('repeat-without-star', state.spanFrom(first), message);
    return true;
  }
  steps.push(...readInstruction(state));
  return true;
}

function readMark(state: ParseState, close: string | null, steps: Step[]): boolean {
  const { text } = state.peek();
  if (text === '*') steps.push(...readStar(state, close));
  else if (closerOf(text) !== null) steps.push(...readBracket(state));
  else {
    if (text === '**') state.endMark = steps.length;
    else if (/^[)\]}]$/.test(text)) {
      state.error('stray-bracket', state.peek(), `"${text}" closes a bracket that is not open.`, {
        label: `Remove "${text}"`,
        begin: state.peek().begin,
        end: state.peek().end,
        replacement: '',
      });
    }
    state.at += 1;
  }
  return true;
}

/** Whether "12 dc." here is a count: after the join, or where all of the round has been said. */
function bareCount(state: ParseState, steps: readonly Step[]): Parameters<typeof readCountNote>[1] {
  if (!/^(\.|\n)$/.test(state.last().text)) return 'no';
  if (steps.at(-1)?.kind === 'join') return 'yes';
  const worked = steps.some(({ kind }) => /^(stitch|group|repeat)$/.test(kind));
  return worked ? 'at-end' : 'no';
}

/** Whether a sentence begins here: after a full stop, at the beginning of a line or of the text. */
function beginsSentence(state: ParseState): boolean {
  if (state.peek().kind !== 'word') return false;
  if (state.at === 0) return true;
  const { kind, text } = state.last();
  return (
    kind === 'line' ||
    (kind === 'mark' && (text === '.' || text === ':') && state.peek().spaceBefore)
  );
}
