/**
 * A stitch as the moves that make it; each move lays one loop of yarn.
 * wrap: yarn over before inserting the hook; draw: insert and draw up a loop;
 * through: yarn over and draw through loops on the hook.
 */
export interface Moves {
  readonly wraps: number;
  readonly draws: number;
  readonly throughs: number;
}

/** US abbreviation of a stitch, as published patterns print it: "dc", "sl st", "dc3tog". */
export type StitchCode = string;

/** How often each stitch is made, by US abbreviation. */
export type StitchCounts = Readonly<Record<StitchCode, number>>;

export interface Stitch extends Moves {
  readonly code: StitchCode;
  /** Full name in US terms. */
  readonly us: string;
  /** Full name and abbreviation in UK terms. */
  readonly uk: string;
  readonly ukCode: string;
  /** Chains that reach the height of this stitch at the start of a row or round. */
  readonly turningChains: number;
  /** Row height over stitch width. */
  readonly heightOverWidth: number;
}
