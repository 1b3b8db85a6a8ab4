import { PATTERN_LIMITS } from '../limits';
import type { Into, Place, Role, Terms } from '../reading';
import type { Report } from '../report';
import type { Span } from '../span';
import type { Corner } from '../reading';
import type { ChainRule } from '../syntax';
import type { OwnTakes } from './takes';

/** A stitch while its round is being worked. */
export interface DraftStitch {
  readonly code: string;
  role: Role;
  into: Into;
  place: number | null;
  readonly colour: string | null;
  readonly span: Span;
}

/** A place of the round that is being worked. `into`: the place below it, half a place on for the gap after it, or -1 for none. */
export interface DraftPlace {
  readonly kind: 'stitch' | 'space';
  readonly code: string;
  chains: number;
  readonly into: number;
}

/** What is worked into: the ring, which holds any number, or places in the order they are walked. */
export interface Below {
  readonly kind: 'ring' | 'places' | 'nothing';
  readonly places: readonly Place[];
  /** What each of the places is worked into itself: a space into nothing, -1. */
  readonly into: readonly number[];
  readonly corner: Corner | null;
  /** Indices of `places` in the order the hook meets them. */
  readonly order: readonly number[];
}

/** What all rounds of one reading share: how much work is left, and where to report. */
export class Budget {
  stitches = 0;
  steps = 0;
  told = false;
  /** That there is no ring is told once. */
  toldNoRing = false;
  /** So is that the terms may be the other ones. */
  toldTerms = false;

  constructor(
    readonly report: Report,
    readonly chainRules: readonly ChainRule[],
    readonly terms: Terms,
    readonly ownTakes: OwnTakes,
  ) {}

  /** Counts one step of work; false when there is too much, which is told once. */
  step(span: Span, count = 1): boolean {
    this.steps += count;
    return this.steps <= PATTERN_LIMITS.workSteps || this.tell(span);
  }

  stitch(span: Span): boolean {
    this.stitches += 1;
    return this.stitches <= PATTERN_LIMITS.stitches || this.tell(span);
  }

  get spent(): boolean {
    return this.told;
  }

  private tell(span: Span): boolean {
    if (!this.told) {
      const { stitches } = PATTERN_LIMITS;
      const message = `This is more than is worked here: at most ${stitches} stitches in all.`;
      this.report.say('error', 'limit', span, message);
    }
    this.told = true;
    return false;
  }
}
