/** The limits of a plan, shared by forms, API and database. */
export const PLAN_LIMITS = {
  colours: 24,
  motifs: 24,
  roundsPerMotif: 60,
  colourways: 400,
  evidence: 24,
  gridRows: 400,
  gridColumns: 400,
  borderRounds: 30,
  edgingLength: 2_000,
  borderAdjustment: 500,
  paintedRuns: 8_000,
  tileSide: 24,
  seed: 2_147_483_647,
  stitchesPerRound: 5_000,
  stitchKinds: 40,
  spaceKinds: 20,
  chainsPerLoop: 60,
  gapStitches: 200,
  keyLength: 80,
  nameLength: 80,
  skeinMassG: 10_000,
  skeinLengthM: 100_000,
  priceMinor: 1_000_000_000,
  swatchStitches: 1_000,
  swatchRows: 1_000,
  swatchSizeMm: 5_000,
  motifSideMm: 5_000,
  targetSizeMm: 100_000,
  pieceMassG: 100_000,
  pieceLengthM: 1_000_000,
  piecesWeighed: 10_000,
  pieceStitches: 10_000_000,
  pieceTails: 100_000,
  secondsPerMove: 60,
} as const;

/** The limits of joins compared at once. */
export const COMPARE_LIMITS = {
  joins: 40,
  swatches: 12,
  /** Joins × swatches × colourways: what the time of a comparison grows with. */
  tried: 6_000,
} as const;

/** What no yarn and no stitch ever was: beyond these a number has been mistyped (ours). */
export const POSSIBLE = {
  leastSkeinMassG: 0.1,
  leastPieceMassG: 0.01,
  leastScaleStepG: 0.001,
  leastPieceLengthM: 0.01,
  leastMotifSideMm: 1,
  /** A cobweb lace reaches some 20 m/g, the thickest rope of roving some 0.05. */
  metresPerGram: { least: 0.01, most: 500 },
  /** Of thread on a steel hook some 1 mm, of roving on the arms some 100. */
  stitchSizeMm: { least: 0.2, most: 250 },
} as const;

/** The limits of what a person keeps. */
export const KEPT_LIMITS = {
  yarns: 1_000,
  colourwaysPerYarn: 400,
  lots: 5_000,
  partSkeinsPerLot: 100,
  wholeSkeins: 100_000,
  swatches: 1_000,
  measurementsPerSwatch: 100,
  motifs: 500,
  versionsPerMotif: 200,
  stitches: 500,
  stitchesPerMotif: 40,
  madeMotifs: 2_000,
  blankets: 1_000,
  revisionsPerBlanket: 200,
  ticksAtOnce: 2_000,
  ticksPerBlanket: 40_000,
  weighingsPerBlanket: 200,
  shoppingLists: 1_000,
  lotCodeLength: 40,
  locationLength: 80,
  fibreLength: 200,
  notesLength: 4_000,
  titleLength: 120,
  hookMm: 50,
} as const;

/** How many rows a list answers at once. */
export const LIST_LIMITS = { usual: 100, most: 500, offset: 100_000 } as const;
