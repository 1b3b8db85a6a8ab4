import { DomainError } from '../errors';
import { normalQuantile, normalTail } from '../stats/normal';

/** How far a skein may differ from its put-up: a lawful 4.5 % short taken as three sigma (76/211/EEC). */
export const SKEIN_SPREAD = 0.015;

/** What is needed of one colour, in metres. */
export interface Need {
  readonly meanM: number;
  readonly varianceM2: number;
}

const sdWith = (need: Need, skeins: number, putUpM: number): number =>
  Math.sqrt(need.varianceM2 + skeins * (SKEIN_SPREAD * putUpM) ** 2);

/**
 * The least whole number of skeins n with mean + z × sd(need and n skeins) at most n put-ups.
 * 0 when nothing is needed; a mean below zero stands for yarn already owned. Never falls as `confidence` (0.5 to under 1) rises.
 * Throws DomainError for a need that is not a number or that no countable number of skeins covers.
 *
 * Example: mean 380 m, variance 100 m², skeins of 200 m: 2 at 95 %; 384 m would need 3 at 99 %.
 */
export function skeinsFor(need: Need, putUpM: number, confidence: number): number {
  const z = normalQuantile(confidence);
  const enough = (n: number): boolean => need.meanM + z * sdWith(need, n, putUpM) <= n * putUpM;
  if (enough(0)) return 0;
  let most = Math.max(1, Math.ceil(need.meanM / putUpM));
  while (most <= Number.MAX_SAFE_INTEGER && !enough(most)) most *= 2;
  // Also when `most` is not a number, which is neither enough nor too many.
  if (!(most <= Number.MAX_SAFE_INTEGER)) {
    throw new DomainError(
      'need-out-of-range',
      `skeinsFor requires a need that skeins can be counted for, got ${need.meanM} m with variance ${need.varianceM2} m² in skeins of ${putUpM} m at ${confidence}`,
    );
  }
  let least = 0;
  while (most - least > 1) {
    const middle = Math.floor((least + most) / 2);
    if (enough(middle)) most = middle;
    else least = middle;
  }
  return most;
}

/** Chance that `skeins` put-ups are too short: `probabilityShort(need, 2, 200)`, 0 to 1. */
export const probabilityShort = (need: Need, skeins: number, putUpM: number): number =>
  normalTail((skeins * putUpM - need.meanM) / sdWith(need, skeins, putUpM));

/** What to own so that it suffices with this confidence, in metres, before whole skeins. */
export const quantileM = ({ meanM, varianceM2 }: Need, confidence: number): number =>
  Math.max(0, meanM + normalQuantile(confidence) * Math.sqrt(varianceM2));
