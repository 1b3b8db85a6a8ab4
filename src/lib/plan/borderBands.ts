import { borderRoundMm } from '../border/borderHeight';
import { gaugeOf } from '../gauge/gauge';
import type { Estimate } from '../ledger/ledger';
import { fixed } from '../motifs/polygonPoints';
import type { BlanketMotif } from './blanketFaces';
import type { Plan } from './plan';

/** A round of border: the outer motifs' outlines, drawn so wide that they reach this far out. */
export interface BorderBand {
  readonly reachMm: number;
  readonly colour: string;
}

/** How sharp a corner a border follows: to 60°; half a triangle is sharper, but no corner of the blanket. */
export const MITRE_LIMIT = 2.1;

/** The rounds of a border from the outside in, each to be drawn over the one before. */
export function borderBands(plan: Plan, { size }: Estimate): BorderBand[] {
  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  let inMm = 0;
  return plan.border.toReversed().map((round) => {
    const reachMm = size.edgeMm + size.borderMm - size.seamMm / 2 - inMm;
    inMm += borderRoundMm(round, gauge);
    return { reachMm: Math.max(0, reachMm), colour: round.colour };
  });
}

/** Outlines, as one SVG path in mm, of the motifs that have a side no other has. */
export function outerOutlines(motifs: readonly BlanketMotif[]): string {
  const sides = new Map<string, number>();
  const namesOf = ({ face: { points } }: BlanketMotif): string[] =>
    points.map((point, i) => {
      const next = points[(i + 1) % points.length] as (typeof points)[number];
      return [point.join(), next.join()].sort().join(' ');
    });
  for (const motif of motifs) {
    for (const name of namesOf(motif)) sides.set(name, (sides.get(name) ?? 0) + 1);
  }
  return motifs
    .filter((motif) => namesOf(motif).some((name) => sides.get(name) === 1))
    .map(({ outlineMm }) => `M${outlineMm.map(([x, y]) => `${fixed(x)} ${fixed(y)}`).join('L')}Z`)
    .join('');
}
