import type { MotifSides } from '../motifs/motif';
import type { Point } from './point';

/**
 * A line that stitches stand on: the point at a place along it. Round a motif the place is in turns,
 * anticlockwise as rounds are worked, 0 at the middle of the first side; along a row in mm from its
 * first chain, from right to left.
 */
export type Track = (along: number) => Point;

/** A triangle stands on its first side; every other motif begins at the top. */
const beginsAt = (sides: MotifSides): 1 | -1 => (sides === 3 ? -1 : 1);

export function circleTrack(sides: MotifSides, radiusMm: number): Track {
  const reachMm = beginsAt(sides) * radiusMm;
  return (turns) => {
    const angle = 2 * Math.PI * turns;
    return [-reachMm * Math.sin(angle), -reachMm * Math.cos(angle)];
  };
}

/** Corner n stands at n + a half, over the number of sides. */
export function polygonTrack(sides: Exclude<MotifSides, 0>, apothemMm: number): Track {
  const begin = beginsAt(sides);
  const sideMm = 2 * apothemMm * Math.tan(Math.PI / sides);
  return (turns) => {
    const side = Math.round(turns * sides);
    const alongMm = (turns * sides - side) * sideMm;
    const angle = (2 * Math.PI * side) / sides;
    return [
      begin * (-apothemMm * Math.sin(angle) - alongMm * Math.cos(angle)),
      begin * (-apothemMm * Math.cos(angle) + alongMm * Math.sin(angle)),
    ];
  };
}

export const rowTrack =
  (upMm: number): Track =>
  (alongMm) => [-alongMm, -upMm];
