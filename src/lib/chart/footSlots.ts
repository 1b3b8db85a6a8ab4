import type { ArrangedRound } from './arranged';
import { placeOf } from './feet';
import type { DrawnPlace, Ground } from './ground';
import { add, towards, type Point } from './point';

/** Distances from a place to what stands in it, in stitch widths: ours, so that symbols stand free. */
const CLEAR = {
  stitch: 0.15,
  space: 0.3,
  ring: 0.3,
  hook: 0.36,
  dotOnStitch: 0.2,
  dotOnSpace: 0.38,
  afterDot: 0.24,
  besideDot: 0.44,
  beforeHead: 0.16,
} as const;
/** How far apart the feet in one place stand, at most, and of the room that it has. */
const FEET = { inStitch: 0.3, inSpace: 0.52, ofRoom: 0.8 } as const;

interface Clear {
  readonly stitch: number;
  readonly space: number;
}

export interface FootSlots {
  /** Feet of an element; none where it hangs on nothing. */
  readonly of: (element: number) => Point[];
  /** Where a slip stitch into the round below lies. */
  readonly ofTravel: (slot: number) => Point | null;
}

/** Where everything in a round stands: what shares a place stands side by side, in the order of making. */
export function footSlots(arranged: ArrangedRound, ground: Ground): FootSlots {
  const { feet, travel, round, alongs, direction, elements } = arranged;
  const w = ground.gauge.stitchWidthMm;
  const travelPlaces = travel.map((member) => placeOf(round.stitches[member]?.into));
  // The chain that stands where the walk ends stands on its last slip stitch.
  const walkEnds = travelPlaces.length - 1;
  const begins = elements[0]?.kind === 'column' && elements[0].beginning !== null;
  const onWalk = begins && walkEnds >= 0 && travelPlaces[walkEnds] === feet[0]?.[0];

  const users = new Map<number, string[]>();
  const use = (place: number, key: string) => users.set(place, [...(users.get(place) ?? []), key]);
  feet.forEach((places, i) => places.forEach((place) => use(place, `${i}`)));
  // A round may begin and end in one place: what comes round to it last stands before what began there.
  for (const keys of users.values()) keys.sort((a, b) => ahead(keys[0], a) - ahead(keys[0], b));
  travelPlaces.forEach((place, slot) => {
    if (place !== null && !(onWalk && slot === walkEnds)) use(place, `travel ${slot}`);
  });

  /** How far an element comes after another along the round. */
  function ahead(from: string | undefined, to: string): number {
    const apart = (alongs[Number(to)] ?? 0) - (alongs[Number(from)] ?? 0);
    return direction * (ground.isClosed ? apart - Math.round(apart) : apart);
  }

  const postClear = { stitch: CLEAR.hook, space: CLEAR.hook } as const;
  const dotClear = { stitch: CLEAR.dotOnStitch, space: CLEAR.dotOnSpace } as const;
  const pointOf = (place: number, key: string, clear: Clear) => {
    const drawn = drawnPlace(place, ground, round.turned ? -1 : 1);
    const keys = users.get(place) ?? [];
    if (!drawn) return null;
    const { isSpace, roomMm, outward, at } = drawn;
    const most = isSpace ? FEET.inSpace : FEET.inStitch;
    const stepMm = Math.min(most * w, (FEET.ofRoom * roomMm) / Math.max(1, keys.length));
    const slot = keys.indexOf(key) - (keys.length - 1) / 2;
    // On its way a slip stitch lies before the head it is worked into, clear of the next.
    const isOnWay = key.startsWith('travel') && !isSpace && slot === 0;
    const before = onWalk && key === '0' ? CLEAR.besideDot : isOnWay ? CLEAR.beforeHead : 0;
    const offMm = direction * (slot * stepMm - before * w);
    const side: Point = [outward[1], -outward[0]];
    return add(add(at, outward, (isSpace ? clear.space : clear.stitch) * w), side, offMm);
  };
  return {
    of: (index) => {
      const onDot = onWalk && index === 0;
      const element = elements[index];
      const isPost = element?.kind === 'column' && /^[FB]P/.test(element.code);
      const points = (feet[index] ?? [])
        .map((place) => pointOf(place, `${index}`, onDot ? dotClear : isPost ? postClear : CLEAR))
        .filter((point) => point !== null);
      if (points.length > 0) {
        const head = ground.outer(alongs[index] ?? 0);
        const liftMm = onDot ? CLEAR.afterDot * w : 0;
        return points.map((point) => add(point, towards(point, head), liftMm));
      }
      const inner = ground.inner(alongs[index] ?? 0);
      const { into } = round.stitches[elements[index]?.members[0] ?? -1] ?? {};
      if (into?.kind !== 'ring') return [inner];
      return [add(inner, towards(inner, ground.outer(alongs[index] ?? 0)), CLEAR.ring * w)];
    },
    ofTravel: (slot) => {
      const place = travelPlaces[slot] ?? null;
      if (place === null) return null;
      const key = onWalk && slot === walkEnds ? '0' : `travel ${slot}`;
      return pointOf(place, key, dotClear);
    },
  };
}

/** A place of the round below; a gap lies in the middle of the two it is between, and is as open as a space. */
function drawnPlace(place: number, { below }: Ground, step: 1 | -1): DrawnPlace | undefined {
  const before = below[Math.floor(place)];
  const after = below[(Math.floor(place) + step + below.length) % below.length];
  if (Number.isInteger(place) || !before || !after) return before;
  const middle = (one: Point, other: Point): Point => [
    (one[0] + other[0]) / 2,
    (one[1] + other[1]) / 2,
  ];
  return {
    ...before,
    isSpace: true,
    at: middle(before.at, after.at),
    outward: middle(before.outward, after.outward),
  };
}
