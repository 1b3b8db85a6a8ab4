import type { BorderFix } from './borderFit';
import type { FourSides } from './edging';

const SIDES = ['top', 'right', 'bottom', 'left'] as const;

/**
 * What a fix asks of the hand: "In the round before, work 2 more on the top and bottom, and 1 fewer
 * on the right and left, spread evenly." `sc` is the reader's word for it.
 */
export function fixInWords(fix: BorderFix, sc: string): string {
  if (fix.kind === 'rounds') {
    const rounds = fix.count === 1 ? 'a round' : `${fix.count} rounds`;
    return `Work ${rounds} of ${sc} before it, with 3 ${sc} in each corner: 2 more a side each.`;
  }
  const where = fix.inserted
    ? `Work a round of ${sc} before it, with`
    : 'In the round before, work';
  return `${where} ${addInWords(fix.add)}, spread evenly.`;
}

/** "2 more on every side", "2 more on the top and bottom, and 1 fewer on the right and left". */
export function addInWords(add: FourSides): string {
  const amounts = [...new Set(add)].filter((amount) => amount !== 0);
  const parts = amounts.map((amount) => {
    const sides = SIDES.filter((_, i) => add[i] === amount);
    const word = `${Math.abs(amount)} ${amount > 0 ? 'more' : 'fewer'}`;
    return sides.length === 4 ? `${word} on every side` : `${word} on the ${sides.join(' and ')}`;
  });
  return parts.join(', and ') || 'as many as there are';
}
