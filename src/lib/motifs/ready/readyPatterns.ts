import { CIRCLES } from './circles';
import { HEXAGONS } from './hexagons';
import { OTHER_SHAPES } from './otherShapes';
import type { ReadyPattern } from './readyPattern';
import { SQUARES } from './squares';

/** Every ready-made motif as its pattern. */
export const READY_PATTERNS: readonly ReadyPattern[] = [
  ...SQUARES,
  ...CIRCLES,
  ...HEXAGONS,
  ...OTHER_SHAPES,
];
