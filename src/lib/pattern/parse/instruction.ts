import type { Step } from '../syntax';
import { readAmount, isAmount } from './amount';
import { readChain, readCountedChain, readCountsAs } from './chain';
import { readColour } from './colour';
import { ANY_STITCH, readFilter } from './filter';
import { readJoin } from './join';
import { amountOf, type ParseState } from './parseState';
import { readPlacedFirst } from './placedFirst';
import { isMagic, ringLength } from './ring';
import { readStitchStep } from './stitchStep';
import { readUnknown } from './unknown';
import { readWheres } from './where';

/** One instruction, from a word or number on; no step where it only tells something. */
export function readInstruction(state: ParseState): Step[] {
  const first = state.at;
  state.skipFillers();
  state.take('and');
  state.skipFillers();
  if (state.peek().kind === 'line' || state.peek().kind === 'mark') return [];
  return plainWord(state, first) ?? counted(state, first) ?? readUnknown(state, first);
}

function plainWord(state: ParseState, first: number): Step[] | null {
  if (state.isWord('v') && /^sts?$/.test(state.peek(state.isMark('-', 1) ? 2 : 1).text))
    return vStitch(state, first);
  const term = state.stitchHere();
  if (term && state.peek().kind === 'word') {
    if (term.code === 'ch') return [readChain(state, first)];
    return [readStitchStep(state, first, term, null)];
  }
  if (state.isWord('standing')) return standing(state, first);
  if (state.means('skip')) return skip(state, first);
  if (state.means('join')) return [readJoin(state)];
  if (state.means('turn')) return plain(state, first, 'turn', 1);
  if (state.isWord('fasten') || state.isWord('cut') || state.isWord('break'))
    return fastenOff(state, first);
  if (isMagic(state)) return plain(state, first, 'magic-ring', ringLength(state));
  if (state.means('with') || state.isWord('change')) return colour(state, first);
  if (state.isWord('rs') || state.isWord('ws') || state.isWord('right') || state.isWord('wrong'))
    return facing(state);
  if (state.isWord('beg') || state.means('beginning')) return beginning(state);
  return readPlacedFirst(state);
}

/** "3 dc", "3 ch", "5-dc pc in next st". */
function counted(state: ParseState, first: number): Step[] | null {
  const legs = state.peek().kind === 'number' ? state.stitchHere() : null;
  if (legs) return [readStitchStep(state, first, legs, null)];
  const amount = readAmount(state);
  if (!amount) return null;
  const amountSpan = state.spanFrom(first);
  if (state.isMark('-') && state.stitchHere(1)) state.at += 1;
  state.skipFillers();
  const term = state.stitchHere();
  if (term?.code === 'ch') return [readCountedChain(state, first, amount, amountSpan)];
  if (term) return [readStitchStep(state, first, term, amount)];
  return null;
}

/** "(dc, ch 1, dc)" in one place, by its name; common practice, no source. */
function vStitch(state: ParseState, first: number): Step[] {
  state.at += state.isMark('-', 1) ? 3 : 2;
  const span = state.spanFrom(first);
  const where = readWheres(state);
  const stitchOf = {
    kind: 'stitch',
    code: 'dc',
    amount: amountOf(1),
    where: [],
    standing: false,
    ...span,
  } as const;
  const chain = {
    kind: 'chain',
    amount: amountOf(1),
    amountSpan: span,
    standsFor: null,
    ...span,
  } as const;
  return [
    {
      kind: 'group',
      parts: [stitchOf, chain, stitchOf],
      times: amountOf(1),
      where: where.length > 0 ? where : [{ kind: 'next', amount: amountOf(1), filter: ANY_STITCH }],
      ...state.spanFrom(first),
    },
  ];
}

function standing(state: ParseState, first: number): Step[] | null {
  const term = state.stitchHere(1);
  if (!term) return null;
  return [readStitchStep(state, first, term, null, true)];
}

/** "sk 2 sts", "skip next st", "sk next ch-1 sp". */
function skip(state: ParseState, first: number): Step[] {
  state.at += 1;
  state.skipFillers();
  state.take('each');
  state.take('of');
  if (!state.take('next')) if (!state.take('last')) state.take('first');
  const amount = isAmount(state) ? readAmount(state) : null;
  const filter = readFilter(state) ?? ANY_STITCH;
  return [{ kind: 'skip', amount: amount ?? amountOf(1), filter, ...state.spanFrom(first) }];
}

function plain(
  state: ParseState,
  first: number,
  kind: 'turn' | 'magic-ring' | 'fasten-off',
  words: number,
): Step[] {
  state.at += words;
  return [{ kind, ...state.spanFrom(first) }];
}

/** "fasten off", "fasten off A", "cut yarn", "break B". */
function fastenOff(state: ParseState, first: number): Step[] {
  state.at += 1;
  if (state.isWord('off')) state.at += 1;
  readColour(state);
  return [{ kind: 'fasten-off', ...state.spanFrom(first) }];
}

/** "with B", "change to colour C", "using coral". */
function colour(state: ParseState, first: number): Step[] {
  state.at += 1;
  if (state.means('to') || state.isWord('colour') || state.isWord('color')) state.at += 1;
  state.take('to');
  if (/^(rs|ws|right|wrong)$/.test(state.peek().text)) return facing(state);
  const name = readColour(state);
  return name === null ? [] : [{ kind: 'colour', colour: name, ...state.spanFrom(first) }];
}

/** "RS facing", "right side facing": tells which side is seen. */
function facing(state: ParseState): Step[] {
  state.at += 1;
  if (/^sides?$/.test(state.peek().text)) state.at += 1;
  if (state.isWord('facing')) state.at += 1;
  return [];
}

/** "beg cl (ch 2, dc2tog)" and "ch 3 counts as dc" that stand on their own say how something is made. */
function beginning(state: ParseState): Step[] | null {
  const start = state.at;
  state.at += 1;
  const term = state.stitchHere();
  if (term && term.code !== 'ch') {
    state.at = term.next;
    return state.isMark('(') || state.isMark(':') || state.isMark('=') ? [] : null;
  }
  if (term) {
    const [step] = [readChain(state, start)];
    readCountsAs(state);
    return [step];
  }
  state.at = start;
  return null;
}
