import type { Place, WorkedRound } from '../pattern/reading';
import type { RoundElement, RoundElements } from './elements';

/** A round with the place along it of everything that it is made of. */
export interface ArrangedRound extends RoundElements {
  readonly round: WorkedRound;
  /** 1 as the first round is worked, -1 back. */
  readonly direction: 1 | -1;
  /** Of each element: in turns round a motif, in mm along rows. */
  readonly alongs: readonly number[];
  /** Of each place that the next round can be worked into. */
  readonly placeAlongs: readonly number[];
  /** The round is not worked all the way round yet: its end does not meet its beginning. */
  readonly isOpen: boolean;
  /** Places below that each element stands in. */
  readonly feet: readonly (readonly number[])[];
}

/** The direction of a round that may turn back. */
export const directionOf = ({ turned }: WorkedRound, last: 1 | -1): 1 | -1 =>
  turned ? (last === 1 ? -1 : 1) : last;

/** The place of every place that the next round can be worked into. */
export function placeAlongsOf(
  places: readonly Place[],
  elements: readonly RoundElement[],
  alongs: readonly number[],
): number[] {
  const placeAlongs = places.map(() => 0);
  elements.forEach(({ place }, i) => {
    if (place !== null) placeAlongs[place] = alongs[i] ?? 0;
  });
  return placeAlongs;
}
