/** A point of a layout's lattice: whole numbers at corners, so that shared corners are the same. */
export type LatticePoint = readonly [x: number, y: number];

/**
 * What fills a face: the main motif, half or a quarter of it at the edge, or the second motif
 * (the squares between octagons, the small ones beside large) and its parts.
 */
export const SLOTS = [
  'motifs',
  'halves',
  'quarters',
  'fillers',
  'halfFillers',
  'quarterFillers',
] as const;
export type Slot = (typeof SLOTS)[number];

/** Whether a slot holds the second motif, and how much of a whole motif it is. */
export const SLOT_FACTS: Readonly<Record<Slot, { second: boolean; share: number }>> = {
  motifs: { second: false, share: 1 },
  halves: { second: false, share: 1 / 2 },
  quarters: { second: false, share: 1 / 4 },
  fillers: { second: true, share: 1 },
  halfFillers: { second: true, share: 1 / 2 },
  quarterFillers: { second: true, share: 1 / 4 },
};

/** One motif of a layout. Main and second motifs are numbered by row and column apart, from 0. */
export interface Face {
  readonly slot: Slot;
  readonly row: number;
  readonly column: number;
  /** Its outline, clockwise: its corners, and points where corners of others touch its sides. */
  readonly points: readonly LatticePoint[];
  /** Middle of the motif; of half a motif, of the whole it is cut from. */
  readonly centre: LatticePoint;
  /** How far a motif drawn with a side at its top is turned, in degrees. */
  readonly turnDeg: number;
}

/** The whole motif unless said otherwise. */
export const face = (
  at: Pick<Face, 'row' | 'column' | 'points' | 'centre'> & Partial<Face>,
): Face => ({ slot: 'motifs', turnDeg: 0, ...at });

/** `grid(2, 2, (r, c) => [r, c])` goes row by row. */
export const grid = <T>(
  rows: number,
  columns: number,
  at: (row: number, column: number) => T,
): T[] =>
  Array.from({ length: Math.max(0, rows * columns) }, (_, i) =>
    at(Math.floor(i / columns), i % columns),
  );

/** Numbers below `end`: `upTo(3)` is `[0, 1, 2]`. */
export const upTo = (end: number): number[] =>
  Array.from({ length: Math.max(0, end) }, (_, i) => i);
