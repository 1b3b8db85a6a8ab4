import { handVarianceM2, ownStitchVarianceM2, type Hand } from '../hand/hand';
import { addUse, NO_YARN } from '../hand/yarnUse';
import type { ColourLedger } from './colourLedger';
import type { Cause, UncertaintyShare } from './ledger';

/**
 * What the variance of the whole blanket's yarn is made of, largest first.
 * hand: the maker's own pull, common to all stitches; stitch: how single stitches differ from it;
 * sewing: the sewn seams' factor; motifs: each piece differs; tails; skeins: short or long put-ups.
 */
export function uncertaintyOf(
  hand: Hand,
  colours: readonly ColourLedger[],
  skeinVarianceM2: number,
): UncertaintyShare[] {
  const whole = colours.reduce((sum, { use }) => addUse(sum, use), NO_YARN);
  const loopsOnly = { ...whole, seamM: 0 };
  const loopsM2 = handVarianceM2(hand, loopsOnly);
  const stitchM2 = ownStitchVarianceM2(hand, loopsOnly);
  const sum = (of: (colour: ColourLedger) => number): number =>
    colours.reduce((total, colour) => total + of(colour), 0);
  const variances: Record<Cause, number> = {
    hand: Math.max(0, loopsM2 - stitchM2),
    stitch: stitchM2,
    sewing: Math.max(0, handVarianceM2(hand, whole) - loopsM2),
    motifs: sum(({ pieceVarianceM2 }) => pieceVarianceM2),
    tails: sum(({ tailVarianceM2 }) => tailVarianceM2),
    skeins: skeinVarianceM2,
  };
  const total = Object.values(variances).reduce((all, variance) => all + variance, 0);
  return (Object.entries(variances) as [Cause, number][])
    .map(([cause, varianceM2]) => ({
      cause,
      varianceM2,
      share: total > 0 ? varianceM2 / total : 0,
    }))
    .sort((left, right) => right.varianceM2 - left.varianceM2);
}
