import type { Amount, GroupStep, JoinStep, RepeatStep, StitchStep, Where } from '../syntax';
import type { StitchTerm } from '../terms/readStitch';
import { tellForeign } from './foreign';
import { isAmount, readAmount } from './amount';
import { readLoopsAfter, takeThroughBackLoop } from './insertion';
import { takeToFormRing, takeToJoin, targetOf } from './join';
import { amountOf, type ParseState } from './parseState';
import { readUntil } from './until';
import { readWheres } from './where';
import { ANY_STITCH } from './filter';

/** A stitch with its places: "2 dc in next ch-2 sp", "sc in each st around", "sl st in first dc to join". */
export function readStitchStep(
  state: ParseState,
  first: number,
  term: StitchTerm,
  amount: Amount | null,
  standing = false,
): StitchStep | GroupStep | JoinStep | RepeatStep {
  tellForeign(state, term);
  state.at = term.next;
  state.insertionHere = '';
  if (state.means('st') && !state.means('st', 1)) state.at += 1;
  const beforeRing = state.at;
  if (term.code === 'sl st' && takeToFormRing(state)) return join(state, first, 'ring');
  state.at = beforeRing;
  takeThroughBackLoop(state);
  let where = readWheres(state);
  if (where.length > 0) readLoopsAfter(state);
  takeThroughBackLoop(state);
  if (where.length === 0 && term.code === 'sl st') where = readTop(state);
  if (where.length === 0) {
    const until = readUntil(state);
    if (until) where = [{ kind: 'each', filter: ANY_STITCH, until }];
  }
  if (term.code === 'sl st') {
    if (takeToFormRing(state)) return join(state, first, 'ring');
    if (takeToJoin(state)) return join(state, first, targetOf(where));
    const [only] = where;
    if (only?.kind === 'turning-chain' && where.length === 1)
      return join(state, first, 'turning-chain');
    if (only?.kind === 'first' && endsRound(state)) return join(state, first, 'first');
  }
  const code = withInsertion(state, term.code);
  const span = state.spanFrom(first);
  const after = amount === null && where.length === 0 ? readTimesAfter(state) : null;
  if (after && term.takes > 1) return gathered(code, after, state.spanFrom(first));
  const each = amount ?? after ?? amountOf(1);
  if (term.perPlace > 1 && where.length === 0) return increases(code, term.perPlace, each, span);
  const times = term.perPlace * each.value;
  return {
    kind: 'stitch',
    code,
    amount: term.perPlace > 1 ? amountOf(times) : each,
    where,
    standing,
    ...span,
  };
}

/** "inc x 6", "sc2tog 6 times". */
function readTimesAfter(state: ParseState): Amount | null {
  const start = state.at;
  if (state.isWord('x') && isAmount(state, 1)) {
    state.at += 1;
    return readAmount(state);
  }
  const amount = isAmount(state) ? readAmount(state) : null;
  if (amount && state.take('times')) return amount;
  state.at = start;
  return null;
}

/** "sl st to top of ch-3", "sl st to first dc"; how far a slip stitch goes ("to corner") is read elsewhere. */
function readTop(state: ParseState): Where[] {
  const start = state.at;
  if (state.take('to')) {
    const where = readWheres(state, true);
    const isTop = where[0]?.kind === 'turning-chain' || where[0]?.kind === 'first';
    if (isTop && endsRound(state)) return where;
  }
  state.at = start;
  return [];
}

/** Whether nothing more of the round follows but its note: a slip stitch here closes it. */
function endsRound(state: ParseState): boolean {
  const { kind, text } = state.peek();
  if (kind === 'line' || kind === 'end') return true;
  return text === '.' || (text === '(' && state.peek(1).kind === 'number');
}

const join = (state: ParseState, first: number, to: JoinStep['to']): JoinStep => ({
  kind: 'join',
  code: 'sl st',
  to,
  ...state.spanFrom(first),
});

/** "sc2tog 6 times": each takes up as many stitches as it gathers. */
function gathered(code: string, amount: Amount, span: { begin: number; end: number }): RepeatStep {
  const one: StitchStep = {
    kind: 'stitch',
    code,
    amount: amountOf(1),
    where: [],
    standing: false,
    ...span,
  };
  const times = { kind: 'count', amount } as const;
  return { kind: 'repeat', mark: 'brackets', parts: [one], times, partsBeforeEnd: null, ...span };
}

/** "6 inc": two in each of the next six. */
const increases = (
  code: string,
  perPlace: number,
  times: Amount,
  span: { begin: number; end: number },
): StitchStep => ({
  kind: 'stitch',
  code,
  amount: amountOf(perPlace),
  where: [{ kind: 'next', amount: times, filter: ANY_STITCH }],
  standing: false,
  ...span,
});

/** "Work in back loops only" makes a dc a BLdc; posts and slip stitches stay what they are. */
function withInsertion(state: ParseState, code: string): string {
  const insertion = state.insertionHere || state.insertion;
  return insertion && /^(e?sc|e?hdc|e?dc|e?tr|dtr|trtr)$/.test(code) ? insertion + code : code;
}
