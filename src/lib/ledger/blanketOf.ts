import { gaugeOf, type Gauge } from '../gauge/gauge';
import { DomainError } from '../errors';
import type { Join } from '../joins/join';
import { cornerLinks } from '../joins/links';
import { readyJoin } from '../joins/readyJoins';
import { joinEdgeMm, seamWidthMm } from '../joins/seamWidth';
import { colourwayCounts } from '../layout/colourwayCounts';
import { gridCounts } from '../layout/gridCounts';
import { gridFor, gridSize } from '../layout/gridSize';
import { layoutFor, type Layout } from '../layout/layouts';
import { motifGeometry, type MotifGeometry } from '../motifs/geometry';
import type { Motif } from '../motifs/motif';
import type { Plan } from '../plan/plan';
import type { FinishedSize } from './ledger';
import { joinSidesOf, type PieceContext } from './pieces';

/** A plan laid out: how many of everything, and how big. */
export interface Blanket extends PieceContext {
  readonly gauge: Gauge;
  readonly join: Join;
  readonly layout: Layout;
  readonly rows: number;
  readonly columns: number;
  readonly geometries: readonly MotifGeometry[];
  readonly size: FinishedSize;
}

/**
 * Lays a plan out on its grid. Throws DomainError for a join that is not known or motifs of a shape
 * that has no layout.
 */
export function blanketOf(plan: Plan): Blanket {
  const motif = plan.motifs[0] as Motif;
  const layout = layoutFor(motif.sides);
  const join = readyJoin(plan.join.key);
  if (!layout)
    throw new DomainError(
      'no-layout',
      `blanketOf requires motifs of 0, 4 or 6 sides, got ${motif.sides}`,
    );
  if (!join)
    throw new DomainError(
      'unknown-join',
      `blanketOf requires a ready-made join, got "${plan.join.key}"`,
    );

  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  const geometries = plan.motifs.map((each) => motifGeometry(each, gauge, plan.motifSideMm));
  const measures = {
    acrossMm: Math.max(...geometries.map(({ acrossMm }) => acrossMm)),
    seamMm: seamWidthMm(join, gauge),
    edgeMm: joinEdgeMm(join, gauge),
    borderMm: plan.border.reduce((sum, { stitch }) => sum + gauge.heightMm(stitch), 0),
  };
  const { rows, columns } = gridFor(layout, plan.size, measures);
  const counts = gridCounts(layout, rows, columns);
  const acrossSdMm = Math.max(...geometries.map((geometry) => geometry.acrossSdMm));
  return {
    plan,
    gauge,
    join,
    layout,
    rows,
    columns,
    counts,
    geometries,
    size: {
      ...gridSize(layout, rows, columns, measures),
      widthSdMm: columns * acrossSdMm,
      heightSdMm: rows * acrossSdMm,
      seamMm: measures.seamMm,
      edgeMm: measures.edgeMm,
      borderMm: measures.borderMm,
    },
    colourwayMotifs: colourwayCounts(rows, columns, plan.colourways.length),
    sideStitches: joinStitches(motif),
    seamMm: (geometries[0] as MotifGeometry).sideMm * (motif.sides === 0 ? 0.5 : 1),
    cornerLinks: motif.sides === 0 ? 0 : cornerLinks(layout, counts, plan.corners),
    seamLines: seamLines(layout, rows, columns),
  };
}

/** Stitches of a side between corner centres; an eighth of a circle touches each neighbour (ours). */
export function joinStitches(motif: Motif): number {
  const perSide = motif.rounds.at(-1)?.perSide ?? 0;
  return motif.sides === 0 ? Math.floor(perSide / (2 * joinSidesOf(motif))) : perSide;
}

/**
 * Long lines that seams can be worked in without cutting: every row and every column of a square
 * grid; of hexagons every zigzag between rows, and each seam within a row on its own.
 */
function seamLines(layout: Layout, rows: number, columns: number): number {
  return layout === 'square' ? rows - 1 + (columns - 1) : rows - 1 + rows * (columns - 1);
}
