type Triple = readonly [number, number, number];

/** How linear sRGB looks to whoever lacks one kind of cone (published: Machado, Oliveira and Fernandes 2009, severity 1). */
const VISION: Readonly<Record<string, readonly [Triple, Triple, Triple]>> = {
  usual: [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  protanopia: [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  deuteranopia: [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  tritanopia: [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
};
export const VISIONS = Object.keys(VISION);

const times = (matrix: readonly Triple[], [a, b, c]: Triple): Triple =>
  matrix.map(([x, y, z]) => x * a + y * b + z * c) as unknown as Triple;

const linear = (hex: string): Triple =>
  [1, 3, 5].map((at) => {
    const value = parseInt(hex.slice(at, at + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  }) as unknown as Triple;

/** OKLab of linear sRGB (published: Ottosson 2020). */
function okLab(rgb: Triple): Triple {
  const cones = times(
    [
      [0.4122214708, 0.5363325363, 0.0514459929],
      [0.2119034982, 0.6806995451, 0.1073969566],
      [0.0883024619, 0.2817188376, 0.6299787005],
    ],
    rgb,
  ).map((cone) => Math.cbrt(Math.max(0, cone))) as unknown as Triple;
  return times(
    [
      [0.2104542553, 0.793617785, -0.0040720468],
      [1.9779984951, -2.428592205, 0.4505937099],
      [0.0259040371, 0.7827717662, -0.808675766],
    ],
    cones,
  );
}

/** How far apart two colours look to somebody, in OKLab: black and white are 1 apart. */
export function apart(one: string, other: string, vision: string): number {
  const [a, b] = [one, other].map((hex) => okLab(times(VISION[vision] ?? [], linear(hex))));
  return Math.hypot(...[0, 1, 2].map((k) => (a?.[k] ?? 0) - (b?.[k] ?? 0)));
}

/** Contrast of two colours (published: WCAG 2.2). */
export function contrast(one: string, other: string): number {
  const luminance = (hex: string): number => times([[0.2126, 0.7152, 0.0722]], linear(hex))[0];
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (light + 0.05) / (dark + 0.05);
}
