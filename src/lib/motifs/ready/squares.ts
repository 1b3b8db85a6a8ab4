import type { ReadyPattern } from './readyPattern';

const SOLID_CENTRE = `Ch 4, join with sl st to form ring.
Rnd 1: Ch 3 (counts as dc), 2 dc in ring, ch 2, [3 dc in ring, ch 2] 3 times; join with sl st in top of beg ch-3. (12 dc, 4 ch-2 sps)
Rnd 2: Ch 3, dc in each of next 2 dc, *(2 dc, ch 2, 2 dc) in corner sp, dc in each of next 3 dc; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp; join with sl st in top of beg ch-3. (28 dc)`;

/** A round of dc in every stitch, with (2 dc, ch 2, 2 dc) in every corner: 4 more on each side. */
const SOLID_ROUND = `Ch 3, dc in each st and sp to corner, *(2 dc, ch 2, 2 dc) in corner sp, dc in each st and sp to corner; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in each remaining st and sp; join with sl st in top of beg ch-3.`;

/** Squares, closed and open. */
export const SQUARES: readonly ReadyPattern[] = [
  {
    key: 'group-square',
    name: 'Classic group square',
    sides: 4,
    about: 'Groups of three dc with a chain between, two groups in each corner.',
    text: `Ch 4, join with sl st to form ring.
Rnd 1: Ch 3 (counts as dc), 2 dc in ring, ch 2, *3 dc in ring, ch 2; rep from * 2 more times; join with sl st in top of beg ch-3. (12 dc, 4 ch-2 sps)
Rnd 2: Sl st in next 2 dc and in next ch-2 sp, ch 3, (2 dc, ch 2, 3 dc) in same sp, ch 1, *(3 dc, ch 2, 3 dc) in next ch-2 sp, ch 1; rep from * 2 more times; join with sl st in top of beg ch-3. (24 dc, 4 ch-2 sps, 4 ch-1 sps)
Rnds 3-8: Sl st in next 2 dc and in next ch-2 sp, ch 3, (2 dc, ch 2, 3 dc) in same sp, ch 1, *[3 dc in next ch-1 sp, ch 1] to corner, (3 dc, ch 2, 3 dc) in corner sp, ch 1; rep from * 2 more times, [3 dc in next ch-1 sp, ch 1] to end; join with sl st in top of beg ch-3. (36, 48, 60, 72, 84, 96 dc)`,
  },
  {
    key: 'solid-square',
    name: 'Solid dc square',
    sides: 4,
    about: 'A dc in every dc, two dc on each side of every corner.',
    text: `${SOLID_CENTRE}
Rnds 3-6: Ch 3, dc in each dc to corner, *(2 dc, ch 2, 2 dc) in corner sp, dc in each dc to corner; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in each remaining dc; join with sl st in top of beg ch-3. (44, 60, 76, 92 dc)`,
  },
  {
    key: 'circle-in-square',
    name: 'Circle in a square',
    sides: 4,
    about:
      'Three rounds of a circle, squared off with tall corners and low sides, then a solid round.',
    text: `Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join with sl st in top of beg ch-3. (12 dc)
Rnd 2: Ch 3, dc in same st, 2 dc in each dc around; join with sl st in top of beg ch-3. (24 dc)
Rnd 3: Ch 3, 2 dc in next dc, *dc in next dc, 2 dc in next dc; rep from * around; join with sl st in top of beg ch-3. (36 dc)
Rnd 4: Ch 4 (counts as tr), (tr, ch 2, 2 tr) in same st, *dc in each of next 2 dc, hdc in next dc, sc in each of next 2 dc, hdc in next dc, dc in each of next 2 dc**, (2 tr, ch 2, 2 tr) in next dc; rep from * around, ending last rep at **; join with sl st in top of beg ch-4. (16 tr, 16 dc, 8 hdc, 8 sc)
Rnd 5: Ch 3, dc in next tr, *(2 dc, ch 2, 2 dc) in corner sp, dc in each st to corner; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in each remaining st; join with sl st in top of beg ch-3. (64 dc)`,
  },
  {
    key: 'two-colour-square',
    name: 'Two-colour sc square',
    sides: 4,
    about: 'Rounds of sc with three in each corner, in two colours turn about.',
    text: `Rnd 1 (with A): Ch 1, 8 sc in magic ring; join with sl st in first sc. (8 sc)
Rnd 2 (with B): Ch 1, sc in same st, 3 sc in next sc, *sc in next sc, 3 sc in next sc; rep from * 2 more times; join with sl st in first sc. (16 sc)
Rnd 3 (with A): Ch 1, sc in same st, sc in each sc to corner, *3 sc in corner, sc in each sc to corner; rep from * 2 more times, 3 sc in corner, sc in each remaining sc; join with sl st in first sc. (24 sc)
Rnd 4 (with B): Rep Rnd 3. (32 sc)
Rnd 5 (with A): Rep Rnd 3. (40 sc)
Rnd 6 (with B): Rep Rnd 3. (48 sc)
Rnd 7 (with A): Rep Rnd 3. (56 sc)
Rnd 8 (with B): Rep Rnd 3. (64 sc)`,
  },
  {
    key: 'window-square',
    name: 'Window square',
    sides: 4,
    about: 'Open rounds of dc and chains between closed ones.',
    text: `${SOLID_CENTRE}
Rnd 3: Ch 4 (counts as dc and ch-1 sp), sk next dc, dc in next dc, ch 1, sk next dc, dc in next dc, *(2 dc, ch 2, 2 dc) in corner sp, dc in next dc, [ch 1, sk next dc, dc in next dc] 3 times; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in next dc, ch 1, sk next dc; join with sl st in 3rd ch of beg ch-4. (32 dc, 12 ch-1 sps)
Rnd 4: ${SOLID_ROUND} (60 dc)
Rnd 5: Ch 4 (counts as dc and ch-1 sp), sk next dc, [dc in next dc, ch 1, sk next dc] 3 times, dc in next dc, *(2 dc, ch 2, 2 dc) in corner sp, dc in next dc, [ch 1, sk next dc, dc in next dc] 7 times; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in next dc, [ch 1, sk next dc, dc in next dc] 2 times, ch 1, sk next dc; join with sl st in 3rd ch of beg ch-4. (48 dc, 28 ch-1 sps)
Rnd 6: ${SOLID_ROUND} (92 dc)`,
  },
  {
    key: 'cluster-square',
    name: 'Cluster square',
    sides: 4,
    about: 'A solid square with rounds of clusters that stand up from it.',
    text: `${SOLID_CENTRE}
Rnd 3: Ch 3, [dc3cl in next dc, dc in next dc] 2 times, *(2 dc, ch 2, 2 dc) in corner sp, dc in next dc, [dc3cl in next dc, dc in next dc] 3 times; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in next dc, dc3cl in next dc; join with sl st in top of beg ch-3. (32 dc, 12 cl)
Rnd 4: ${SOLID_ROUND} (60 dc)
Rnd 5: Ch 3, [dc3cl in next dc, dc in next dc] 4 times, *(2 dc, ch 2, 2 dc) in corner sp, dc in next dc, [dc3cl in next dc, dc in next dc] 7 times; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in next dc, [dc3cl in next dc, dc in next dc] 2 times, dc3cl in next dc; join with sl st in top of beg ch-3. (48 dc, 28 cl)
Rnd 6: ${SOLID_ROUND} (92 dc)`,
  },
  {
    key: 'popcorn-square',
    name: 'Popcorn square',
    sides: 4,
    about: 'A popcorn in the middle of each side of one round, three in the next but one.',
    text: `${SOLID_CENTRE}
Rnd 3: Ch 3, dc in each of next 4 dc, *(2 dc, ch 2, 2 dc) in corner sp, dc in each of next 3 dc, 5-dc pc in next dc, dc in each of next 3 dc; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in next dc, 5-dc pc in next dc; join with sl st in top of beg ch-3. (40 dc, 4 pc)
Rnd 4: ${SOLID_ROUND} (60 dc)
Rnd 5: Ch 3, [5-dc pc in next dc, dc in each of next 3 dc] 2 times, *(2 dc, ch 2, 2 dc) in corner sp, dc in each of next 3 dc, [5-dc pc in next dc, dc in each of next 3 dc] 3 times; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in each of next 3 dc, 5-dc pc in next dc, dc in each of next 2 dc; join with sl st in top of beg ch-3. (64 dc, 12 pc)
Rnd 6: ${SOLID_ROUND} (92 dc)`,
  },
  {
    key: 'ridged-square',
    name: 'Ridged square',
    sides: 4,
    about: 'Post stitches of the front, each on the one below, make ribs from the middle outward.',
    text: `${SOLID_CENTRE}
Rnd 3: Ch 3, FPdc around next dc, dc in next dc, *dc in each of next 2 dc, (2 dc, ch 2, 2 dc) in corner sp, dc in each of next 2 dc, dc in next dc, FPdc around next dc, dc in next dc; rep from * 2 more times, dc in each of next 2 dc, (2 dc, ch 2, 2 dc) in corner sp, dc in each of next 2 dc; join with sl st in top of beg ch-3. (40 dc, 4 FPdc)
Rnd 4: Ch 3, FPdc around next FPdc, dc in each dc to corner, *(2 dc, ch 2, 2 dc) in corner sp, dc in each of next 5 dc, FPdc around next FPdc, dc in each dc to corner; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in each remaining dc; join with sl st in top of beg ch-3. (56 dc, 4 FPdc)
Rnd 5: Ch 3, FPdc around next FPdc, dc in each dc to corner, *(2 dc, ch 2, 2 dc) in corner sp, dc in each of next 7 dc, FPdc around next FPdc, dc in each dc to corner; rep from * 2 more times, (2 dc, ch 2, 2 dc) in corner sp, dc in each remaining dc; join with sl st in top of beg ch-3. (72 dc, 4 FPdc)`,
  },
];
