import type { Chart } from '../../lib/chart/layoutChart';
import type { ChartSymbol } from '../../lib/chart/symbol';

/** How near a finger or a mouse must come, in stitch widths. */
const REACH = 0.6;

/** The symbol that is meant by a point of the chart, in mm from its middle; null far from any. */
export function nearestSymbol(chart: Chart, [x, y]: readonly [number, number]): ChartSymbol | null {
  let best: ChartSymbol | null = null;
  let bestMm = REACH * chart.stitchWidthMm;
  for (const symbols of [chart.ring, ...chart.rounds]) {
    for (const symbol of symbols) {
      for (const foot of symbol.feet) {
        const awayMm = toSegment(x, y, foot, symbol.head);
        if (awayMm < bestMm) {
          best = symbol;
          bestMm = awayMm;
        }
      }
    }
  }
  return best;
}

type Point = readonly [number, number];

function toSegment(x: number, y: number, [ax, ay]: Point, [bx, by]: Point): number {
  const length = (bx - ax) ** 2 + (by - ay) ** 2;
  const along = length === 0 ? 0 : ((x - ax) * (bx - ax) + (y - ay) * (by - ay)) / length;
  const share = Math.min(1, Math.max(0, along));
  return Math.hypot(x - ax - share * (bx - ax), y - ay - share * (by - ay));
}
