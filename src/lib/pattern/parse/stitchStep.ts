import type { Amount, GroupStep, JoinStep, StitchStep } from '../syntax';
import type { StitchTerm } from '../terms/readStitch';
import { tellForeign } from './foreign';
import { isAmount, readAmount } from './amount';
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
): StitchStep | GroupStep | JoinStep {
  tellForeign(state, term);
  state.at = term.next;
  state.insertionHere = '';
  if (state.means('st') && !state.means('st', 1)) state.at += 1;
  const beforeRing = state.at;
  if (term.code === 'sl st' && takeToFormRing(state)) return join(state, first, 'ring');
  state.at = beforeRing;
  let where = readWheres(state);
  if (where.length === 0) {
    const until = readUntil(state);
    if (until) where = [{ kind: 'each', filter: ANY_STITCH, until }];
  }
  if (term.code === 'sl st') {
    if (takeToFormRing(state)) return join(state, first, 'ring');
    if (takeToJoin(state)) return join(state, first, targetOf(where));
    if (where.length === 1 && where[0]?.kind === 'turning-chain')
      return join(state, first, 'turning-chain');
  }
  const code = withInsertion(state, term.code);
  const span = state.spanFrom(first);
  const each = amount ?? (where.length === 0 ? readTimesAfter(state) : null) ?? amountOf(1);
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

/** "inc x 6", "sc x 4". */
function readTimesAfter(state: ParseState): Amount | null {
  if (!state.isWord('x') || !isAmount(state, 1)) return null;
  state.at += 1;
  return readAmount(state);
}

const join = (state: ParseState, first: number, to: JoinStep['to']): JoinStep => ({
  kind: 'join',
  code: 'sl st',
  to,
  ...state.spanFrom(first),
});

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
