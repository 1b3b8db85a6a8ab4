/** The part of a plan, also of one just read from its store, that has colours in it. */
interface PlanColours {
  readonly colours: readonly { readonly key: string; readonly hex: string }[];
  readonly colourways: readonly { readonly roundColours: readonly string[] }[];
  readonly join: { readonly colour: string };
  readonly border: readonly { readonly colour: string }[];
  readonly motifs: readonly { readonly sides: number }[];
}

/** As much of a plan as a small drawing of the blanket shows. */
export interface BlanketFace {
  /** Colours of the rounds of each colourway, from the middle out, sRGB. */
  readonly colourways: readonly (readonly string[])[];
  readonly join: string;
  /** Outermost round of the border, or null without one. */
  readonly border: string | null;
  readonly sides: number;
}

/** The colours of a plan where they stand: `blanketFace(plan).join` is the colour of its joins. */
export function blanketFace({
  colours,
  colourways,
  join,
  border,
  motifs,
}: PlanColours): BlanketFace {
  const hexOf = (key: string): string =>
    colours.find((colour) => colour.key === key)?.hex ?? '#888888';
  const outermost = border.at(-1);
  return {
    colourways: colourways.map(({ roundColours }) => roundColours.map(hexOf)),
    join: hexOf(join.colour),
    border: outermost ? hexOf(outermost.colour) : null,
    sides: motifs[0]?.sides ?? 4,
  };
}
