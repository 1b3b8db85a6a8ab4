import type { Gauge } from '../gauge/gauge';
import type { Place, Reading } from '../pattern/reading';
import { directionOf, placeAlongsOf, type ArrangedRound } from './arranged';
import { elementsOf } from './elements';
import { feetOf } from './feet';
import { spread, type Standing } from './spread';

/** Pull of the feet in rows, whose ends nothing holds: ours. */
const ROW_PULL = 0.4;

/** Places everything along rows, in mm: each stitch over its foot, ends free. */
export function arrangeRows({ rounds, ring }: Reading, gauge: Gauge): ArrangedRound[] {
  let places: readonly Place[] = ring.places;
  let belowMm = ring.places.map((_, i) => (i + 0.5) * gauge.stitchWidthMm);
  let direction: 1 | -1 = 1;
  return rounds.map((round) => {
    direction = directionOf(round, direction);
    const made = elementsOf(round, gauge, 0);
    const feet = feetOf(round, made.elements, places);
    const standing = made.elements.map(({ widthMm }, i): Standing => {
      const own = feet[i] ?? [];
      const mean = own.reduce((sum, place) => sum + (belowMm[place] ?? 0), 0) / own.length;
      return { width: widthMm, foot: own.length > 0 ? direction * mean : null };
    });
    const [first] = standing;
    // Something must hold a row that hangs on nothing.
    if (first && standing.every(({ foot }) => foot === null))
      standing[0] = { ...first, foot: direction * first.width * 0.5 };
    const alongs = spread(standing, null, null, ROW_PULL).map((along) => direction * along);
    const placeAlongs = placeAlongsOf(round.places, made.elements, alongs);
    places = round.places;
    belowMm = placeAlongs;
    return { ...made, round, direction, isOpen: true, alongs, placeAlongs, feet };
  });
}
