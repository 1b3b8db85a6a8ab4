import type { BorderRound } from '../plan/plan';
import { addCounts, scaleCounts } from '../stitches/counts';
import type { StitchCode, StitchCounts } from '../stitches/stitch';
import { knownStitch } from '../stitches/stitchTable';
import { mapSides, sumSides, type Edging, type FourSides } from './edging';

/** A round of border as it is worked on one blanket. */
export interface BorderWork {
  /** Everything the hook makes in it. */
  readonly made: StitchCounts;
  /** What it is worked over. */
  readonly over: FourSides;
  /** What the next round finds. */
  readonly leaves: FourSides;
}

/** Stitches in each corner of a round that lies flat: 3 up to hdc, 5 dc, 7 taller (common practice, no source). */
function inCorner(code: StitchCode): number {
  const { heightOverWidth } = knownStitch(code);
  return heightOverWidth < 1.6 ? 3 : heightOverWidth < 2.4 ? 5 : 7;
}

/**
 * The rounds of a border on a blanket's edge. A plain round takes every stitch of the round below
 * and grows at the four corners: by 8 in sc; it starts with its turning chain and closes with a slip
 * stitch. An edging repeats its text all round and does not grow; where it does not come out even,
 * it is stretched over the rest in proportion: a figure to plan with.
 *
 * Example: 10 × 8 squares of 15, two rounds of sc: 36 × 15 + 32 × 2 + 12 = 616, then 624.
 */
export function borderRounds(rounds: readonly BorderRound[], edge: FourSides): BorderWork[] {
  let over = edge;
  return rounds.map((round) => {
    const work = round.edging ? edgingWork(round.edging, over) : plainWork(round, over);
    over = work.leaves;
    return work;
  });
}

function plainWork({ stitch, adjust }: BorderRound, over: FourSides): BorderWork {
  const leaves = mapSides(over, (side, i) =>
    Math.max(0, side + inCorner(stitch) - 1 + (adjust?.[i] ?? 0)),
  );
  const made = { [stitch]: sumSides(leaves), ch: knownStitch(stitch).turningChains, 'sl st': 1 };
  return { made, over, leaves };
}

function edgingWork({ over: takes, made, top }: Edging, over: FourSides): BorderWork {
  const repeats = Math.max(0, (sumSides(over) - takes.least) / takes.multipleOf);
  const perStitch = top.perRepeat / takes.multipleOf;
  // What the beginning of the round makes besides lies on its first side.
  const besides = top.least - takes.least * perStitch;
  return {
    made: addCounts(made.least, scaleCounts(made.perRepeat, repeats)),
    over,
    leaves: mapSides(over, (side, i) => Math.max(0, side * perStitch + (i === 0 ? besides : 0))),
  };
}
