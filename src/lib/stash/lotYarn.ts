/** Whole and part skeins of one dye lot. */
export interface LotAmounts {
  readonly wholeSkeins: number;
  readonly partSkeins: readonly { readonly massG: number }[];
}

/** Mass and length of a whole skein, as on its band. */
export interface SkeinSize {
  readonly massG: number;
  readonly lengthM: number;
}

/** Length in metres of a part skein by its weight: `partLengthM(62, { massG: 100, lengthM: 200 })` is 124. */
export const partLengthM = (massG: number, skein: SkeinSize): number =>
  (massG * skein.lengthM) / skein.massG;

/**
 * What a dye lot holds: 3 whole skeins of 100 g and 200 m, and a part of 62 g, are 362 g and 724 m.
 */
export function lotYarn({ wholeSkeins, partSkeins }: LotAmounts, skein: SkeinSize) {
  const partsG = partSkeins.reduce((sum, { massG }) => sum + massG, 0);
  return {
    massG: wholeSkeins * skein.massG + partsG,
    lengthM: wholeSkeins * skein.lengthM + partLengthM(partsG, skein),
  };
}
