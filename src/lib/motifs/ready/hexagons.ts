import type { ReadyPattern } from './readyPattern';

const CENTRE = `Rnd 1: Ch 3 (counts as dc), dc in magic ring, ch 2, [2 dc in ring, ch 2] 5 times; join with sl st in top of beg ch-3. (12 dc, 6 ch-2 sps)
Rnd 2: Ch 3, dc in next dc, *(dc, ch 2, dc) in corner sp, dc in each of next 2 dc; rep from * 4 more times, (dc, ch 2, dc) in corner sp; join with sl st in top of beg ch-3. (24 dc)`;

/** A dc in every stitch, with (dc, ch 2, dc) in every corner: 2 more on each side. */
const SOLID_ROUND = `Ch 3, dc in each st and sp to corner, *(dc, ch 2, dc) in corner sp, dc in each st and sp to corner; rep from * 4 more times, (dc, ch 2, dc) in corner sp, dc in each remaining st and sp; join with sl st in top of beg ch-3.`;

/** Motifs of six sides. */
export const HEXAGONS: readonly ReadyPattern[] = [
  {
    key: 'hexagon',
    name: 'Solid hexagon',
    sides: 6,
    about: 'A dc in every dc, one dc on each side of every corner.',
    text: `${CENTRE}
Rnds 3-5: Ch 3, dc in each dc to corner, *(dc, ch 2, dc) in corner sp, dc in each dc to corner; rep from * 4 more times, (dc, ch 2, dc) in corner sp, dc in each remaining dc; join with sl st in top of beg ch-3. (36, 48, 60 dc)`,
  },
  {
    key: 'lattice-hexagon',
    name: 'Lattice hexagon',
    sides: 6,
    about: 'Every other round is open: a dc, a chain over the next.',
    text: `${CENTRE}
Rnd 3: Ch 4 (counts as dc and ch-1 sp), sk next dc, dc in next dc, *(dc, ch 2, dc) in corner sp, [ch 1, sk next dc, dc in next dc] 2 times; rep from * 4 more times, (dc, ch 2, dc) in corner sp, ch 1, sk next dc; join with sl st in 3rd ch of beg ch-4. (24 dc, 12 ch-1 sps)
Rnd 4: ${SOLID_ROUND} (48 dc)
Rnd 5: Ch 4 (counts as dc and ch-1 sp), sk next dc, dc in next dc, ch 1, sk next dc, dc in next dc, *(dc, ch 2, dc) in corner sp, [ch 1, sk next dc, dc in next dc] 4 times; rep from * 4 more times, (dc, ch 2, dc) in corner sp, ch 1, sk next dc, dc in next dc, ch 1, sk next dc; join with sl st in 3rd ch of beg ch-4. (36 dc, 24 ch-1 sps)`,
  },
  {
    key: 'popcorn-hexagon',
    name: 'Popcorn hexagon',
    sides: 6,
    about: 'A solid hexagon with popcorns on its third round.',
    text: `${CENTRE}
Rnd 3: Ch 3, 5-dc pc in next dc, dc in next dc, *(dc, ch 2, dc) in corner sp, dc in next dc, 5-dc pc in next dc, dc in each of next 2 dc; rep from * 4 more times, (dc, ch 2, dc) in corner sp, dc in next dc; join with sl st in top of beg ch-3. (30 dc, 6 pc)
Rnd 4: ${SOLID_ROUND} (48 dc)
Rnd 5: ${SOLID_ROUND} (60 dc)`,
  },
  {
    key: 'circle-in-hexagon',
    name: 'Circle in a hexagon',
    sides: 6,
    about: 'Two rounds of a circle, brought to six corners, then solid rounds.',
    text: `Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join with sl st in top of beg ch-3. (12 dc)
Rnd 2: Ch 3, dc in same st, 2 dc in each dc around; join with sl st in top of beg ch-3. (24 dc)
Rnd 3: Ch 3, 2 dc in next dc, dc in next dc, *(dc, ch 2, dc) in next dc, dc in next dc, 2 dc in next dc, dc in next dc; rep from * 4 more times, (dc, ch 2, dc) in next dc; join with sl st in top of beg ch-3. (36 dc, 6 ch-2 sps)
Rnd 4: ${SOLID_ROUND} (48 dc)
Rnd 5: ${SOLID_ROUND} (60 dc)`,
  },
];
