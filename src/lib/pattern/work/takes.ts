/** Stitches of the round below that one stitch takes up: 3 of "dc3tog", 1 of "dc3cl", which stands in one place. */
export function takesOf(code: string): number {
  const legs = /(\d+)tog$/.exec(code)?.[1];
  return legs ? Number(legs) : 1;
}
