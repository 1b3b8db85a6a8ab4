import type { ArrangedRound } from './arranged';
import type { Column } from './elements';
import { footSlots } from './footSlots';
import { glyphOf } from './glyph';
import type { DrawnPlace, Ground } from './ground';
import { headsOf, loopEnds, unitsOf, UPRIGHT_CHAIN } from './heads';
import { arcBetween, chainSymbols, picotSymbols, type Put } from './placeChains';
import { add, between, distance, middleOf, towards, type Point } from './point';
import type { ChartSymbol } from './symbol';

export interface DrawnRound {
  readonly symbols: readonly ChartSymbol[];
  readonly places: readonly DrawnPlace[];
}

/** Room for the stitch that closes the round, on the chain that begins it, in stitch widths: ours. */
const JOIN_ROOM = 0.36;
/** How far before the first head it lies where no chain begins the round. */
const JOIN_BEFORE = 0.6;
/** How far out it lies there, clear of what stands to either side. */
const JOIN_OUT = 0.14;

/** How much wider a popcorn is than other stitches, to each side. */
const BULGE = 0.26;

/** Room below a chain that stands on nothing. */
const CLEAR_OF_BELOW = 0.1;

type Arc = (share: number) => Point;

/** Draws one round: every stitch it makes once, from its foot to its head. */
export function placeRound(arranged: ArrangedRound, ground: Ground): DrawnRound {
  const { round, elements, alongs, join } = arranged;
  const w = ground.gauge.stitchWidthMm;
  const heads = headsOf(arranged, ground);
  const units = unitsOf(arranged, heads, ground);
  const slots = footSlots(arranged, ground);
  const [first] = elements;
  const beginsUpright = first?.kind === 'column' && first.beginning !== null;
  const symbols: ChartSymbol[] = [];
  const put: Put = (member, feet, head, unitMm) => {
    const { code } = round.stitches[member] ?? { code: 'ch' };
    const glyph = glyphOf(code, ground.own.get(code));
    symbols.push({ round: ground.index, stitch: member, glyph, feet, head, unitMm });
  };

  const arcs = elements.map((element, i): Arc | null => {
    if (element.kind === 'column') {
      const closes = i === 0 ? join : null;
      columnSymbols(element, i, heads[i] as Point, units[i] ?? w, closes);
      return null;
    }
    const [from, end] = loopEnds(i, arranged, heads, ground);
    const closes = i === elements.length - 1 && join !== null && !beginsUpright;
    const to = closes ? between(end, from, (JOIN_BEFORE * w) / distance(from, end)) : end;
    const outline = ground.outer(alongs[i] ?? 0);
    const bulge = bulgeBeside(i);
    const arc = arcBetween(
      { from, to, outline, outward: outwardAt(i), isCorner: element.corner !== null },
      element.members.length,
      w,
    );
    chainSymbols(element.members, round.stitches, arc, distance(from, to), bulge, w, put);
    return arc;
  });
  joinWithoutChain();
  arranged.travel.forEach((member, slot) => {
    const at = slots.ofTravel(slot) ?? ground.inner(alongs[0] ?? 0);
    put(member, [at], at, w);
  });
  for (const { members, on, after } of arranged.picots) {
    const arc = arcs[on];
    const share = after / Math.max(1, elements[on]?.members.length ?? 1);
    const at = arc ? arc(share) : (heads[on] ?? ground.outer(alongs[0] ?? 0));
    picotSymbols(members, at, outwardAt(on), w, put);
  }
  symbols.sort((a, b) => a.stitch - b.stitch);
  return { symbols, places: drawnPlaces() };

  /** How much farther the chains of a loop keep from a stitch whose legs bulge, in stitch widths. */
  function bulgeBeside(loop: number): number {
    const count = elements.length;
    const beside = [elements[(loop + count - 1) % count], elements[(loop + 1) % count]];
    return beside.some((each) => each?.kind === 'column' && each.code.endsWith(' pc')) ? BULGE : 0;
  }

  function outwardAt(element: number): Point {
    const along = alongs[element] ?? 0;
    return towards(ground.inner(along), ground.outer(along));
  }

  /** A stitch, or the chains that stand for one, with the closing stitch on top. */
  function columnSymbols(
    { members, beginning }: Column,
    index: number,
    head: Point,
    unitMm: number,
    closes: number | null,
  ): void {
    const feet = slots.of(index);
    if (beginning === null) return put(members[0] ?? 0, feet, head, unitMm);
    // A chain that stands for nothing stands straight beside the stitch it reaches up to.
    const inner = ground.inner(alongs[index] ?? 0);
    const isTurning = beginning === 'turning';
    const roomMm = distance(head, inner) - CLEAR_OF_BELOW * w;
    const foot = isTurning
      ? add(head, towards(head, inner), Math.min(UPRIGHT_CHAIN * w * members.length, roomMm))
      : middleOf(feet);
    const top = closes === null ? head : add(head, towards(head, foot), JOIN_ROOM * w);
    members.forEach((member, j, { length }) =>
      put(member, [between(foot, top, j / length)], between(foot, top, (j + 1) / length), unitMm),
    );
    if (closes !== null) {
      const at = between(head, top, 0.45);
      put(closes, [at], at, w);
    }
  }

  function joinWithoutChain(): void {
    if (join === null || beginsUpright) return;
    const begin = heads[0] ?? ground.outer(0);
    const last = heads.findLast((_, i) => elements[i]?.kind === 'column') ?? begin;
    const share = Math.min(0.5, (JOIN_BEFORE * w) / Math.max(1e-9, distance(begin, last)));
    const at = add(between(begin, last, share), outwardAt(0), JOIN_OUT * w);
    put(join, [at], at, w);
  }

  function drawnPlaces(): DrawnPlace[] {
    const nowhere = { at: ground.outer(0), outward: outwardAt(0), isSpace: false, roomMm: w };
    const places = round.places.map((): DrawnPlace => nowhere);
    elements.forEach(({ place }, i) => {
      if (place === null) return;
      const arc = arcs[i];
      const outward = outwardAt(i);
      places[place] = arc
        ? { at: arc(0.5), outward, isSpace: true, roomMm: distance(arc(0.08), arc(0.92)) }
        : { at: heads[i] as Point, outward, isSpace: false, roomMm: units[i] ?? w };
    });
    return places;
  }
}
