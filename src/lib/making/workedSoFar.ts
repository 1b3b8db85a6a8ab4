import type { SlotCounts } from '../colour/colourwayPlaces';
import { addUse, NO_YARN, type YarnUse } from '../hand/yarnUse';
import { SLOTS } from '../layout/face';
import { blanketOf } from '../ledger/blanketOf';
import { useOfGroup } from '../ledger/colourLedger';
import { joinPieces, motifPieces, wholeMotifs, type PieceGroup } from '../ledger/pieces';
import type { Plan } from '../plan/plan';
import { addCounts, scaleCounts } from '../stitches/counts';
import type { StitchCounts } from '../stitches/stitch';

/** What has been worked in one colour: yarn, stitches, and tails left hanging. */
export interface WorkedInColour {
  readonly use: YarnUse;
  readonly made: StitchCounts;
  readonly tails: number;
}

const NOTHING: WorkedInColour = { use: NO_YARN, made: {}, tails: 0 };

/**
 * What has been worked in each colour once these motifs are made. A join worked as the motifs are
 * (added rounds, or their last round) counts with them; seams and border come after.
 */
export function workedSoFar(
  plan: Plan,
  places: readonly SlotCounts[],
): Map<string, WorkedInColour> {
  const blanket = blanketOf(plan);
  const all = blanket.places.reduce((sum, each) => sum + wholeMotifs(each), 0);
  const share = places.reduce((sum, each) => sum + wholeMotifs(each), 0) / Math.max(1, all);
  const groups: PieceGroup[] = plan.colourways.flatMap((colourway, i) =>
    SLOTS.flatMap((slot) => motifPieces(blanket, colourway, places[i]?.[slot] ?? 0, slot)),
  );
  if (blanket.join.attached !== 'line') {
    groups.push(
      ...joinPieces({
        ...blanket,
        places,
        counts: { ...blanket.counts, joinedSides: blanket.counts.joinedSides * share },
        cornerLinks: blanket.cornerLinks * share,
      }),
    );
  }
  const worked = new Map<string, WorkedInColour>();
  for (const group of groups) {
    const before = worked.get(group.colour) ?? NOTHING;
    worked.set(group.colour, {
      use: addUse(before.use, useOfGroup(group), group.count),
      made: group.lines.reduce(
        (sum, line) => addCounts(sum, scaleCounts(line.made, group.count)),
        before.made,
      ),
      tails: before.tails + group.count * group.lines.reduce((sum, line) => sum + line.tails, 0),
    });
  }
  return worked;
}
