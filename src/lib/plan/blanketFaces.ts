import { colouredLayout } from '../colour/colourwayPlaces';
import type { Face } from '../layout/face';
import { cellApothemMm, gridOrigin, type GridMeasures } from '../layout/gridSize';
import { placed } from '../layout/lattice';
import type { PlaneMap } from '../layout/planeMap';
import { colourwayGroups } from '../ledger/blanketOf';
import type { Estimate } from '../ledger/ledger';
import { mainMotif, type Plan } from './plan';

type PointMm = readonly [xMm: number, yMm: number];

/** One motif of a planned blanket, in mm from the blanket's top left corner. */
export interface BlanketMotif {
  readonly face: Face;
  /** Number of its colourway in the plan. */
  readonly colourway: number;
  readonly centreMm: PointMm;
  /** The motif with half a seam round it; of half a motif, that half. */
  readonly outlineMm: readonly PointMm[];
}

export interface LaidBlanket {
  readonly motifs: readonly BlanketMotif[];
  readonly map: () => PlaneMap;
  /** Pairs of neighbours alike that a placement at random could not avoid. */
  readonly alike: number;
}

let last: { plan: Plan; estimate: Estimate; result: LaidBlanket } | null = null;

/** Every motif of a planned blanket where it lies. `estimate` must be that of the plan. */
export function blanketFaces(plan: Plan, estimate: Estimate): LaidBlanket {
  if (last?.plan === plan && last.estimate === estimate) return last.result;
  const { rows, columns, layout } = estimate;
  const groups = colourwayGroups(plan);
  const laid = colouredLayout(estimate, rows, columns, plan.placement, groups);
  const measures = measuresOf(plan, estimate);
  const [left, top] = gridOrigin(estimate, rows, columns, measures);
  const apothemMm = cellApothemMm(measures);
  const toMm = (point: Face['centre']): PointMm => {
    const [x, y] = placed(layout, point);
    return [left + apothemMm * x, top + apothemMm * y];
  };
  const motifs = laid.faces.map((face, i) => ({
    face,
    colourway: laid.colourways[i] as number,
    centreMm: toMm(face.centre),
    outlineMm: face.points.map(toMm),
  }));
  const result = { motifs, map: laid.map, alike: laid.alike };
  last = { plan, estimate, result };
  return result;
}

function measuresOf(plan: Plan, { motifs, size }: Estimate): GridMeasures {
  const main = motifs.filter((_, i) => i !== plan.secondMotif);
  return {
    sides: mainMotif(plan).sides,
    acrossMm: Math.max(...main.map(({ acrossMm }) => acrossMm)),
    seamMm: size.seamMm,
    edgeMm: size.edgeMm,
    borderMm: size.borderMm,
  };
}
