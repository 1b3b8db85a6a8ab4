import type { Gauge } from '../gauge/gauge';
import type { OwnStitch } from '../stitches/ownStitch';
import type { Point } from './point';
import type { Track } from './track';

/** A place of a round as drawn: where the next round is worked into, and the room there is. */
export interface DrawnPlace {
  readonly at: Point;
  readonly outward: Point;
  readonly isSpace: boolean;
  readonly roomMm: number;
}

/** What a round is drawn on. */
export interface Ground {
  readonly index: number;
  readonly inner: Track;
  readonly outer: Track;
  /** The round makes a polygon of a circle: every stitch reaches the new outline. */
  readonly reshapes: boolean;
  /** Whether the end of the round meets its beginning. */
  readonly isClosed: boolean;
  readonly below: readonly DrawnPlace[];
  readonly gauge: Gauge;
  readonly own: ReadonlyMap<string, OwnStitch>;
}
