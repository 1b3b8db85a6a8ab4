import type { ReadyPattern } from './readyPattern';

/** Motifs of three and eight sides. */
export const OTHER_SHAPES: readonly ReadyPattern[] = [
  {
    key: 'triangle',
    name: 'Solid triangle',
    sides: 3,
    about: 'A dc in every dc, three dc and a tr on each side of every corner.',
    text: `Ch 4, join with sl st to form ring.
Rnd 1: Ch 3 (counts as dc), 3 dc in ring, ch 2, [4 dc in ring, ch 2] 2 times; join with sl st in top of beg ch-3. (12 dc, 3 ch-2 sps)
Rnds 2-4: Ch 3, dc in each st to corner, *(3 dc, tr, ch 2, tr, 3 dc) in corner sp, dc in each st to corner; rep from * once more, (3 dc, tr, ch 2, tr, 3 dc) in corner sp, dc in each remaining st; join with sl st in top of beg ch-3. (36, 60, 84 sts)`,
  },
  {
    key: 'octagon',
    name: 'Tall octagon',
    sides: 8,
    about: 'Rounds of tr, one on each side of every corner.',
    text: `Ch 6, join with sl st to form ring.
Rnd 1: Ch 4 (counts as tr), tr in ring, ch 1, [2 tr in ring, ch 1] 7 times; join with sl st in top of beg ch-4. (16 tr, 8 ch-1 sps)
Rnds 2-4: Ch 4 (counts as tr), tr in each tr to corner, *(tr, ch 1, tr) in corner sp, tr in each tr to corner; rep from * 6 more times, (tr, ch 1, tr) in corner sp, tr in each remaining tr; join with sl st in top of beg ch-4. (32, 48, 64 tr)`,
  },
];
