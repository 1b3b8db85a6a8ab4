/** Places that want different kinds where they touch. */
export interface ScatterTask {
  /** Places that touch each place. */
  readonly neighbours: readonly (readonly number[])[];
  /** The kind of a place that is settled already, or null. */
  readonly settled: readonly (number | null)[];
  /** How many places each kind should have in all. */
  readonly quotas: readonly number[];
  readonly random: () => number;
}

export interface Scattered {
  readonly kinds: readonly number[];
  /** Pairs of touching places of one kind: 0 wherever that was found. */
  readonly alike: number;
}

/** Tries to even out what the first pass left uneven, for each place. */
const TRIES_PER_PLACE = 40;

/**
 * A kind for every place, by chance, no two alike side by side, and of each kind as many as its
 * quota. Where both cannot be had, or were not found, places differ first; the counts tell.
 * The place with the fewest kinds left is settled first, so that two kinds on squares and three on
 * hexagons come out whole.
 */
export function scatter(task: ScatterTask): Scattered {
  const kinds = firstPass(task);
  evenOut(task, kinds);
  return { kinds, alike: alikePairs(task, kinds) };
}

const UNSETTLED = -1;

function firstPass({ neighbours, settled, quotas, random }: ScatterTask): number[] {
  const kinds = settled.map((kind) => kind ?? UNSETTLED);
  const left = leftOver(quotas, kinds);
  // Queues of places by how many kinds stand round them; a place may wait in several, the fullest counts.
  const queues = Array.from({ length: quotas.length + 1 }, () => ({
    places: [] as number[],
    next: 0,
  }));
  const around = neighbours.map((places) => new Set(places.map((place) => kinds[place] as number)));
  const crowd = (place: number): number => {
    const set = around[place] as Set<number>;
    return set.size - (set.has(UNSETTLED) ? 1 : 0);
  };
  kinds.forEach((kind, place) => {
    if (kind === UNSETTLED) queues[crowd(place)]?.places.push(place);
  });
  for (;;) {
    const queue = queues.findLast(({ places, next }) => next < places.length);
    if (!queue) return kinds;
    const place = queue.places[queue.next] as number;
    queue.next += 1;
    if (kinds[place] !== UNSETTLED) continue;
    const kind = bestKind(around[place] as Set<number>, left, random);
    kinds[place] = kind;
    left[kind] = (left[kind] ?? 0) - 1;
    for (const near of neighbours[place] ?? []) {
      if (kinds[near] !== UNSETTLED) continue;
      (around[near] as Set<number>).add(kind);
      queues[crowd(near)]?.places.push(near);
    }
  }
}

/** Of the kinds that stand nowhere around, the one with most left; chance breaks ties. */
function bestKind(
  around: ReadonlySet<number>,
  left: readonly number[],
  random: () => number,
): number {
  let best = 0;
  let bestScore = -Infinity;
  left.forEach((count, kind) => {
    const score =
      (around.has(kind) ? -1e9 : 0) + (count > 0 ? Math.min(count, 3) : count - 10) + 2 * random();
    if (score > bestScore) [best, bestScore] = [kind, score];
  });
  return best;
}

/**
 * Swaps two kinds throughout a patch of them until each has its quota: no two alike touch that did
 * not before (Kempe's chains). A swap that leaves the counts as uneven is taken too: it opens the way.
 */
function evenOut({ neighbours, settled, quotas, random }: ScatterTask, kinds: number[]): void {
  const left = leftOver(quotas, kinds);
  const places = kinds.flatMap((_, place) => (settled[place] === null ? [place] : []));
  const pick = (count: number): number => Math.floor(random() * count);
  for (let tries = TRIES_PER_PLACE * places.length; tries > 0; tries -= 1) {
    if (!left.some((count) => count < 0)) return;
    const place = places[pick(places.length)] as number;
    const [one, other] = [kinds[place] as number, pick(quotas.length)];
    if (one === other) continue;
    const patch = patchOf(neighbours, kinds, place, other);
    if (patch.some((each) => settled[each] !== null)) continue;
    const more = patch.reduce((sum, each) => sum + (kinds[each] === one ? 1 : -1), 0);
    const [oneLeft, otherLeft] = [left[one] as number, left[other] as number];
    if ((oneLeft + more) ** 2 + (otherLeft - more) ** 2 > oneLeft ** 2 + otherLeft ** 2) continue;
    for (const each of patch) kinds[each] = kinds[each] === one ? other : one;
    left[one] = oneLeft + more;
    left[other] = otherLeft - more;
  }
}

/** Places of the kind at `start` and of `other` that hang together with it. */
function patchOf(
  neighbours: ScatterTask['neighbours'],
  kinds: readonly number[],
  start: number,
  other: number,
): number[] {
  const one = kinds[start];
  const patch = [start];
  const seen = new Set(patch);
  for (const place of patch) {
    for (const near of neighbours[place] ?? []) {
      if (seen.has(near) || (kinds[near] !== one && kinds[near] !== other)) continue;
      seen.add(near);
      patch.push(near);
    }
  }
  return patch;
}

function leftOver(quotas: readonly number[], kinds: readonly number[]): number[] {
  const left = [...quotas];
  for (const kind of kinds) if (kind !== UNSETTLED) left[kind] = (left[kind] ?? 0) - 1;
  return left;
}

const alikePairs = ({ neighbours }: ScatterTask, kinds: readonly number[]): number =>
  neighbours.reduce(
    (sum, places, place) =>
      sum + places.filter((near) => near > place && kinds[near] === kinds[place]).length,
    0,
  );

/** `total` shared out among `kinds` so that no two differ by more than one: chance picks who has one more. */
export function evenQuotas(total: number, kinds: number, random: () => number): number[] {
  const least = Math.floor(total / kinds);
  const more = total - least * kinds;
  const first = Math.floor(random() * kinds);
  return Array.from({ length: kinds }, (_, kind) =>
    (kind - first + kinds) % kinds < more ? least + 1 : least,
  );
}
