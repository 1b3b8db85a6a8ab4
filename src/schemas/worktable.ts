import type { BlanketFace } from '../lib/plan/blanketFace';
import type { BlanketSummary } from './blanket';
import type { BlanketShopping } from './shoppingList';
import type { PresentedSwatch } from './swatch';

export interface BlanketOnHook {
  blanket: BlanketSummary;
  face: BlanketFace | undefined;
  /** Null for a plan that has to be opened and saved first. */
  shopping: BlanketShopping | null;
}

export interface Worktable {
  onHook: BlanketOnHook[];
  blanketCount: number;
  swatches: PresentedSwatch[];
  swatchCount: number;
  stash: { lotCount: number; totalM: number };
}
