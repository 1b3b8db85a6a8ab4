import type { LaidBlanket } from './blanketFaces';

/** The number of the motif at a point of the blanket, or null between and beside them. */
export function motifAt({ motifs }: LaidBlanket, [x, y]: readonly [number, number]): number | null {
  const found = motifs.findIndex(({ outlineMm }) =>
    // Inside a convex outline a point lies to the same hand of every side.
    outlineMm.every(([fromX, fromY], i) => {
      const [toX, toY] = outlineMm[(i + 1) % outlineMm.length] ?? [0, 0];
      return (toX - fromX) * (y - fromY) - (toY - fromY) * (x - fromX) >= 0;
    }),
  );
  return found < 0 ? null : found;
}

/** The motif next to `from` in a direction: the nearest of those that lie mostly that way; else itself. */
export function motifTowards(
  { motifs }: LaidBlanket,
  from: number,
  [dx, dy]: readonly [number, number],
): number {
  const [x, y] = motifs[from]?.centreMm ?? [0, 0];
  let best = from;
  let nearest = Infinity;
  motifs.forEach(({ centreMm }, i) => {
    const along = (centreMm[0] - x) * dx + (centreMm[1] - y) * dy;
    const aside = Math.abs((centreMm[0] - x) * dy) + Math.abs((centreMm[1] - y) * dx);
    if (along <= 1e-6 || aside > along) return;
    const far = along + 2 * aside;
    if (far < nearest) [best, nearest] = [i, far];
  });
  return best;
}
