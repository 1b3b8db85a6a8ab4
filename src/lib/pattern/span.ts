/** A stretch of the person's own text: offsets of its first character and of the one after its last. */
export interface Span {
  readonly begin: number;
  readonly end: number;
}

/** The stretch from the beginning of one to the end of another. */
export const spanFrom = (first: Span, last: Span): Span => ({
  begin: Math.min(first.begin, last.begin),
  end: Math.max(first.end, last.end),
});
