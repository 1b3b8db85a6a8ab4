import { ringRadiusMm, roundHeightMm } from '../motifs/geometry';
import type { Gauge } from '../gauge/gauge';
import { motifOf } from '../pattern/motifOf';
import type { Reading } from '../pattern/reading';
import { ownStitchCode, type OwnStitch } from '../stitches/ownStitch';
import { arrangeRounds } from './arrangeRounds';
import { arrangeRows } from './arrangeRows';
import type { ArrangedRound } from './arranged';
import { foundationRow, ringSymbols } from './foundation';
import { hullOf } from './hull';
import type { DrawnPlace } from './ground';
import { placeRound } from './placeRound';
import type { ChartSymbol } from './symbol';
import { circleTrack, polygonTrack, rowTrack, type Track } from './track';

/** A pattern drawn in symbols, in mm from the top left corner of its box. */
export interface Chart {
  /** Box round the motif as made: what the rule measures. */
  readonly widthMm: number;
  readonly heightMm: number;
  /** From the corner of the box to the point that the symbols are measured from. */
  readonly originMm: readonly [xMm: number, yMm: number];
  /** What reaches beyond the box on any side, such as picots. */
  readonly overMm: number;
  /** Radius of a magic ring, which is no stitch, or null. */
  readonly magicRingMm: number | null;
  /** Width of a stitch: what line widths and symbols are sized by. */
  readonly stitchWidthMm: number;
  readonly ring: readonly ChartSymbol[];
  readonly rounds: readonly (readonly ChartSymbol[])[];
}

/**
 * The symbol chart of a pattern: each stitch from the place it is worked into to its own place, on the
 * outlines that the heights of the rounds give. Linear in the number of stitches.
 */
export function layoutChart(
  reading: Reading,
  gauge: Gauge,
  ownStitches: readonly OwnStitch[] = [],
): Chart {
  const own = new Map(ownStitches.map((each) => [ownStitchCode(each), each]));
  return reading.rounds[0]?.kind === 'row'
    ? rowsChart(reading, gauge, own)
    : motifChart(reading, gauge, own);
}

type Own = ReadonlyMap<string, OwnStitch>;

function motifChart(reading: Reading, gauge: Gauge, own: Own): Chart {
  const { sides, ring } = reading;
  const ringMm = ringRadiusMm(motifOf(reading, '', ''), gauge);
  const apothemsMm = [ringMm];
  for (const round of reading.rounds)
    apothemsMm.push((apothemsMm.at(-1) ?? 0) + roundHeightMm(round, gauge));
  let below: readonly DrawnPlace[] = [];
  let inner: Track = circleTrack(sides, ringMm);
  let isPolygon = false;
  const rounds = arrangeRounds(reading, gauge, apothemsMm).map((arranged, index) => {
    const apothemMm = apothemsMm[index + 1] ?? ringMm;
    const hasCorners = arranged.round.corner !== null && sides !== 0;
    const reshapes = hasCorners && !isPolygon && index > 0;
    isPolygon ||= hasCorners;
    const outer =
      isPolygon && sides !== 0 ? polygonTrack(sides, apothemMm) : circleTrack(sides, apothemMm);
    const ground = { index, inner, outer, reshapes, isClosed: !arranged.isOpen, below, gauge, own };
    const drawn = placeRound(arranged, ground);
    below = drawn.places;
    inner = outer;
    return drawn.symbols;
  });
  const apothemMm = apothemsMm.at(-1) ?? ringMm;
  const box = motifBox(isPolygon ? sides : 0, apothemMm);
  return withOver({
    ...box,
    magicRingMm: ring.kind === 'magic-ring' ? ringMm : null,
    stitchWidthMm: gauge.stitchWidthMm,
    ring: ringSymbols(ring, ringMm, gauge),
    rounds,
  });
}

function rowsChart(reading: Reading, gauge: Gauge, own: Own): Chart {
  const w = gauge.stitchWidthMm;
  let upMm = 0.45 * w;
  const rows = arrangeRows(reading, gauge);
  const foundation = foundationRow(reading.ring, gauge);
  let below: readonly DrawnPlace[] = foundation.places;
  let inner = rowTrack(upMm);
  const rounds = rows.map((arranged, index) => {
    upMm += roundHeightMm(arranged.round, gauge);
    const outer = rowTrack(upMm);
    const ground = { index, inner, outer, reshapes: false, isClosed: false, below, gauge, own };
    const drawn = placeRound(arranged, ground);
    below = drawn.places;
    inner = outer;
    return drawn.symbols;
  });
  const [least, most] = extentOf(rows, w);
  return withOver({
    widthMm: most - least,
    heightMm: upMm,
    originMm: [most, upMm],
    magicRingMm: null,
    stitchWidthMm: w,
    ring: foundation.symbols,
    rounds,
  });
}

function extentOf(rows: readonly ArrangedRound[], w: number): [number, number] {
  const ends = rows.flatMap(({ elements, alongs }) =>
    elements.flatMap(({ widthMm }, i) => [
      (alongs[i] ?? 0) - widthMm / 2,
      (alongs[i] ?? 0) + widthMm / 2,
    ]),
  );
  return ends.length === 0 ? [0, w] : [Math.min(...ends), Math.max(...ends)];
}

function motifBox(
  sides: number,
  apothemMm: number,
): Pick<Chart, 'widthMm' | 'heightMm' | 'originMm'> {
  if (sides === 0 || sides % 4 === 0)
    return { widthMm: 2 * apothemMm, heightMm: 2 * apothemMm, originMm: [apothemMm, apothemMm] };
  const reachMm = apothemMm / Math.cos(Math.PI / sides);
  if (sides === 3) {
    const halfMm = apothemMm * Math.tan(Math.PI / 3);
    return { widthMm: 2 * halfMm, heightMm: apothemMm + reachMm, originMm: [halfMm, reachMm] };
  }
  return { widthMm: 2 * reachMm, heightMm: 2 * apothemMm, originMm: [reachMm, apothemMm] };
}

function withOver(chart: Omit<Chart, 'overMm'>): Chart {
  const { widthMm, heightMm, originMm } = chart;
  let overMm = 0;
  for (const symbol of [...chart.ring, ...chart.rounds.flat()])
    for (const [x, y] of hullOf(symbol)) {
      const [left, top] = [x + originMm[0], y + originMm[1]];
      overMm = Math.max(overMm, -left, -top, left - widthMm, top - heightMm);
    }
  return { ...chart, overMm };
}
