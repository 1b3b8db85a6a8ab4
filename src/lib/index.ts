/** The library's table of contents. Pure: no clock, randomness, network or React. */

// Units
export * from './units/quantities';
export * from './units/conversion';
export * from './units/display';
// Stitches and motifs
export type { Moves, Stitch, StitchCode, StitchCounts } from './stitches/stitch';
export { BASIC_STITCHES, stitch } from './stitches/stitchTable';
export { loopsOf } from './stitches/loops';
export { swatchCounts } from './stitches/swatchCounts';
export type { LoopHeight, Motif, MotifRound, MotifSides, Ring } from './motifs/motif';
export { MOTIF_SIDES } from './motifs/motif';
export { READY_MOTIFS, readyMotif } from './motifs/readyMotifs';
export { READY_PATTERNS } from './motifs/ready/readyPatterns';
export { motifGeometry } from './motifs/geometry';
export { motifKind, type MotifKind } from './motifs/motifKind';
export { motifYarnM } from './motifs/motifYarn';
export { motifChanges, type MotifChanges } from './motifs/motifChanges';
export { measuredMotif } from './motifs/measuredMotif';
export { madeYarn } from './motifs/madeYarn';
// Patterns
export * from './pattern';
// Charts
export { layoutChart, type Chart } from './chart/layoutChart';
export type { ChartSymbol } from './chart/symbol';
export { overlapsOf } from './chart/overlap';
export { chartSvg } from './chart/chartSvg';
export { stitchRuns } from './chart/stitchRuns';
// Yarn, gauge and the maker's hand
export { YARN_CATEGORIES, expectedStitchWidthMm, stitchWidthRangeMm } from './yarnCategories';
export { gaugeOf } from './gauge/gauge';
// Layouts and joins
export { layoutFor, type Layout } from './layout/layouts';
export type { FitResult } from './joins/fit';
export { fitInWords, fitOf } from './joins/fit';
export type { Join } from './joins/join';
export { READY_JOINS, readyJoin } from './joins/readyJoins';
export { joiningOrder } from './joining/joiningOrder';
export { compareJoins, compareTensions, type JoinComparison } from './joins/compareJoins';
export { whyCheapest, type Why } from './joins/whyCheapest';
export { whyInWords } from './joins/whyInWords';
// Border
export type { Edging, FourSides } from './border/edging';
export { readEdging } from './border/readEdging';
export { READY_EDGINGS, readyEdging } from './border/readyEdgings';
export { borderChecks, type BorderCheck, type BorderFix } from './border/borderFit';
// Sizes
export { BLANKET_SIZES, type BlanketSize } from './sizes/blanketSizes';
export { sizesOf, type SizedPlan } from './sizes/sizesOf';
// Plan, estimate and shopping
export * from './plan/plan';
export { EXAMPLE_PLAN } from './plan/examplePlan';
export { estimate } from './ledger/estimate';
export type * from './ledger/ledger';
export { CAUSES, PARTS } from './ledger/ledger';
export {
  shoppingList,
  type ShoppingLine,
  type ShoppingList,
  type StashLot,
} from './shopping/shoppingList';
// Failure
export { DomainError } from './errors';
