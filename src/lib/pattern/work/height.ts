import type { LoopHeight } from '../../motifs/motif';
import { stitch } from '../../stitches/stitchTable';
import type { StitchCode } from '../../stitches/stitch';
import type { Place } from '../reading';
import { baseOf } from './family';
import type { Lie } from './lie';

/** A loop shorter than this is no loop: its stitches set the height. */
const LEAST_LOOP_CHAINS = 3;
/** Length of a chain and height of a sc in stitch widths: ours, and the table's. */
const CHAIN_WIDTHS = 0.9;
const SC_WIDTHS = 0.92;

/**
 * What sets the height of a round at the middle of a side: its tallest stitch there, or chain loops
 * held by short stitches. `squaringOff`: the round turns a circle into a shape, tall at the corners
 * and low at the middle, so that only the very middle counts.
 */
export function heightOf(
  places: readonly Place[],
  lies: readonly Lie[],
  hasCorners: boolean,
  squaringOff: boolean,
): StitchCode | LoopHeight {
  const all = places.map((place, i) => ({ place, lie: lies[i] as Lie }));
  const side = hasCorners ? longestSide(all) : all;
  const near = hasCorners ? middleOf(side, squaringOff) : side;
  const considered = near.some(({ place }) => place.kind === 'stitch') ? near : side;
  return loopHeight(considered) ?? tallest(considered) ?? tallest(all) ?? 'sl st';
}

type Placed = { readonly place: Place; readonly lie: Lie };

function longestSide(all: readonly Placed[]): readonly Placed[] {
  const bySide = new Map<number, Placed[]>();
  const firstCorner = all.findIndex(({ place }) => place.corner !== null);
  // From a corner on, so that a side is in one piece.
  for (const each of [...all.slice(firstCorner), ...all.slice(0, firstCorner)]) {
    if (each.place.corner !== null) continue;
    const side = bySide.get(each.place.side);
    if (side) side.push(each);
    else bySide.set(each.place.side, [each]);
  }
  return [...bySide.values()].reduce((a, b) => (b.length > a.length ? b : a), []);
}

function middleOf(side: readonly Placed[], narrow: boolean): readonly Placed[] {
  const half = (side.length - 1) / 2;
  const reach = narrow ? 0.5 : Math.max(1, side.length / 6);
  return side.filter((_, i) => Math.abs(i - half) <= reach);
}

function tallest(places: readonly Placed[]): StitchCode | null {
  let best: StitchCode | null = null;
  let bestHeight = 0;
  for (const { place } of places) {
    const base = baseOf(place.code);
    const height = place.kind === 'stitch' ? (stitch(base)?.heightOverWidth ?? 0) : 0;
    if (height > bestHeight) {
      best = base;
      bestHeight = height;
    }
  }
  return best;
}

function loopHeight(places: readonly Placed[]): LoopHeight | null {
  const loops = places.filter(({ place }) => place.chains >= LEAST_LOOP_CHAINS);
  const anchor = tallest(places);
  const anchorHeight = anchor ? (stitch(anchor)?.heightOverWidth ?? 0) : 0;
  if (loops.length * 3 < places.length || anchorHeight > SC_WIDTHS) return null;
  const loop = loops[0];
  if (!loop) return null;
  const { chains } = loop.place;
  const gapStitches = Math.max(1, Math.round(loop.lie.reach));
  const square = ((chains * CHAIN_WIDTHS) / 2) ** 2 - (gapStitches / 2) ** 2;
  return square > anchorHeight ** 2 ? { chains, gapStitches } : null;
}
