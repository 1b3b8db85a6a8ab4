import type { GroupStep, Where } from '../syntax';
import type { Hand } from './hand';
import { positionsOf } from './resolve';
import { run, tell } from './run';
import { beginAfterTravel } from './workStitch';

/** All parts in one place, then all in the next place, if several are named. */
export function workGroup(hand: Hand, step: GroupStep): boolean {
  return step.where.every((where) => inOneWhere(hand, step, where));
}

function inOneWhere(hand: Hand, step: GroupStep, where: Where): boolean {
  if (where.kind === 'ring' && hand.below.kind === 'nothing') {
    tell(hand, 'no-ring', step, 'No ring has been made to work into.');
  }
  const positions = positionsOf(hand, where, step, 1);
  if (positions === null) return false;
  beginAfterTravel(hand);
  return positions.every((position) => fill(hand, step, position));
}

function fill(hand: Hand, step: GroupStep, position: number | 'ring'): boolean {
  const outer = hand.inPlace;
  hand.inPlace = position;
  let done = true;
  for (let i = 0; done && i < step.times.value && !hand.budget.spent; i += 1) {
    done = run(hand, step.parts, true);
  }
  hand.inPlace = outer;
  return done;
}
