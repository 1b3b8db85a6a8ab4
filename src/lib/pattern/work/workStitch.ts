import { abbreviationOf } from '../../stitches/ownStitch';
import type { StitchStep, Where } from '../syntax';
import type { Hand } from './hand';
import { takesOf } from './takes';
import { positionsOf, type Position } from './resolve';
import { intoOf, tell } from './run';

const ONE_STITCH = { of: 'stitch', code: null, chains: null } as const;

/** "3 dc in next ch-2 sp", "dc in each st around", "5 dc": false when a repeat tries and a place is missing. */
export function workStitch(hand: Hand, step: StitchStep): boolean {
  const takesNone = takesOf(step.code, hand.budget.ownTakes) === 0 && step.where.length === 0;
  if (takesNone || step.code.startsWith('picot-')) return picots(hand, step);
  const [first] = step.where;
  if (first?.kind === 'chain-from-hook' && hand.pending.length >= first.nth)
    return closePicot(hand, step, first.nth);
  if (hand.inPlace !== null && step.where.length === 0) {
    into(hand, step, hand.inPlace, step.amount.value);
    return true;
  }
  if (step.where.length === 0) return bare(hand, step);
  return step.where.every((where) => workWhere(hand, step, where));
}

/** Without a place: one in each of the next so many; in a ring, all in the ring. */
function bare(hand: Hand, step: StitchStep): boolean {
  if (hand.isRing) {
    if (hand.below.kind === 'nothing')
      tell(
        hand,
        'no-ring',
        step,
        'There is nothing to work into yet: no ring and no foundation chain.',
      );
    into(hand, step, 'ring', step.amount.value);
    return true;
  }
  const next: Where = { kind: 'next', amount: step.amount, filter: ONE_STITCH };
  return workWhere(hand, { ...step, amount: { value: 1, sizes: null } }, next);
}

function workWhere(hand: Hand, step: StitchStep, where: Where): boolean {
  if (where.kind === 'facing') return link(hand, step);
  if (where.kind === 'ring' && hand.below.kind === 'nothing') {
    tell(
      hand,
      'no-ring',
      step,
      'No ring has been made: begin with "Ch 4, join with sl st to form ring" or a magic ring.',
    );
  }
  const takes = takesOf(step.code, hand.budget.ownTakes);
  // "dc3tog in next ch-2 sp" gathers its legs in one place.
  const onePlace = hand.isRing || (where.kind === 'next' && where.filter.of !== 'stitch');
  const isTravel = travels(hand, step, where);
  // The round below was joined at its first stitch, where the hook stands: the next one is the second.
  if (isTravel && !hand.isRing && where.kind === 'next') hand.stand();
  const together = takes > 1 && !onePlace && where.kind !== 'same' && where.kind !== 'first';
  const legs = together && where.kind === 'next' && where.amount.value >= takes;
  const positions = positionsOf(
    hand,
    where,
    step,
    together && !legs && where.kind === 'next' ? takes : 1,
  );
  if (positions === null) return false;
  if (isTravel) {
    for (const position of positions)
      hand.make('sl st', 'travel', intoOf(hand, position), step, false);
    return true;
  }
  beginAfterTravel(hand);
  return placeAll(hand, step, positions, together ? takes : 1);
}

/** Slip stitches before anything else of a round walk to where it begins. */
const travels = (hand: Hand, step: StitchStep, where: Where): boolean =>
  step.code === 'sl st' &&
  !hand.begun &&
  hand.inPlace === null &&
  where.kind !== 'each' &&
  !step.standing;

/** What was only travelled over is worked last. */
export function beginAfterTravel(hand: Hand): void {
  const travelled = !hand.begun && hand.stitches.some(({ role }) => role === 'travel');
  hand.begun = true;
  if (travelled && !hand.isRing && hand.at > 0) hand.beginAt(hand.at);
}

function placeAll(
  hand: Hand,
  step: StitchStep,
  positions: readonly Position[],
  takes: number,
): boolean {
  if (takes === 1) {
    for (const position of positions) into(hand, step, position, step.amount.value);
    return true;
  }
  for (let i = 0; i + takes <= positions.length; i += takes) {
    into(hand, step, positions[i] as Position, step.amount.value);
  }
  const over = positions.length % takes;
  if (over > 0) {
    const message = `${abbreviationOf(step.code)} takes ${takes} stitches each time: ${over} of ${positions.length} are left over.`;
    tell(hand, 'unworked', step, message);
  }
  return true;
}

function into(hand: Hand, step: StitchStep, position: Position, count: number): void {
  hand.begun = true;
  for (let i = 0; i < count && !hand.budget.spent; i += 1) {
    hand.make(step.code, 'stitch', intoOf(hand, position), step, true);
  }
}

/** A picot, or a stitch of one's own that takes up none, stands on the stitch before it; nothing is worked into it. */
function picots(hand: Hand, step: StitchStep): boolean {
  hand.begun = true;
  for (let i = 0; i < step.amount.value && !hand.budget.spent; i += 1) {
    hand.make(step.code, 'picot', { kind: 'own-chain' }, step, false);
  }
  return true;
}

/** Takes hold of the motif beside this one: chains before and after it stay one loop, and nothing is worked into it. */
function link(hand: Hand, step: StitchStep): boolean {
  hand.begun = true;
  for (let i = 0; i < step.amount.value && !hand.budget.spent; i += 1) {
    hand.make(step.code, 'link', { kind: 'facing' }, step, false);
  }
  return true;
}

/** "ch 3, sl st in 3rd ch from hook": the chains are a picot and no space. */
function closePicot(hand: Hand, step: StitchStep, nth: number): boolean {
  for (const index of hand.pending.splice(hand.pending.length - nth, nth)) {
    const stitch = hand.stitches[index];
    if (stitch) stitch.role = 'picot';
  }
  hand.make(step.code, 'picot', { kind: 'own-chain' }, step, false);
  return true;
}
