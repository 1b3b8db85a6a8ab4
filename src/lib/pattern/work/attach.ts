import type { AttachStep, ColourStep } from '../syntax';
import type { Hand } from './hand';
import { positionsOf } from './resolve';
import { intoOf } from './run';

/** A new yarn begins in any place of a kind; joined with a stitch, that stitch is made. */
export function workAttach(hand: Hand, step: AttachStep): boolean {
  if (step.colour !== null) hand.colour = step.colour;
  let position: number | 'ring' = hand.isRing ? 'ring' : hand.here;
  const [where] = step.where;
  if (where && !hand.isRing) {
    const positions = positionsOf(hand, where, step, 1);
    if (positions === null) return false;
    position = positions[0] ?? position;
    if (typeof position === 'number' && position > 0 && !hand.begun) {
      hand.beginAt(position);
      position = hand.home;
    }
  }
  if (step.code === null) return true;
  const isSlip = step.code === 'sl st';
  if (!isSlip) hand.begun = true;
  hand.make(step.code, isSlip ? 'join' : 'stitch', intoOf(hand, position), step, !isSlip);
  return true;
}

export function workColour(hand: Hand, step: ColourStep): boolean {
  hand.colour = step.colour;
  return true;
}
