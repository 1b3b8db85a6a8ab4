import type { BlanketMotif } from '../../../lib/plan/blanketFaces';
import type { Plan } from '../../../lib/plan/plan';

/** Where a motif lies, and in what: "Row 2, motif 3: colourway 1, Barley, Rosehip, Bracken, Barley". */
export function motifInWords(plan: Plan, { face, colourway }: BlanketMotif): string {
  return `Row ${face.row + 1}, motif ${face.column + 1}: colourway ${colourway + 1}, ${coloursInWords(plan, colourway)}`;
}

/** The colours of a colourway from the middle out: "Barley, Rosehip, Bracken, Barley". */
export const coloursInWords = (plan: Plan, colourway: number): string =>
  (plan.colourways[colourway]?.roundColours ?? [])
    .map((key) => plan.colours.find((colour) => colour.key === key)?.name ?? 'no colour')
    .join(', ');
