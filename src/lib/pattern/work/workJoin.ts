import { stitch } from '../../stitches/stitchTable';
import type { JoinStep } from '../syntax';
import type { Hand } from './hand';

/** Closes the round; a stitch taller than a slip stitch closes it with a space as wide as its height. */
export function workJoin(hand: Hand, step: JoinStep): boolean {
  const tall = stitch(step.code)?.turningChains ?? 0;
  hand.closeSpace(tall);
  hand.make(step.code, 'join', { kind: 'round-start' }, step, false);
  hand.joined = true;
  hand.endsInSpace = tall > 0;
  return true;
}
