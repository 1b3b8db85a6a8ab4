import type { WeightCategory } from '../../lib/plan/plan';

/** Thickness of one drawn strand, by weight category 0 to 7, in the card's own units. */
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

/** The card's drawing; `edge` is the margin on either side that the strands overhang into. */
export const CARD = { width: 40, height: 48, edge: 6 } as const;

const STRANDS = 7;
const OVERHANG = 3.2;

/** SVG paths through all seven strands at once. */
export interface WoundStrands {
  /** The middle of each strand. */
  middle: string;
  /** The same curves, moved up into the light and down into the shade. */
  light: string;
  shade: string;
  /** Slanting marks where the plies turn. */
  plies: string;
}

export function strandThickness(weight: WeightCategory): number {
  return thicknesses[weight];
}

/** Seven strands across the card, each bowed a little, sloping a little, and overhanging both edges. */
export function woundStrands(weight: WeightCategory): WoundStrands {
  const thickness = strandThickness(weight);
  const heights = Array.from(
    { length: STRANDS },
    (_, index) => CARD.height / 2 + (index - (STRANDS - 1) / 2) * thickness,
  );
  const across = (shift: number) =>
    heights.map((y) => curve(y + shift * thickness, thickness)).join('');
  return {
    middle: across(0),
    light: across(-0.24),
    shade: across(0.38),
    plies: heights.map((y) => plyMarks(y, thickness)).join(''),
  };
}

const SLOPE = 0.7;
const bow = (thickness: number) => 0.25 * thickness + 0.5;
/** A round end reaches half a thickness further, so thick strands overhang no more than thin ones. */
const leftEnd = (thickness: number) => CARD.edge - OVERHANG + thickness / 2;

function curve(y: number, thickness: number): string {
  const left = leftEnd(thickness);
  const start = y - SLOPE / 2;
  const end = y + SLOPE / 2;
  return `M${left} ${start.toFixed(2)}Q${CARD.width / 2} ${(y + bow(thickness)).toFixed(2)} ${CARD.width - left} ${end.toFixed(2)}`;
}

function plyMarks(y: number, thickness: number): string {
  const left = leftEnd(thickness);
  const length = CARD.width - 2 * left;
  const pitch = 0.72 * thickness;
  return Array.from({ length: Math.floor(length / pitch) }, (_, index) => {
    const along = (index + 0.5) * pitch;
    const t = along / length;
    const middle = y + (t - 0.5) * SLOPE + 2 * t * (1 - t) * bow(thickness);
    const x = left + along + 0.2 * thickness;
    return `M${x.toFixed(2)} ${(middle - 0.34 * thickness).toFixed(2)}l${(-0.4 * thickness).toFixed(2)} ${(0.68 * thickness).toFixed(2)}`;
  }).join('');
}

/** Distance in px between the slanting lines of a bar, so that bulky yarn reads as bulky. */
export function plyPitchPx(weight: WeightCategory): number {
  return 3.5 + weight;
}
