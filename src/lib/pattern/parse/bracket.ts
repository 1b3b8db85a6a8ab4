import { PATTERN_LIMITS } from '../limits';
import type { GroupStep, RepeatStep, Step } from '../syntax';
import { closerOf } from './countNote';
import { isComment } from './comment';
import { amountOf, type ParseState } from './parseState';
import { readSteps } from './steps';
import { readTimes } from './times';
import { readWheres } from './where';

/**
 * "(2 dc, ch 2, 2 dc) in next ch-2 sp" is a group in one place, "[dc in next st, 2 dc in next st] 6 times"
 * a repeat. Brackets around a remark hold no step.
 */
export function readBracket(state: ParseState): Step[] {
  const first = state.at;
  const open = state.peek();
  const close = closerOf(open.text) ?? ')';
  const remark = remarkEnd(state, close);
  if (remark > 0) {
    state.at = remark;
    return [];
  }
  state.at += 1;
  if (state.depth >= PATTERN_LIMITS.nesting) return tooDeep(state, first, close);
  state.depth += 1;
  const parts = readSteps(state, close);
  state.depth -= 1;
  if (!state.takeMark(close)) {
    state.error('unclosed-bracket', open, `This bracket is not closed: "${close}" is missing.`);
    return parts;
  }
  return afterBracket(state, first, parts);
}

function afterBracket(state: ParseState, first: number, parts: Step[]): Step[] {
  const start = state.at;
  state.skipLines();
  state.takeMark(',');
  let times = readTimes(state);
  if (!times) state.at = start;
  const where = readWheres(state);
  // "in next sp twice": the number may come after the place.
  if (where.length > 0 && !times) times = readTimes(state);
  const span = state.spanFrom(first);
  if (where.length > 0) {
    const amount = times?.kind === 'count' ? times.amount : amountOf(1);
    const group: GroupStep = { kind: 'group', parts, times: amount, where, ...span };
    return [group];
  }
  if (!times) return parts;
  const repeat: RepeatStep = {
    kind: 'repeat',
    mark: 'brackets',
    parts,
    times,
    partsBeforeEnd: null,
    ...span,
  };
  return [repeat];
}

/** Where the bracket ends if it only holds a remark, such as "(RS)" or "(mark this stitch)"; else 0. */
function remarkEnd(state: ParseState, close: string): number {
  let end = state.at + 1;
  while (end < state.tokens.length - 1 && state.tokens[end]?.text !== close) {
    const token = state.tokens[end];
    if (token?.kind === 'line' || (token?.kind === 'mark' && /[([{*]/.test(token.text))) return 0;
    end += 1;
  }
  if (state.tokens[end]?.text !== close) return 0;
  const start = state.at;
  state.at += 1;
  const remark = end > state.at && isComment(state, end);
  state.at = start;
  return remark ? end + 1 : 0;
}

/** Steps over what is nested too deep, bracket for bracket. */
function tooDeep(state: ParseState, first: number, close: string): Step[] {
  let open = 1;
  while (open > 0 && state.peek().kind !== 'end') {
    if (closerOf(state.peek().text) === close) open += 1;
    if (state.isMark(close)) open -= 1;
    state.at += 1;
  }
  const message = `Brackets may stand inside one another ${PATTERN_LIMITS.nesting} deep; this one is deeper.`;
  state.error('limit', state.tokens[first] ?? state.peek(), message);
  return [];
}
