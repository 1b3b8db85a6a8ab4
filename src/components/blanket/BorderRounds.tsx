import { useId } from 'react';
import { gaugeOf } from '../../lib/gauge/gauge';
import { fixed } from '../../lib/motifs/polygonPoints';
import type { Estimate } from '../../lib/ledger/ledger';
import type { BlanketMotif } from '../../lib/plan/blanketFaces';
import type { Plan } from '../../lib/plan/plan';
import { hexOf } from './hexOf';

interface BorderRoundsProps {
  plan: Plan;
  estimate: Estimate;
  motifs: readonly BlanketMotif[];
}

/**
 * Border rounds from the outside in: the outlines of the outer motifs, stroked as wide as the
 * round reaches, so that a border follows whatever edge there is.
 */
export function BorderRounds({ plan, estimate, motifs }: BorderRoundsProps) {
  const id = useId();
  const { edgeMm, borderMm, seamMm } = estimate.size;
  const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
  let inMm = 0;
  const rounds = plan.border.toReversed().map(({ stitch, colour }) => {
    const reachMm = edgeMm + borderMm - seamMm / 2 - inMm;
    inMm += gauge.heightMm(stitch);
    return { reachMm: Math.max(0, reachMm), hex: hexOf(plan, colour) };
  });
  if (rounds.length === 0) return null;
  return (
    <g className="keeps-colour" strokeLinejoin="miter">
      <defs>
        <path id={id} d={outerOutlines(motifs)} />
      </defs>
      {rounds.map(({ reachMm, hex }) => (
        <use
          key={reachMm}
          href={`#${id}`}
          fill={hex}
          stroke={hex}
          strokeWidth={fixed(2 * reachMm)}
        />
      ))}
    </g>
  );
}

/** Outlines of the motifs that have a side no other has. */
function outerOutlines(motifs: readonly BlanketMotif[]): string {
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
