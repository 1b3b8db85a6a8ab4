import type { StitchCode } from '../stitches/stitch';
import type { Span } from './span';

/** A number of the text; where it is given for several sizes, the one that was asked for. */
export interface Amount {
  readonly value: number;
  readonly sizes: readonly number[] | null;
}

/**
 * What kind of place is meant: "st", "dc", "ch-2 sp", "sp", "corner"; gap: between two stitches;
 * gap-of-groups: between groups of stitches, whether there are chains there or not.
 */
export interface PlaceFilter {
  readonly of:
    'stitch' | 'space' | 'stitch-or-space' | 'corner' | 'corner-space' | 'gap' | 'gap-of-groups';
  /** US code of the stitch named, or null for any. */
  readonly code: StitchCode | null;
  /** Chains of the space named, or null for any. */
  readonly chains: number | null;
}

/** How far "each …" or a repeat goes. `left`: to the last so many stitches of the round, or of this side. */
export type Until =
  | { readonly to: 'end'; readonly word: 'around' | 'across' | 'to end' }
  | { readonly to: 'corner' }
  | { readonly to: 'space'; readonly filter: PlaceFilter }
  | { readonly to: 'left'; readonly amount: Amount; readonly before: 'end' | 'corner' };

/** Where stitches are worked. */
export type Where =
  | { readonly kind: 'next'; readonly amount: Amount; readonly filter: PlaceFilter }
  | { readonly kind: 'last'; readonly amount: Amount; readonly filter: PlaceFilter }
  | { readonly kind: 'each'; readonly until: Until; readonly filter: PlaceFilter }
  | { readonly kind: 'same' }
  | { readonly kind: 'first'; readonly filter: PlaceFilter }
  /** Any place of this kind: where a new yarn is attached. */
  | { readonly kind: 'any'; readonly filter: PlaceFilter }
  | { readonly kind: 'ring'; readonly magic: boolean }
  | { readonly kind: 'turning-chain' }
  /** A place of the motif beside this one, across from where the hook is. */
  | { readonly kind: 'facing'; readonly filter: PlaceFilter }
  | { readonly kind: 'chain-from-hook'; readonly nth: number };

/** What a beginning chain stands for: a stitch and the chains of a space, or no stitch at all. */
export interface StandsFor {
  readonly code: StitchCode | null;
  readonly chains: number;
}

/** Times of a repeat, in all. */
export type Times =
  | { readonly kind: 'count'; readonly amount: Amount }
  | { readonly kind: 'until'; readonly until: Until };

export interface StitchStep extends Span {
  readonly kind: 'stitch';
  readonly code: StitchCode;
  /** So many in each place; without a place, one in each of the next so many. */
  readonly amount: Amount;
  readonly where: readonly Where[];
  /** A new yarn begins with this stitch. */
  readonly standing: boolean;
}

export interface ChainStep extends Span {
  readonly kind: 'chain';
  readonly amount: Amount;
  /** Where the number is written, or the word where there is none. */
  readonly amountSpan: Span;
  /** What the pattern says it counts as, or null where it says nothing. */
  readonly standsFor: StandsFor | null;
}

export interface SkipStep extends Span {
  readonly kind: 'skip';
  readonly amount: Amount;
  readonly filter: PlaceFilter;
}

/** Stitches all worked in one place: "(2 dc, ch 2, 2 dc) in next ch-2 sp". */
export interface GroupStep extends Span {
  readonly kind: 'group';
  readonly parts: readonly Step[];
  readonly times: Amount;
  readonly where: readonly Where[];
}

export interface RepeatStep extends Span {
  readonly kind: 'repeat';
  readonly mark: 'brackets' | 'star';
  readonly parts: readonly Step[];
  readonly times: Times;
  /** How many of the parts stand before "**", or null; the last time ends there. */
  readonly partsBeforeEnd: number | null;
}

/** The round is closed. */
export interface JoinStep extends Span {
  readonly kind: 'join';
  /** The stitch that closes it; null where a ring is closed or nothing is said: a slip stitch. */
  readonly code: StitchCode;
  readonly to: 'ring' | 'turning-chain' | 'first' | 'unsaid';
}

/** A yarn is attached: "join B with sl st in any ch-2 sp". */
export interface AttachStep extends Span {
  readonly kind: 'attach';
  readonly code: StitchCode | null;
  readonly colour: string | null;
  readonly where: readonly Where[];
}

export interface ColourStep extends Span {
  readonly kind: 'colour';
  readonly colour: string;
}

export interface PlainStep extends Span {
  readonly kind: 'magic-ring' | 'turn' | 'fasten-off';
}

/** One instruction. */
export type Step =
  | StitchStep
  | ChainStep
  | SkipStep
  | GroupStep
  | RepeatStep
  | JoinStep
  | AttachStep
  | ColourStep
  | PlainStep;

/** One figure of a count note: "12 dc", "4 ch-2 sps", "16 sts", "7 dc on each side". */
export interface CountEntry extends Span {
  readonly amount: Amount;
  readonly amountSpan: Span;
  /** One for each of the rounds that the note stands for: "(24, 36, 48 dc)". */
  readonly byRound: readonly number[] | null;
  readonly of:
    | { readonly kind: 'stitch'; readonly code: StitchCode }
    | { readonly kind: 'space'; readonly chains: number | null }
    | { readonly kind: 'all' };
  readonly perSide: boolean;
}

export interface CountNote extends Span {
  readonly entries: readonly CountEntry[];
}

/** The rounds that this one works again: "rep Rnds 2 and 3". */
export interface RoundsAgain extends Span {
  readonly from: number;
  readonly to: number;
}

/** One line of instructions; "Rnds 3-5" stands for several rounds. */
export interface RoundText extends Span {
  readonly kind: 'round' | 'row';
  readonly from: number;
  readonly to: number;
  /** Where "Rnd 1" is written. */
  readonly header: Span;
  readonly side: 'RS' | 'WS' | null;
  readonly colour: string | null;
  readonly again: RoundsAgain | null;
  readonly steps: readonly Step[];
  readonly note: CountNote | null;
}

/** A chain that the whole pattern counts alike: "ch 3 at beg of rnd counts as dc throughout". */
export interface ChainRule {
  readonly chains: number;
  readonly standsFor: StandsFor;
}

/** A pattern as written: the model that is worked and printed. */
export interface PatternText {
  /** What is made before the first round. */
  readonly foundation: readonly Step[];
  readonly chainRules: readonly ChainRule[];
  readonly rounds: readonly RoundText[];
  /** Text that is left out of the work. */
  readonly comments: readonly Span[];
}
