import type { Into, Role } from '../reading';
import type { Span } from '../span';
import type { PlaceFilter } from '../syntax';
import { familyOf } from './family';
import { isGap, matchesGap } from './gap';
import type { Below, Budget, DraftPlace, DraftStitch } from './state';

/** Where the hook stands before it has worked into anything. */
const BEFORE = -1;

/** Everything about a hand that an attempt may have to take back. */
interface Snapshot {
  readonly stitches: number;
  readonly places: number;
  readonly pending: readonly number[];
  readonly at: number;
  readonly begun: boolean;
  readonly colour: string | null;
  readonly passedStitches: number;
  readonly passedSpaces: number;
  readonly worked: number;
  readonly skipped: number;
}

/**
 * The hand that works one round: it walks the places of the round below in order and makes stitches.
 * Positions count from the place where the round begins: 0 to `size` - 1, and `size` is that place again.
 * The gap after a place is half a position on.
 */
export class Hand {
  readonly stitches: DraftStitch[] = [];
  readonly places: DraftPlace[] = [];
  /** Chains made since the last stitch: a space, once the next stitch is made. */
  pending: number[] = [];
  /** Position last worked into; `BEFORE` the first. */
  at = BEFORE;
  /** Whether a stitch or a chain has been made: slip stitches before it only travel. */
  begun = false;
  joined = false;
  /** The round was closed by a stitch that makes the last space, where the next one begins. */
  endsInSpace = false;
  turned = false;
  /** The round is worked back the way the last one came. */
  isBack = false;
  /** A row ends where it ends; a round comes back to where it began. */
  isRow = false;
  /** Position where the round begins: half a place before the first where that is a gap. */
  home = 0;
  colour: string | null = null;
  /** Most stitches and spaces passed over between two places worked into. */
  passedStitches = 0;
  passedSpaces = 0;
  /** Places worked into and skipped: whether a repeat gets anywhere. */
  worked = 0;
  skipped = 0;
  /** Positions at or beyond this are out of reach while a repeat runs to a corner or to the last stitches. */
  limit: number;
  /** While above 0, a place that is not found ends the attempt instead of being told. */
  attempts = 0;
  /** The place all stitches of a group go into. */
  inPlace: number | 'ring' | null = null;
  /** A beginning chain that is a leg of the next stitch: the code of the whole, and where its chains begin. */
  lead: { readonly code: string; readonly from: number } | null = null;
  /** A problem has been told that explains places left over. */
  explained = false;
  private start: number;

  constructor(
    readonly below: Below,
    readonly budget: Budget,
    start: number,
  ) {
    this.start = start;
    this.limit = this.size;
  }

  get size(): number {
    return this.below.order.length;
  }

  /** The position where the hook stands: where the round begins, before it has worked into anything. */
  get here(): number {
    return this.at === BEFORE ? this.home : this.at;
  }

  /** The next whole position. */
  get next(): number {
    return Math.floor(this.at) + 1;
  }

  /** The hook stands where the round begins, and that place is then worked. */
  stand(): void {
    this.at = this.here;
  }

  get isRing(): boolean {
    return this.below.kind !== 'places';
  }

  /** Index in `below.places` of a position. */
  indexAt(position: number): number {
    const steps = this.start + Math.floor(position) + this.size;
    return this.below.order[steps % this.size] ?? 0;
  }

  placeAt(position: number) {
    return this.below.places[this.indexAt(position)];
  }

  /** The round begins at this position: what was slip-stitched over comes last. */
  beginAt(position: number): void {
    this.start = (this.start + Math.ceil(position)) % Math.max(1, this.size);
    this.home = position - Math.ceil(position);
    this.at = this.home;
  }

