/** Rounds 1 and 2 of a group square; every later round has a group more to the side. */
const BEGIN = `Ch 4, join with sl st to form ring.
Rnd 1: Ch 3 (counts as dc), 2 dc in ring, ch 2, *3 dc in ring, ch 2; rep from * 2 more times; join with sl st in top of beg ch-3.
Rnd 2: Sl st in next 2 dc and in next ch-2 sp, ch 3, (2 dc, ch 2, 3 dc) in same sp, ch 1, *(3 dc, ch 2, 3 dc) in next ch-2 sp, ch 1; rep from * 2 more times; join with sl st in top of beg ch-3.`;

/**
 * A square of so many rounds, each written out. With `groups` "each" every group of a side is written
 * too, so that the text grows as the stitches do; with "repeated" as patterns are published.
 */
export function growingSquare(rounds: number, groups: 'each' | 'repeated'): string {
  const later = Array.from({ length: Math.max(0, rounds - 2) }, (_, i) => {
    const side =
      groups === 'each'
        ? '3 dc in next sp, ch 1, '.repeat(i + 1)
        : '[3 dc in next ch-1 sp, ch 1] to corner, ';
    const last = groups === 'each' ? side : '[3 dc in next ch-1 sp, ch 1] to end';
    return `Rnd ${i + 3}: Sl st in next 2 dc and in next ch-2 sp, ch 3, (2 dc, ch 2, 3 dc) in same sp, ch 1, *${side}(3 dc, ch 2, 3 dc) in next ch-2 sp, ch 1; rep from * 2 more times, ${last.replace(/, $/, '')}; join with sl st in top of beg ch-3.`;
  });
  return [BEGIN, ...later].join('\n');
}
