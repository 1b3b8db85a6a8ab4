/** Half widths of symbols and lengths of their parts, in stitch widths: ours, chosen by eye. */
export const SIZES = {
  dot: 0.15,
  cross: 0.32,
  cap: 0.32,
  thickHalf: 0.4,
  footHalf: 0.1,
  chainHalf: 0.21,
  bar: 0.2,
  hook: 0.14,
  line: 0.09,
} as const;
