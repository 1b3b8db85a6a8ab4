import type { WorkedRound } from '../../../lib/pattern/reading';
import type { CountEntry, PatternText } from '../../../lib/pattern/syntax';
import { codeWord, type Terms } from '../../planner/stitchWord';

/** What the note of a round claims of that round: "48 dc, 4 ch-2 sps". */
export function claimInWords(round: WorkedRound, pattern: PatternText, terms: Terms): string {
  // A note may stand for several rounds, with a figure for each.
  const line = pattern.rounds.find(({ from, to }) => from <= round.number && round.number <= to);
  const nth = round.number - (line?.from ?? round.number);
  return (round.note?.entries ?? [])
    .map(({ amount, byRound, of, perSide }) => {
      const count = byRound?.[nth] ?? amount.value;
      return `${count}\u00a0${nounOf(of, count, terms)}${perSide ? ' a side' : ''}`;
    })
    .join(', ');
}

function nounOf(of: CountEntry['of'], count: number, terms: Terms): string {
  const many = count === 1 ? '' : 's';
  if (of.kind === 'stitch') return codeWord(of.code, terms);
  if (of.kind === 'all') return `st${many}`;
  return of.chains === null ? `sp${many}` : `ch-${of.chains}\u00a0sp${many}`;
}
