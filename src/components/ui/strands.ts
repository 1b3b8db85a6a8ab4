import type { WeightCategory } from '../../lib/plan/plan';

/** Thickness of one drawn strand, by weight category 0 to 7, in the card's own units (48 high). */
const thicknesses: Record<WeightCategory, number> = {
  0: 1.9,
  1: 2.3,
  2: 2.7,
  3: 3.15,
  4: 3.65,
  5: 4.2,
  6: 4.8,
  7: 5.4,
};

export const CARD = { width: 40, height: 48, edge: 6 } as const;

export interface Strand {
  /** SVG path of the middle of the strand. */
  path: string;
  /** The same curve, moved up into the light and down into the shade. */
  light: string;
  shade: string;
}

export function strandThickness(weight: WeightCategory): number {
  return thicknesses[weight];
}

/** Seven strands across the card, each bowed a little and overhanging both edges. */
export function woundStrands(weight: WeightCategory): Strand[] {
  const thickness = strandThickness(weight);
  const left = CARD.edge - 3.2 + thickness / 2;
  const right = CARD.width - left;
  const curve = (y: number) =>
    `M${left} ${(y - 0.35).toFixed(2)}Q${CARD.width / 2} ${(y + 0.25 * thickness + 0.5).toFixed(2)} ${right} ${(y + 0.35).toFixed(2)}`;
  return Array.from({ length: 7 }, (_, index) => {
    const y = CARD.height / 2 + (index - 3) * thickness;
    return {
      path: curve(y),
      light: curve(y - 0.24 * thickness),
      shade: curve(y + 0.38 * thickness),
    };
  });
}

/** Distance in px between the slanting lines of a bar, so that bulky yarn reads as bulky. */
export function plyPitchPx(weight: WeightCategory): number {
  return 3.5 + weight;
}
