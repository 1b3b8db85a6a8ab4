import type { Gauge } from '../gauge/gauge';
import type { WorkedRing } from '../pattern/reading';
import { glyphOf } from './glyph';
import type { DrawnPlace } from './ground';
import { add, towards, type Point } from './point';
import type { ChartSymbol } from './symbol';

const OVAL = 0.84;
/** How far from the end of the row its turning chains stand: clear of the first stitch. */
const ASIDE = 0.16;
const RING = -1;

/** The chains of a ring and the stitch that joins them, round the middle; a single chain lies in it. */
export function ringSymbols({ made }: WorkedRing, radiusMm: number, gauge: Gauge): ChartSymbol[] {
  const w = gauge.stitchWidthMm;
  const chains = made['ch'] ?? 0;
  const slips = made['sl st'] ?? 0;
  if (chains < 3 && slips === 0) {
    return Array.from({ length: chains }, (_, i) => {
      const y = (i - (chains - 1) / 2) * 0.32 * w;
      return oval(i, [-0.25 * w, y], [0.25 * w, y], 0.6 * w);
    });
  }
  const gaps = chains + 0.35 * slips;
  const on = (step: number): Point => {
    const angle = (2 * Math.PI * (step + 0.175 * slips)) / gaps;
    return [-radiusMm * Math.sin(angle), -radiusMm * Math.cos(angle)];
  };
  const ovals = Array.from({ length: chains }, (_, i): ChartSymbol => {
    const [begin, end] = [on(i), on(i + 1)];
    const chord = towards(begin, end);
    const inset = 0.06 * w;
    return oval(i, add(begin, chord, inset), add(end, chord, -inset), 0.72 * w);
  });
  const dots = Array.from({ length: slips }, (_, i): ChartSymbol => ({
    ...oval(chains + i, on(-0.175 * slips), on(-0.175 * slips), w),
    glyph: glyphOf('sl st'),
  }));
  return [...ovals, ...dots];
}

/** A foundation chain from right to left under the first row, its turning chains upright at the end. */
export function foundationRow({ made, places }: WorkedRing, gauge: Gauge) {
  const w = gauge.stitchWidthMm;
  const chains = made['ch'] ?? 0;
  const lying = Math.min(chains, places.length || chains);
  // The first place of a row whose chains stand for a stitch has no chain of its own.
  const first = places.length - lying;
  const symbols = Array.from({ length: chains }, (_, i): ChartSymbol => {
    if (i < lying) {
      const x = -(Math.max(0, first) + i + 0.5) * w;
      return oval(i, [x - (OVAL / 2) * w, 0], [x + (OVAL / 2) * w, 0], w);
    }
    const up = (i - lying) * 0.75 * w + 0.2 * w;
    return oval(i, [ASIDE * w, -up], [ASIDE * w, -up - 0.7 * w], w);
  });
  const drawn = places.map((_, i): DrawnPlace => ({
    at: [-(i + 0.5) * w, -0.15 * w],
    outward: [0, -1],
    isSpace: false,
    roomMm: w,
  }));
  return { symbols, places: drawn };
}

const oval = (stitch: number, foot: Point, head: Point, unitMm: number): ChartSymbol => ({
  round: RING,
  stitch,
  glyph: glyphOf('ch'),
  feet: [foot],
  head,
  unitMm,
});
