import type { WorkedStitch } from '../pattern/reading';
import { add, across, between, distance, middleOf, towards, type Point } from './point';

export type Put = (member: number, feet: readonly Point[], head: Point, unitMm: number) => void;

/** Lengths in stitch widths: ours. */
const CHAIN = {
  length: 0.9,
  oval: 0.84,
  below: 0.1,
  beyond: 0.3,
  besideHead: 0.4,
  intoCorner: 0.5,
} as const;
const PICOT = { oval: 0.64, gap: 0.12 } as const;

/** What a loop hangs between. */
export interface Span {
  readonly from: Point;
  readonly to: Point;
  /** The outline of the round over it, and which way that is. */
  readonly outline: Point;
  readonly outward: Point;
  readonly isCorner: boolean;
}

/**
 * The line that the chains of a space lie on: straight where they just reach, bowed outwards where
 * there are more of them, as far as the outline of the round and a little beyond. The loop of a
 * corner is drawn out towards it.
 */
export function arcBetween(
  { from, to, outline, outward, isCorner }: Span,
  chains: number,
  w: number,
): (share: number) => Point {
  const low = add([0, 0], outward, -CHAIN.below * w);
  const [begin, end] = [add(from, low), add(to, low)];
  const chordMm = distance(begin, end);
  const middle = between(begin, end, 0.5);
  const lengthMm = chains * CHAIN.length * w;
  const wantedMm = Math.sqrt(Math.max(0, (3 / 8) * chordMm * (lengthMm - chordMm)));
  const reach =
    outline[0] * outward[0] +
    outline[1] * outward[1] -
    (middle[0] * outward[0] + middle[1] * outward[1]);
  const leastMm = isCorner && chains > 1 ? CHAIN.intoCorner * Math.max(0, reach) : 0;
  const bowMm = Math.max(leastMm, Math.min(wantedMm, Math.max(0, reach + CHAIN.beyond * w)));
  const control = add(middle, outward, 2 * bowMm);
  return (share) => {
    const a = between(begin, control, share);
    const b = between(control, end, share);
    return between(a, b, share);
  };
}

/** Ovals along a loop, clear of the caps beside it; a tall stitch that closes the round lies at its end. */
export function chainSymbols(
  members: readonly number[],
  stitches: readonly WorkedStitch[],
  arc: (share: number) => Point,
  chordMm: number,
  bulge: number,
  w: number,
  put: Put,
): void {
  const trim = Math.min(0.28, ((CHAIN.besideHead + bulge) * w) / Math.max(1e-9, chordMm));
  const at = (share: number): Point => arc(trim + (1 - 2 * trim) * share);
  const count = members.length;
  members.forEach((member, i) => {
    const [begin, end] = [at(i / count), at((i + 1) / count)];
    if (stitches[member]?.code !== 'ch') {
      put(member, [end], begin, w);
      return;
    }
    const middle = at((i + 0.5) / count);
    const half = Math.min(CHAIN.oval * w, 0.94 * distance(begin, end)) / 2;
    const along = towards(begin, end);
    put(member, [add(middle, along, -half)], add(middle, along, half), w);
  });
}

/** A small ring of ovals outside what it sits on, and the stitch that closes it at its foot. */
export function picotSymbols(
  members: readonly number[],
  at: Point,
  outward: Point,
  w: number,
  put: Put,
): void {
  const [only] = members;
  if (members.length === 1 && only !== undefined) {
    put(only, [add(at, outward, PICOT.gap * w)], add(at, outward, 1.1 * w), w);
    return;
  }
  const chains = members.slice(0, -1);
  const radiusMm = Math.max(0.3, (PICOT.oval * (chains.length + 0.6)) / (2 * Math.PI)) * w;
  const centre = add(at, outward, radiusMm + PICOT.gap * w);
  const side = across(outward);
  const on = (turn: number): Point => {
    const angle = 2 * Math.PI * turn;
    const out = add([0, 0], outward, -Math.cos(angle) * radiusMm);
    return add(add(centre, out), side, Math.sin(angle) * radiusMm);
  };
  const step = 1 / (chains.length + 0.6);
  chains.forEach((member, i) => {
    const [begin, end] = [on((i + 0.3) * step), on((i + 1.3) * step)];
    const middle = middleOf([begin, end]);
    const half = (0.9 * distance(begin, end)) / 2;
    const along = towards(begin, end);
    put(member, [add(middle, along, -half)], add(middle, along, half), PICOT_UNIT * w);
  });
  const last = members.at(-1);
  if (last !== undefined) put(last, [on(0)], on(0), PICOT_UNIT * w);
}

const PICOT_UNIT = 0.7;
