import type { OwnStitch } from '../stitches/ownStitch';
import { stitch } from '../stitches/stitchTable';
import { glyphOf } from './glyph';
import type { ChartSymbol } from './symbol';

/** Tallest a symbol stands in a key, in stitch widths: ours. */
const MOST_TALL = 2.4;

/** One symbol on its own, for a key: upright on 0,0, in stitch widths. */
export function sampleSymbol(code: string, own?: OwnStitch): ChartSymbol {
  const glyph = glyphOf(code, own);
  const tall = Math.min(MOST_TALL, Math.max(0.9, stitch(code)?.heightOverWidth ?? 1.4));
  const common = { round: 0, stitch: 0, glyph, unitMm: 1 };
  if (glyph.body === 'chain') return { ...common, feet: [[-0.42, -0.45]], head: [0.42, -0.45] };
  if (glyph.body === 'dot') return { ...common, feet: [[0, -0.45]], head: [0, -0.45] };
  if (!/tog$/.test(code)) return { ...common, feet: [[0, 0]], head: [0, -tall] };
  const half = Math.min(1, (glyph.legs - 1) / 2) * 0.8;
  const feet = Array.from({ length: glyph.legs }, (_, i): [number, number] => [
    half * ((2 * i) / (glyph.legs - 1) - 1),
    0,
  ]);
  return { ...common, feet, head: [0, -tall] };
}
