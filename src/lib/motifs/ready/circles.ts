import type { ReadyPattern } from './readyPattern';

/** Motifs without sides. */
export const CIRCLES: readonly ReadyPattern[] = [
  {
    key: 'circle',
    name: 'Flat dc circle',
    sides: 0,
    about: 'Twelve more dc in every round.',
    text: `Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join with sl st in top of beg ch-3. (12 dc)
Rnd 2: Ch 3, dc in same st, 2 dc in each dc around; join with sl st in top of beg ch-3. (24 dc)
Rnd 3: Ch 3, 2 dc in next dc, *dc in next dc, 2 dc in next dc; rep from * around; join with sl st in top of beg ch-3. (36 dc)
Rnd 4: Ch 3, dc in next dc, 2 dc in next dc, *dc in each of next 2 dc, 2 dc in next dc; rep from * around; join with sl st in top of beg ch-3. (48 dc)
Rnd 5: Ch 3, dc in each of next 2 dc, 2 dc in next dc, *dc in each of next 3 dc, 2 dc in next dc; rep from * around; join with sl st in top of beg ch-3. (60 dc)`,
  },
  {
    key: 'hdc-circle',
    name: 'Flat hdc circle',
    sides: 0,
    about: 'Nine more hdc in every round: lower and denser than dc.',
    text: `Rnd 1: Ch 2 (counts as hdc), 8 hdc in magic ring; join with sl st in top of beg ch-2. (9 hdc)
Rnd 2: Ch 2 (counts as hdc), hdc in same st, 2 hdc in each hdc around; join with sl st in top of beg ch-2. (18 hdc)
Rnd 3: Ch 2 (counts as hdc), 2 hdc in next hdc, *hdc in next hdc, 2 hdc in next hdc; rep from * 7 more times; join with sl st in top of beg ch-2. (27 hdc)
Rnd 4: Ch 2 (counts as hdc), hdc in next hdc, 2 hdc in next hdc, *hdc in each of next 2 hdc, 2 hdc in next hdc; rep from * around; join with sl st in top of beg ch-2. (36 hdc)
Rnd 5: Ch 2 (counts as hdc), hdc in each of next 2 hdc, 2 hdc in next hdc, *hdc in each of next 3 hdc, 2 hdc in next hdc; rep from * around; join with sl st in top of beg ch-2. (45 hdc)`,
  },
  {
    key: 'sc-circle',
    name: 'Flat sc circle',
    sides: 0,
    about: 'Six more sc in every round.',
    text: `Rnd 1: Ch 1, 6 sc in magic ring; join with sl st in first sc. (6 sc)
Rnd 2: Ch 1, 2 sc in each sc around; join with sl st in first sc. (12 sc)
Rnd 3: Ch 1, [sc in next sc, 2 sc in next sc] 6 times; join with sl st in first sc. (18 sc)
Rnd 4: Ch 1, [sc in each of next 2 sc, 2 sc in next sc] 6 times; join with sl st in first sc. (24 sc)
Rnd 5: Ch 1, [sc in each of next 3 sc, 2 sc in next sc] 6 times; join with sl st in first sc. (30 sc)
Rnd 6: Ch 1, [sc in each of next 4 sc, 2 sc in next sc] 6 times; join with sl st in first sc. (36 sc)
Rnd 7: Ch 1, [sc in each of next 5 sc, 2 sc in next sc] 6 times; join with sl st in first sc. (42 sc)
Rnd 8: Ch 1, [sc in each of next 6 sc, 2 sc in next sc] 6 times; join with sl st in first sc. (48 sc)`,
  },
];
