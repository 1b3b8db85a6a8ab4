import { PATTERN_LIMITS } from '../limits';
import type { PatternText, RoundText, Step } from '../syntax';
import { readAgain } from './again';
import { isRepeatLine, readHeader, type Header } from './header';
import type { ParseState } from './parseState';
import { readSteps } from './steps';

/** Reads a whole pattern: what is made first, then its rounds. Never throws; goes on after every problem. */
export function parsePattern(state: ParseState): PatternText {
  const beforeRounds = readFoundation(state);
  const { foundation, first } = withoutHeader(state, beforeRounds);
  const rounds: RoundText[] = first ? [first] : [];
  while (state.peek().kind !== 'end' && rounds.length < PATTERN_LIMITS.rounds) {
    const round = readRound(state, rounds);
    rounds.push(round);
  }
  if (state.peek().kind !== 'end') {
    const message = `A pattern may have ${PATTERN_LIMITS.rounds} rounds; the rest is not read.`;
    state.error('limit', state.peek(), message);
  }
  if (rounds.length === 0) tellNoRounds(state);
  return { foundation, chainRules: state.chainRules, rounds, comments: state.comments };
}

function readFoundation(state: ParseState): Step[] {
  return readSteps(state, null);
}

function readRound(state: ParseState, before: readonly RoundText[]): RoundText {
  const first = state.at;
  const previous = before.at(-1)?.to ?? 0;
  const isUnnumbered = isRepeatLine(state);
  const header = readHeader(state, previous);
  tellOrder(state, header, previous);
  state.note = null;
  state.insertion = '';
  state.roundsOfLine = Math.max(1, header.to - header.from + 1);
  state.skipLines();
  const again = readAgain(state, previous);
  const to =
    isUnnumbered && again ? previous + again.times * (again.to - again.from + 1) : header.to;
  const steps = readSteps(state, null);
  const note = state.note as RoundText['note'];
  return {
    kind: (isUnnumbered && before.at(-1)?.kind) || header.kind,
    from: header.from,
    to: Math.min(to, header.from + PATTERN_LIMITS.rounds),
    header: header.span,
    side: header.side,
    colour: header.colour,
    again: again && { from: again.from, to: again.to, begin: again.begin, end: again.end },
    steps,
    note,
    ...trimmed(state, first),
  };
}

/**
 * Stitches before any header are round 1, whose header is left out: "Ch 2, 6 sc in 2nd ch from hook. Rnd 2: …".
 */
function withoutHeader(
  state: ParseState,
  steps: readonly Step[],
): { foundation: readonly Step[]; first: RoundText | null } {
  const begins = steps.findIndex(
    ({ kind }) => kind === 'stitch' || kind === 'group' || kind === 'repeat',
  );
  const opening = steps[begins];
  const last = steps.at(-1);
  if (!opening || !last) return { foundation: steps, first: null };
  // A ring that is closed is made before the round; a chain that is not belongs to it.
  const ring = steps
    .slice(0, begins)
    .findLastIndex(({ kind }) => kind === 'join' || kind === 'magic-ring');
  const own = steps.slice(ring + 1);
  const span = { begin: (own[0] ?? opening).begin, end: last.end };
  const message = 'These stitches are read as Rnd 1: write "Rnd 1:" before them.';
  state.report.say('note', 'no-rounds', opening, message, {
    label: 'Write "Rnd 1:"',
    begin: span.begin,
    end: span.begin,
    replacement: 'Rnd 1: ',
  });
  const first: RoundText = {
    kind: 'round',
    from: 1,
    to: 1,
    header: { begin: span.begin, end: span.begin },
    side: null,
    colour: null,
    again: null,
    steps: own,
    note: state.note,
    ...span,
  };
  return { foundation: steps.slice(0, ring + 1), first };
}

/** From the header to the last token that is not an end of line. */
function trimmed(state: ParseState, first: number): { begin: number; end: number } {
  let last = state.at - 1;
  while (last > first && state.tokens[last]?.kind === 'line') last -= 1;
  const begin = state.tokens[first]?.begin ?? 0;
  return { begin, end: Math.max(begin, state.tokens[last]?.end ?? begin) };
}

function tellOrder(state: ParseState, header: Header, previous: number): void {
  if (header.to < header.from) {
    state.error('round-order', header.span, `Rounds ${header.from} to ${header.to} run backwards.`);
  } else if (previous > 0 && header.from !== previous + 1) {
    const message = `After round ${previous} comes round ${previous + 1}, not ${header.from}.`;
    state.report.say('warning', 'round-order', header.span, message);
  }
}

function tellNoRounds(state: ParseState): void {
  const span = { begin: 0, end: state.peek().end };
  const message = 'There is no round here. A round begins with "Rnd 1:" or "Row 1:".';
  state.error('no-rounds', span, message);
}
