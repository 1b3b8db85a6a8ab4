import type { SkipStep } from '../syntax';
import type { Hand } from './hand';
import { tell } from './run';
import { counted, filterInWords } from './words';

/** Passes over places on purpose. */
export function workSkip(hand: Hand, step: SkipStep): boolean {
  if (hand.isRing) {
    tell(hand, 'no-such-place', step, 'There is nothing to skip in a ring.');
    return true;
  }
  const filter = step.filter.code === 'ch' && !hasChains(hand) ? chainsAsSpace(step) : step.filter;
  const times = filter === step.filter ? step.amount.value : 1;
  for (let i = 0; i < times; i += 1) {
    const position = hand.find(filter, hand.at, step);
    if (position < 0) {
      if (hand.attempts > 0) return false;
      const message = `This skips ${counted(times, 'st')}, but the round below has ${i} more ${filterInWords(filter, i)}.`;
      tell(hand, 'no-such-place', step, message);
      hand.explained = true;
      return true;
    }
    hand.at = position;
    hand.skipped += 1;
  }
  return true;
}

const hasChains = (hand: Hand): boolean => hand.below.places.some(({ code }) => code === 'ch');

/** "sk 2 ch" over a chain space is the space. */
const chainsAsSpace = (step: SkipStep) =>
  ({ of: 'space', code: null, chains: step.amount.value }) as const;
