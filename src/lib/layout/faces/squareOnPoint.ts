import { face, type Face, type LatticePoint, type Slot } from '../face';

interface OnPoint {
  readonly row: number;
  readonly column: number;
  readonly centre: LatticePoint;
  /** What a whole one, half of one and a quarter of one are called. */
  readonly slots: readonly [Slot, Slot, Slot];
  readonly isInside: (point: LatticePoint) => boolean;
}

/** A square standing on a corner, or the half or quarter of it that lies inside the blanket. */
export function squareOnPoint({ row, column, centre, slots, isInside }: OnPoint): Face {
  const [x, y] = centre;
  const tips: LatticePoint[] = [
    [x, y - 1],
    [x + 1, y],
    [x, y + 1],
    [x - 1, y],
  ];
  const outline = tips.flatMap((tip, i): LatticePoint[] => {
    if (isInside(tip)) return [tip];
    // Two tips left out together leave the middle of the square as a corner.
    return isInside(tips[(i + 1) % 4] as LatticePoint) ? [] : [centre];
  });
  const left = tips.filter(isInside).length;
  const slot = slots[4 - left] as Slot;
  return face({ slot, row, column, points: outline, centre, turnDeg: 45 });
}
