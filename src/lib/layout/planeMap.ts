/** A motif's outline as the names of its corners, in order round it. */
export type Outline = readonly string[];

/** One side shared by one motif (outer) or two (joined). */
export interface MapSide {
  readonly ends: readonly [string, string];
  readonly motifs: readonly number[];
}

/** A point where corners of motifs meet. */
export interface MapCorner {
  readonly name: string;
  readonly motifs: readonly number[];
  /** On the outer edge of the blanket. */
  readonly outer: boolean;
}

/** Motifs as faces, their sides as edges, the points where they meet as vertices. */
export interface PlaneMap {
  readonly outlines: readonly Outline[];
  readonly sides: readonly MapSide[];
  readonly corners: readonly MapCorner[];
}

/**
 * Plane map of motifs whose outlines name shared corners alike. Cost grows with the sides.
 *
 * Example: two squares `[a b e d]` and `[b c f e]` share the side b-e: 7 sides, 6 corners.
 */
export function planeMap(outlines: readonly Outline[]): PlaneMap {
  const sides = new Map<string, { ends: readonly [string, string]; motifs: number[] }>();
  const motifsAt = new Map<string, Set<number>>();
  outlines.forEach((outline, motif) => {
    outline.forEach((from, i) => {
      const to = outline[(i + 1) % outline.length] as string;
      const ends = from < to ? ([from, to] as const) : ([to, from] as const);
      const side = sides.get(ends.join(' ')) ?? { ends, motifs: [] };
      side.motifs.push(motif);
      sides.set(ends.join(' '), side);
      motifsAt.set(from, (motifsAt.get(from) ?? new Set()).add(motif));
    });
  });
  const outer = new Set(
    [...sides.values()].filter(({ motifs }) => motifs.length === 1).flatMap(({ ends }) => ends),
  );
  return {
    outlines,
    sides: [...sides.values()],
    corners: [...motifsAt].map(([name, motifs]) => ({
      name,
      motifs: [...motifs],
      outer: outer.has(name),
    })),
  };
}

/** The motifs that share a side with each motif: of two squares side by side `[[1], [0]]`. */
export function neighboursOf({ outlines, sides }: PlaneMap): number[][] {
  const neighbours: number[][] = outlines.map(() => []);
  for (const { motifs } of sides) {
    const [one, other] = motifs;
    if (one === undefined || other === undefined) continue;
    neighbours[one]?.push(other);
    neighbours[other]?.push(one);
  }
  return neighbours;
}
