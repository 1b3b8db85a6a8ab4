import { hullOf } from './hull';
import type { Chart } from './layoutChart';
import type { Point } from './point';
import type { ChartSymbol } from './symbol';

/** Two symbols whose boxes overlap, and the share of the smaller box that the other covers. */
export interface Overlap {
  readonly a: ChartSymbol;
  readonly b: ChartSymbol;
  readonly share: number;
}

/** Every pair of symbols that overlaps by more than `share`. Looks only at symbols near one another. */
export function overlapsOf(chart: Chart, share: number): Overlap[] {
  const symbols = [...chart.ring, ...chart.rounds.flat()];
  const hulls = symbols.map(hullOf);
  const areas = hulls.map(areaOf);
  const cellMm = 2 * chart.stitchWidthMm;
  const cells = new Map<string, number[]>();
  const seen = new Set<number>();
  const overlaps: Overlap[] = [];
  hulls.forEach((hull, i) => {
    for (const key of cellsOf(hull, cellMm)) {
      const others = cells.get(key) ?? [];
      for (const j of others) {
        const pair = i * symbols.length + j;
        if (seen.has(pair)) continue;
        seen.add(pair);
        const common = areaOf(clipped(hull, hulls[j] as Point[]));
        const covered = common / Math.max(1e-9, Math.min(areas[i] ?? 0, areas[j] ?? 0));
        if (covered > share)
          overlaps.push({
            a: symbols[j] as ChartSymbol,
            b: symbols[i] as ChartSymbol,
            share: covered,
          });
      }
      cells.set(key, [...others, i]);
    }
  });
  return overlaps;
}

function cellsOf(hull: readonly Point[], cellMm: number): string[] {
  const range = (k: 0 | 1): number[] => {
    const values = hull.map((point) => Math.floor(point[k] / cellMm));
    const [least, most] = [Math.min(...values), Math.max(...values)];
    return Array.from({ length: most - least + 1 }, (_, i) => least + i);
  };
  return range(0).flatMap((x) => range(1).map((y) => `${x} ${y}`));
}

/** Positive area of a polygon. */
const areaOf = (points: readonly Point[]): number => Math.abs(signedArea(points));

const signedArea = (points: readonly Point[]): number =>
  points.reduce((sum, [x, y], i) => {
    const [nextX, nextY] = points[(i + 1) % points.length] as Point;
    return sum + (x * nextY - nextX * y) / 2;
  }, 0);

/** What is left of a convex polygon inside another. Variant: Sutherland and Hodgman's clipping. */
function clipped(subject: readonly Point[], window: readonly Point[]): Point[] {
  const turn = Math.sign(signedArea(window)) || 1;
  return window.reduce<Point[]>(
    (left, from, i) => {
      const to = window[(i + 1) % window.length] as Point;
      const inside = ([x, y]: Point): number =>
        turn * ((to[0] - from[0]) * (y - from[1]) - (to[1] - from[1]) * (x - from[0]));
      return left.flatMap((point, j) => {
        const next = left[(j + 1) % left.length] as Point;
        const [here, there] = [inside(point), inside(next)];
        const kept: Point[] = here >= 0 ? [point] : [];
        if (here >= 0 === there >= 0) return kept;
        const share = here / (here - there);
        const cut: Point = [
          point[0] + share * (next[0] - point[0]),
          point[1] + share * (next[1] - point[1]),
        ];
        return [...kept, cut];
      });
    },
    [...subject],
  );
}
