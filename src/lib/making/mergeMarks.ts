interface Mark {
  readonly at: string;
}

/** How far a blanket is made, in marks that carry their moment. */
export interface MarkedMaking<
  Tick extends Mark & { motif: string },
  Weighing extends Mark & { id: string },
> {
  readonly ticks: readonly Tick[];
  readonly weighings: readonly Weighing[];
}

/**
 * Two records of one making together: of two marks of one thing the later counts. Weighings come
 * in the order of time.
 */
export function mergeMarks<
  Tick extends Mark & { motif: string },
  Weighing extends Mark & { id: string },
>(
  one: MarkedMaking<Tick, Weighing>,
  other: MarkedMaking<Tick, Weighing>,
): MarkedMaking<Tick, Weighing> {
  return {
    ticks: latest([...one.ticks, ...other.ticks], ({ motif }) => motif),
    weighings: latest([...one.weighings, ...other.weighings], ({ id }) => id).sort(byTime),
  };
}

const byTime = (left: Mark, right: Mark): number => Date.parse(left.at) - Date.parse(right.at);

function latest<Item extends Mark>(items: readonly Item[], keyOf: (item: Item) => string): Item[] {
  const found = new Map<string, Item>();
  for (const item of items) {
    const before = found.get(keyOf(item));
    if (!before || byTime(before, item) < 0) found.set(keyOf(item), item);
  }
  return [...found.values()];
}