  /** The next position after `after` that a filter means, or -1. */
  find(filter: PlaceFilter, after: number, span: Span, limit = this.limit): number {
    const gaps = isGap(filter);
    // From where a round begins to the gap that it begins in there is nothing.
    const end = gaps ? Math.min(limit, this.size + this.home - (this.isRow ? 1 : 0)) : limit;
    const first = gaps ? Math.floor(Math.max(0, after) * 2 + 1) / 2 : Math.floor(after) + 1;
    for (let position = first; position < end; position += gaps ? 0.5 : 1) {
      if (!this.budget.step(span)) return -1;
      if (this.matches(filter, position)) return position;
    }
    return -1;
  }

  matches(filter: PlaceFilter, position: number): boolean {
    const place = this.placeAt(position);
    if (!place) return false;
    if (isGap(filter)) return matchesGap(this, filter, position);
    if (filter.of === 'corner') return place.corner !== null;
    if (filter.of === 'corner-space' && place.corner === null) return false;
    if (filter.of === 'stitch-or-space') return true;
    if (filter.of === 'stitch') {
      if (place.kind !== 'stitch') return false;
      return filter.code === null || familyOf(filter.code) === familyOf(place.code);
    }
    return place.kind === 'space' && (filter.chains === null || filter.chains === place.chains);
  }

  /** Goes on to a position, and remembers what it passes over. */
  moveTo(position: number): void {
    let stitches = 0;
    let spaces = 0;
    for (let passed = this.next; passed < position && passed < this.size; passed += 1) {
      if (this.placeAt(passed)?.kind === 'space') spaces += 1;
      else stitches += 1;
    }
    if (this.at !== BEFORE || this.begun) {
      this.passedStitches = Math.max(this.passedStitches, stitches);
      this.passedSpaces = Math.max(this.passedSpaces, spaces);
    }
    this.at = position;
    this.worked += 1;
  }

  /** Makes one stitch; `head` where the next round can work into it. */
  make(code: string, role: Role, into: Into, span: Span, head: boolean): void {
    if (!this.budget.stitch(span)) return;
    if (head) this.closeSpace();
    const place = head ? this.addHead(code, into) : null;
    this.stitches.push({ code, role, into, place, colour: this.colour, span });
  }

  private addHead(code: string, into: Into): number {
    const whole = this.lead?.code ?? code;
    const place = this.addPlace({ kind: 'stitch', code: whole, chains: 0, into: indexOf(into) });
    for (const stitch of this.lead ? this.stitches.slice(this.lead.from) : []) stitch.place = place;
    this.lead = null;
    return place;
  }

  chain(role: Role, into: Into, span: Span): void {
    if (!this.budget.stitch(span)) return;
    if (role === 'space') this.pending.push(this.stitches.length);
    this.stitches.push({ code: 'ch', role, into, place: null, colour: this.colour, span });
  }

  addPlace(place: DraftPlace): number {
    this.places.push(place);
    return this.places.length - 1;
  }

  /** The chains made since the last stitch become a space. */
  closeSpace(more = 0): void {
    const chains = this.pending.length + more;
    if (chains === 0) return;
    const place = this.addPlace({ kind: 'space', code: `ch-${chains}`, chains, into: -1 });
    for (const index of this.pending) {
      const stitch = this.stitches[index];
      if (stitch) stitch.place = place;
    }
    this.pending = [];
  }

  snapshot(span: Span): Snapshot {
    this.budget.step(span, this.pending.length);
    const { at, begun, colour, passedStitches, passedSpaces, worked, skipped } = this;
    return {
      stitches: this.stitches.length,
      places: this.places.length,
      pending: [...this.pending],
      ...{ at, begun, colour, passedStitches, passedSpaces, worked, skipped },
    };
  }

  takeBack(to: Snapshot): void {
    const { stitches, places, pending, ...rest } = to;
    this.stitches.length = stitches;
    this.places.length = places;
    this.pending = [...pending];
    for (const index of this.pending) {
      const stitch = this.stitches[index];
      if (stitch) stitch.place = null;
    }
    Object.assign(this, rest);
  }
}

/** A gap is half a place on. */
export const indexOf = (into: Into): number =>
  into.kind === 'place' ? into.index + (into.gap ? 0.5 : 0) : -1;
