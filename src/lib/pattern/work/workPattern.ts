import { ownStitchCode } from '../../stitches/ownStitch';
import type { Place, ReadOptions, WorkedRing, WorkedRound } from '../reading';
import type { Report } from '../report';
import type { PatternText, RoundText, Step } from '../syntax';
import { checkCorners } from './checkCorners';
import { checkClosed, checkNote, checkUnworked } from './checks';
import { cornersBelow } from './cornersBelow';
import type { CornerSearch } from './corners';
import { finishRound } from './finishRound';
import { foundationOf } from './foundation';
import { Hand } from './hand';
import { plannedRounds, type PlannedRound } from './plannedRounds';
import { run } from './run';
import { Budget, type Below } from './state';

export interface WorkedPattern {
  readonly ring: WorkedRing;
  readonly rounds: WorkedRound[];
  readonly workSteps: number;
}

/** Works a pattern as a hand does, round by round, and reports what cannot be worked. */
export function workPattern(
  pattern: PatternText,
  { sides, terms, ownStitches = [] }: Pick<ReadOptions, 'sides' | 'terms' | 'ownStitches'>,
  report: Report,
): WorkedPattern {
  const ownTakes = new Map(ownStitches.map((each) => [ownStitchCode(each), each.takes]));
  const budget = new Budget(report, pattern.chainRules, terms, ownTakes);
  const { ring, firstSteps } = foundationOf(pattern, budget);
  const rounds: WorkedRound[] = [];
  const texts: RoundText[] = [];
  const hands: { hand: Hand; text: RoundText }[] = [];
  const seeming: CornerSearch['seeming'][] = [];
  let below = belowRing(ring);
  let start = 0;
  let colour = foundationColour(pattern);
  for (const planned of plannedRounds(pattern, firstSteps, report)) {
    if (budget.spent) break;
    const { text } = planned;
    const isBack = planned.turnsFirst || (text.kind === 'row' && rounds.length > 0);
    // A row is worked back from its end, a round from where it was joined.
    const end = text.kind === 'row' ? Math.max(0, below.order.length - 1) : start;
    const hand = new Hand(isBack ? turned(below, end) : below, budget, isBack ? 0 : start);
    hand.colour = text.colour ?? colour;
    hand.isBack = isBack;
    hand.isRow = text.kind === 'row';
    work(hand, planned);
    checkUnworked(hand, text, report);
    hands.push({ hand, text });
    const note = planned.note;
    const finished = finishRound(hand, text, planned.number, sides, note);
    rounds.push(finished.round);
    texts.push(text);
    seeming.push(finished.seeming);
    colour = hand.colour;
    below = belowRound(finished.round, hand);
    start = hand.endsInSpace ? Math.max(0, finished.round.places.length - 1) : 0;
  }
  const joined = hands.some(({ hand }) => hand.joined);
  for (const { hand, text } of hands) checkClosed(hand, text, joined, report);
  cornersBelow(rounds, sides);
  rounds.forEach((round, i) => {
    const text = texts[i];
    if (round.note && text) checkNote(round, round.note, round.number - text.from, report);
  });
  checkCorners(rounds, texts, seeming, sides, report);
  return { ring, rounds, workSteps: budget.steps };
}

function work(hand: Hand, { steps }: PlannedRound): void {
  run(hand, steps, false);
  hand.closeSpace();
}

const foundationColour = ({ foundation }: PatternText): string | null => {
  const step = foundation.findLast(({ kind }) => kind === 'colour' || kind === 'attach') as
    Extract<Step, { colour: string | null }> | undefined;
  return step?.colour ?? null;
};

function belowRing(ring: WorkedRing): Below {
  if (ring.kind === 'chain-row') return inOrder(ring.places, [], null);
  return { ...inOrder([], [], null), kind: ring.kind === 'none' ? 'nothing' : 'ring' };
}

const belowRound = ({ places, corner }: WorkedRound, hand: Hand): Below =>
  inOrder(
    places,
    hand.places.map(({ into }) => into),
    corner,
  );

const inOrder = (
  places: readonly Place[],
  into: readonly number[],
  corner: Below['corner'],
): Below => ({
  kind: places.length > 0 ? 'places' : 'nothing',
  places,
  into,
  corner,
  order: places.map((_, i) => i),
});

/** Worked back: from the place where the round was joined, the other way round; a row from its end. */
function turned(below: Below, start: number): Below {
  const count = below.order.length;
  const order = below.order.map((_, i) => (start - i + count) % count);
  return { ...below, order };
}
