/** A tail left to weave in: the longer of the published 100 to 150 mm. */
export const TAIL_M = 0.15;
/** Share of a tail that stays in the piece once woven in and trimmed. */
export const TAIL_KEPT = 0.75;
/** Relative standard deviation of one tail: ours. */
export const TAIL_SPREAD = 0.3;
