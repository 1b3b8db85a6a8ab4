/** How many stitches of the round below one stitch of one's own takes up, by its code. */
export type OwnTakes = ReadonlyMap<string, number>;

/**
 * Stitches of the round below that one stitch takes up: 3 of "dc3tog", 1 of "dc3cl", which stands in
 * one place, and what its maker says of a stitch of one's own.
 */
export function takesOf(code: string, own: OwnTakes): number {
  const legs = /(\d+)tog$/.exec(code)?.[1];
  return own.get(code) ?? (legs ? Number(legs) : 1);
}
