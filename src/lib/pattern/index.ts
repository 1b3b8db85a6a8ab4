/** The pattern reader's table of contents. */
export { readPattern } from './readPattern';
export { printPattern, type PrintedPattern, type PrintOptions } from './print/printPattern';
export { convertTerms } from './print/convertTerms';
export type { KeyLine } from './print/vocabulary';
export { motifOf } from './motifOf';
export { isTakenWord } from './terms/takenWord';
export { tokenize } from './tokenize';
export { PATTERN_LIMITS } from './limits';
export type * from './diagnostic';
export type * from './reading';
export type * from './span';
export type * from './syntax';
export type * from './token';
export { ownStitchCode, type OwnStitch } from '../stitches/ownStitch';
