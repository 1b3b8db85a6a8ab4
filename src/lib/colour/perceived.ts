import { modeOklab, modeRgb, useMode as register } from 'culori/fn';

register(modeRgb);
const toOklab = register(modeOklab);

/** A colour as it is seen: lightness 0 to 1, and how far to green or red (a), to blue or yellow (b). */
export interface Perceived {
  readonly l: number;
  readonly a: number;
  readonly b: number;
}

/** An sRGB "#rrggbb" in OKLab (Björn Ottosson, 2020), through culori: `perceived('#ffffff').l` is 1. */
export function perceived(hex: string): Perceived {
  const { l, a, b } = toOklab(hex) ?? { l: 0.5, a: 0, b: 0 };
  return { l, a, b };
}

/** How far apart two colours are in OKLab. */
export const apart = (one: Perceived, other: Perceived): number =>
  Math.hypot(one.l - other.l, one.a - other.a, one.b - other.b);
