import { borderRoundMm } from '../border/borderHeight';
import { gaugeOf, type Gauge } from '../gauge/gauge';
import { slotCounts } from '../colour/colourwayPlaces';
import type { ColourwayGroups } from '../colour/placeColourways';
import { DomainError } from '../errors';
import type { Join } from '../joins/join';
import { readyJoin } from '../joins/readyJoins';
import { joinEdgeMm, seamWidthMm } from '../joins/seamWidth';
import { gridCounts } from '../layout/gridCounts';
import { gridFor, gridSize } from '../layout/gridSize';
import { layoutFacts, layoutFor, type Arrangement } from '../layout/layouts';
import { motifGeometry, type MotifGeometry } from '../motifs/geometry';
import { mainMotif, type Plan } from '../plan/plan';
import type { FinishedSize } from './ledger';
import { joinStitches, type PieceContext } from './pieces';

/** A plan laid out: how many of everything, and how big. */
export interface Blanket extends PieceContext {
  readonly gauge: Gauge;
  readonly join: Join;
  readonly arrangement: Arrangement;
  readonly rows: number;
  readonly columns: number;
  readonly geometries: readonly MotifGeometry[];
  readonly size: FinishedSize;
}

/** How the motifs of a plan lie: as it says, or as motifs of their shape usually do. */
export const arrangementOf = ({ layout, edge, motifs }: Plan): Arrangement => ({
  layout: layout ?? layoutFor(motifs[0]?.sides ?? 4),
  edge,
});

/** Which colourways the main motifs may have, and which the second ones. */
export function colourwayGroups({ colourways, secondMotif }: Plan): ColourwayGroups {
  const all = colourways.map((_, i) => i);
  const isSecond = (i: number): boolean => colourways[i]?.motifIndex === secondMotif;
  return { main: all.filter((i) => !isSecond(i)), second: all.filter(isSecond) };
}

/**
 * Lays a plan out on its grid. Throws DomainError for a join that is not known, or a layout that
 * does not suit the motifs.
 */
export function blanketOf(plan: Plan): Blanket {
  const motif = mainMotif(plan);
  const arrangement = arrangementOf(plan);
  const facts = layoutFacts(arrangement.layout);
  const join = readyJoin(plan.join.key);
  if (!facts.sides.includes(motif.sides))
    throw new DomainError(
      'no-layout',
      `The layout "${arrangement.layout}" has no place for motifs of ${motif.sides} sides`,
    );
  if (
    facts.secondSides !== null &&
    plan.motifs[plan.secondMotif ?? -1]?.sides !== facts.secondSides
  )
    throw new DomainError(
      'no-second-motif',
      `The layout "${arrangement.layout}" requires a second motif of ${facts.secondSides} sides`,
    );
  if (!join)
    throw new DomainError(
      'unknown-join',
      `blanketOf requires a ready-made join, got "${plan.join.key}"`,
    );

  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  const geometries = plan.motifs.map((each) => motifGeometry(each, gauge, plan.motifSideMm));
  const main = geometries.filter((_, i) => i !== plan.secondMotif);
  const measures = {
    sides: motif.sides,
    acrossMm: Math.max(...main.map(({ acrossMm }) => acrossMm)),
    seamMm: seamWidthMm(join, gauge),
    edgeMm: joinEdgeMm(join, gauge),
    borderMm: plan.border.reduce((sum, round) => sum + borderRoundMm(round, gauge), 0),
  };
  const { rows, columns } = gridFor(arrangement, plan.size, measures);
  const counts = gridCounts(arrangement, rows, columns);
  const acrossSdMm = Math.max(...main.map((geometry) => geometry.acrossSdMm));
  // Motifs err together: the blanket by as much as one of them, as often as they lie side by side.
  const bare = { sides: motif.sides, acrossMm: acrossSdMm, seamMm: 0, edgeMm: 0, borderMm: 0 };
  const spread = gridSize(arrangement, rows, columns, bare);
  return {
    plan,
    gauge,
    join,
    arrangement,
    rows,
    columns,
    counts,
    geometries,
    size: {
      ...gridSize(arrangement, rows, columns, measures),
      widthSdMm: spread.widthMm,
      heightSdMm: spread.heightMm,
      seamMm: measures.seamMm,
      edgeMm: measures.edgeMm,
      borderMm: measures.borderMm,
    },
    places: slotCounts(
      arrangement,
      rows,
      columns,
      plan.placement,
      colourwayGroups(plan),
      plan.colourways.length,
    ),
    sideStitches: joinStitches(motif),
    seamMm: (main[0] as MotifGeometry).sideMm * (motif.sides === 0 ? 0.5 : 1),
    cornerLinks: motif.sides === 0 ? 0 : counts[`${plan.corners}Links`],
  };
}
