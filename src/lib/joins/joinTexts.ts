/** A join as a pattern, in US terms. */
export interface JoinText {
  /**
   * seam: one row through or between the edges of two finished motifs, worked along the nearer one;
   * rounds: added to every motif.
   */
  readonly worked: 'seam' | 'rounds';
  /** The row, or the rounds as on the outer edge of the blanket. */
  readonly text: string;
  /** The last of the rounds on sides that link, every side; null for a seam. */
  readonly linked: string | null;
}

const pairs = (stitch: string, cornerChains: number): string =>
  `*Sk next st, 2 ${stitch} in next st, [ch 2, sk 3 sts, 2 ${stitch} in next st] to last st before corner, ` +
  `ch ${cornerChains}, sk next st, sk corner sp; rep from * 3 more times; join with sl st in first ${stitch}.`;

/** Loops anchored at each pair: the first and last of a side stay free, those between link. */
const loops = (stitch: string, chains: number): string =>
  `Ch 1, *[sc in next ${stitch}, ch ${chains}, sk next ${stitch}] to corner, sc in corner sp, ch ${chains}; ` +
  'rep from * 3 more times; join with sl st in first sc.';

const linkedLoops = (stitch: string, chains: number, half: number): string =>
  `Ch 1, *[sc in next ${stitch}, sk next ${stitch}, ch ${half}, sl st in facing ch-${chains} sp, ch ${half}] to last 2 sts before corner, ` +
  `sc in next ${stitch}, sk next ${stitch}, ch ${chains}, sc in corner sp, ch ${chains}; rep from * 3 more times; join with sl st in first sc.`;

const seam = (text: string): JoinText => ({ worked: 'seam', text, linked: null });

/** The ready-made joins that are worked with a hook, in the program's own words, by their keys. */
export const JOIN_TEXTS: Readonly<Record<string, JoinText>> = {
  'slip-stitch': seam('Sl st in each st across.'),
  'sc-ridge': seam('Sc in each st across.'),
  'flat-slip-stitch': seam(
    'Sl st in first st, sl st in facing st, *sl st in next st, sl st in facing st; rep from * across.',
  ),
  'zigzag-chain': seam(
    'Sc in next st, ch 2, sc in facing st, *ch 2, sk next st, sc in next st, ch 2, sc in facing st; rep from * across.',
  ),
  'flat-braid': {
    worked: 'rounds',
    text: 'Rnd 1: Ch 1, *sc in next st, [ch 5, sk next st, sc in next st] to corner, ch 7, sk corner sp; rep from * 3 more times; join with sl st in first sc.',
    linked:
      'Ch 1, *sc in next st, [ch 2, sl st in facing ch-5 sp, ch 2, sk next st, sc in next st] to corner, ch 3, sl st in facing corner, ch 3, sk corner sp; rep from * 3 more times; join with sl st in first sc.',
  },
  'reed-lace': {
    worked: 'rounds',
    text: `Rnd 1: ${pairs('dc', 3)}\nRnd 2: ${loops('dc', 3)}`,
    linked: linkedLoops('dc', 3, 1),
  },
  'lantern-lace': {
    worked: 'rounds',
    text:
      'Rnd 1: Ch 1, *sc in each st to corner, ch 2, sk corner sp; rep from * 3 more times; join with sl st in first sc.\n' +
      `Rnd 2: ${pairs('tr', 4)}\nRnd 3: ${loops('tr', 5)}`,
    linked: linkedLoops('tr', 5, 2),
  },
};
