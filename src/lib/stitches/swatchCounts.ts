import { knownStitch } from './stitchTable';
import type { StitchCode, StitchCounts } from './stitch';

/**
 * Every stitch of a flat swatch: foundation chain, stitches and turning chains.
 * Variant: no turning chain counts as a stitch; foundation N + t chains, each later row turned
 * with t (published: E. Eckman, 8 May 2020, foundation chains; t from the table of stitches).
 *
 * Example: `swatchCounts('sc', 20, 18)` is `{ ch: 38, sc: 360 }`: 20 + 1 chains, then 17 turns of 1.
 */
export function swatchCounts(code: StitchCode, stitches: number, rows: number): StitchCounts {
  const { turningChains } = knownStitch(code);
  const chains = stitches + turningChains + (rows - 1) * turningChains;
  return code === 'ch' ? { ch: stitches * rows } : { ch: chains, [code]: stitches * rows };
}
