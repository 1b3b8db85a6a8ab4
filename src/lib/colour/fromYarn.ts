/** What a colourway takes of each colour, and what is there. */
export interface YarnInHand {
  /** Metres of each colour that one motif of each colourway takes. */
  readonly perMotifM: readonly Readonly<Record<string, number>>[];
  /** Metres of each colour that joins, border and the like take. */
  readonly besidesM: Readonly<Record<string, number>>;
  /** Metres in hand; a colour that is not named is not limited. */
  readonly inHandM: Readonly<Record<string, number>>;
  /** Motifs wanted in all. */
  readonly motifs: number;
}

export interface MotifsFromYarn {
  /** Motifs of each colourway. */
  readonly counts: readonly number[];
  /** Motifs that the yarn in hand does not make. */
  readonly missing: number;
  /** Colours that no further motif can be made without. */
  readonly short: readonly string[];
}

/**
 * As many motifs of each colourway as the yarn in hand makes, as evenly as it allows: one of each by
 * turns, a colourway dropping out once a colour of it would not last. Never takes more than there is.
 */
export function motifsFromYarn({
  perMotifM,
  besidesM,
  inHandM,
  motifs,
}: YarnInHand): MotifsFromYarn {
  const leftM = new Map(
    Object.entries(inHandM).map(([colour, lengthM]) => [colour, lengthM - (besidesM[colour] ?? 0)]),
  );
  const counts = perMotifM.map(() => 0);
  const short = new Set<string>([...leftM].flatMap(([colour, m]) => (m < 0 ? [colour] : [])));
  let made = 0;
  let open = perMotifM.map((_, i) => i);
  while (made < motifs && open.length > 0) {
    open = open.filter((i) => {
      if (made === motifs) return true;
      const uses = Object.entries(perMotifM[i] ?? {});
      const lacking = uses.filter(([colour, m]) => m > 0 && (leftM.get(colour) ?? Infinity) < m);
      lacking.forEach(([colour]) => short.add(colour));
      if (lacking.length > 0) return false;
      for (const [colour, m] of uses) {
        const left = leftM.get(colour);
        if (left !== undefined) leftM.set(colour, left - m);
      }
      counts[i] = (counts[i] ?? 0) + 1;
      made += 1;
      return true;
    });
  }
  return { counts, missing: motifs - made, short: [...short] };
}
