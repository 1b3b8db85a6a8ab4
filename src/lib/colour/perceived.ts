import { formatHex, modeOklab, modeRgb, useMode as register } from 'culori/fn';

const toRgb = register(modeRgb);
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

/** Two sRGB colours mixed in OKLab, `share` of the first: `mixed('#ffffff', '#000000', 1)` is "#ffffff". */
export function mixed(one: string, other: string, share: number): string {
  const [left, right] = [perceived(one), perceived(other)];
  const between = (of: 'l' | 'a' | 'b'): number => share * left[of] + (1 - share) * right[of];
  return formatHex(
    toRgb({ mode: 'oklab', l: between('l'), a: between('a'), b: between('b') }) ?? '#888888',
  );
}
