import type { PlaceFilter } from '../syntax';
import { familyOf } from './family';
import type { Hand } from './hand';

export const isGap = ({ of }: PlaceFilter): boolean => of === 'gap' || of === 'gap-of-groups';

/**
 * Whether there is such a gap at a position: between two stitches; between two groups, each of which
 * shares a place below, or a chain space between them. A corner is no gap.
 */
export function matchesGap(hand: Hand, filter: PlaceFilter, position: number): boolean {
  const before = hand.placeAt(position);
  const after = hand.placeAt(position + 1);
  if (!before || !after) return false;
  const groups = filter.of === 'gap-of-groups' || calledClusters(hand, filter);
  if (Number.isInteger(position))
    return groups && before.kind === 'space' && before.corner === null;
  if (before.kind !== 'stitch' || after.kind !== 'stitch') return false;
  if (groups) return endsGroup(hand, Math.floor(position));
  const family = filter.code === null ? null : familyOf(filter.code);
  return family === null || familyOf(before.code) === family || familyOf(after.code) === family;
}

/** "3-dc clusters", in a round that has none, are groups of 3 dc. */
function calledClusters({ below }: Hand, { code }: PlaceFilter): boolean {
  if (code === null || familyOf(code) !== 'cluster') return false;
  return !below.places.some((place) => familyOf(place.code) === 'cluster');
}

/** Whether two or more stitches in one place end here, and two or more in another begin. */
function endsGroup(hand: Hand, position: number): boolean {
  const into = (offset: number): number => hand.below.into[hand.indexAt(position + offset)] ?? -1;
  return into(0) >= 0 && into(-1) === into(0) && into(0) !== into(1) && into(1) === into(2);
}
