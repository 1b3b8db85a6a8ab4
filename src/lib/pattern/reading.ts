import type { LoopHeight, MotifSides, Ring } from '../motifs/motif';
import type { StitchCode, StitchCounts } from '../stitches/stitch';
import type { Diagnostic } from './diagnostic';
import type { Span } from './span';
import type { CountNote, PatternText } from './syntax';
import type { OwnStitch } from '../stitches/ownStitch';

export type Terms = 'us' | 'uk';

/** How a text is to be read. */
export interface ReadOptions {
  readonly terms: Terms;
  readonly sides: MotifSides;
  /** Which of the sizes "10 (12, 14)"; 0 is the first. */
  readonly size?: number;
  /** Stitches of one's own by the abbreviation they are written with. */
  readonly ownStitches?: readonly OwnStitch[];
}

/**
 * What a stitch is worked into. `place`: a place of the round below, by its index there, or, with `gap`,
 * between that place and the one that comes after it as this round meets them;
 * `round-start`: the first stitch of its own round, which a joining stitch closes to;
 * `own-chain`: chains just made, as of a picot; `facing`: the motif beside this one, which is finished; `none`: chains, which hang on nothing.
 */
export type Into =
  | { readonly kind: 'place'; readonly index: number; readonly gap?: true }
  | { readonly kind: 'ring' }
  | { readonly kind: 'round-start' }
  | { readonly kind: 'own-chain' }
  | { readonly kind: 'facing' }
  | { readonly kind: 'none' };

/**
 * stitch: counts as one; standing: a chain of the beginning that counts as part of a stitch;
 * turning: a chain of the beginning that does not; space: a chain of a chain space;
 * picot: a chain closed to a picot; travel: a slip stitch that walks to where the round begins;
 * join: closes the round; link: takes hold of the motif beside this one.
 */
export type Role =
  'stitch' | 'standing' | 'turning' | 'space' | 'picot' | 'travel' | 'join' | 'link';

/** One stitch that the hook makes, in the order of making; its index is its address in the round. */
export interface WorkedStitch {
  /** US abbreviation; every chain is a stitch of its own, "ch". */
  readonly code: StitchCode;
  readonly role: Role;
  readonly into: Into;
  /** 0 to sides - 1, in the order of making; 0 round a circle or where the round has no sides. */
  readonly side: number;
  /** The corner it stands at (the corner stitch, or a chain of the corner space), else null. */
  readonly corner: number | null;
  /** The place of its own round that it makes or is part of, for the next round; null for none. */
  readonly place: number | null;
  readonly colour: string | null;
  /** The instruction that makes it. */
  readonly span: Span;
}

/** What the next round can be worked into, in the order of making. */
export interface Place {
  readonly kind: 'stitch' | 'space';
  /** Of a stitch: its US code (a chain that counts as dc is "dc"). Of a space: "ch-2". */
  readonly code: string;
  /** Chains of a space, 0 for a stitch. */
  readonly chains: number;
  readonly side: number;
  readonly corner: number | null;
  /** How many stitches of the round below lie under it: what it is wide. */
  readonly width: number;
}

/** What the corners of a round are: chain spaces, or stitches. */
export type Corner =
  | { readonly kind: 'space'; readonly space: string }
  | { readonly kind: 'stitch'; readonly code: StitchCode };

/** One round as worked. */
export interface WorkedRound {
  readonly kind: 'round' | 'row';
  /** "Rnd 1", as the pattern numbers it. */
  readonly label: string;
  readonly number: number;
  /** Every stitch the hook makes, turning chain, travel and joining slip stitch included. */
  readonly made: StitchCounts;
  /** The part of `made` that walks to where the round begins. */
  readonly travel: StitchCounts;
  /** What the pattern counts as stitches. */
  readonly tally: StitchCounts;
  /** Chain spaces by kind: `{ "ch-2": 4 }`. */
  readonly spaces: Readonly<Record<string, number>>;
  /** Stitches between corners and the stitches that its chain spaces reach over; round a circle, all of them. */
  readonly perSide: number;
  /** The same for each side on its own. */
  readonly sideCounts: readonly number[];
  /** Null where the round has no corners yet. */
  readonly corner: Corner | null;
  readonly height: StitchCode | LoopHeight;
  readonly stitches: readonly WorkedStitch[];
  readonly places: readonly Place[];
  /** Colours in the order they are first used; empty where the pattern names none. */
  readonly colours: readonly string[];
  /** Whether the round is worked back the way the last one came. */
  readonly turned: boolean;
  /** Whether a join closes it. */
  readonly joined: boolean;
  /** What the bracketed note claims, if there is one. */
  readonly note: CountNote | null;
  /** Its text; several rounds have the same where one line stands for them all. */
  readonly span: Span;
}

/** What the first round is worked into, its stitches, and the text that makes it. */
export interface WorkedRing extends Ring {
  readonly kind: 'chain-ring' | 'magic-ring' | 'one-chain' | 'chain-row' | 'none';
  readonly span: Span | null;
  /** Chains to work into, of a foundation row or a chain worked into; else empty. */
  readonly places: readonly Place[];
}

/** A pattern, read and worked. */
export interface Reading {
  readonly text: string;
  readonly terms: Terms;
  readonly sides: MotifSides;
  readonly pattern: PatternText;
  readonly ring: WorkedRing;
  readonly rounds: readonly WorkedRound[];
  /** Instructions carried out and places looked at: at most `PATTERN_LIMITS.workSteps` and a little. */
  readonly workSteps: number;
  /** In the order of the text. */
  readonly diagnostics: readonly Diagnostic[];
}
