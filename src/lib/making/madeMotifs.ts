import { SLOT_FACTS, SLOTS, type Face, type Slot } from '../layout/face';
import type { SlotCounts } from '../colour/colourwayPlaces';
import type { BlanketMotif } from '../plan/blanketFaces';

/** A motif's own name in what is kept of the making: "m2:3" for the main one in row 2, place 3, from 0; "s…" of the second. */
export const motifKeyOf = ({ slot, row, column }: Face): string =>
  `${SLOT_FACTS[slot].second ? 's' : 'm'}${row}:${column}`;

/** How many whole, half and quarter motifs of each colourway are made. */
export function madePlaces(
  motifs: readonly BlanketMotif[],
  made: ReadonlySet<string>,
  colourways: number,
): SlotCounts[] {
  const places = Array.from(
    { length: colourways },
    () => Object.fromEntries(SLOTS.map((slot) => [slot, 0])) as Record<Slot, number>,
  );
  for (const { face, colourway } of motifs) {
    const ofColourway = places[colourway];
    if (ofColourway && made.has(motifKeyOf(face))) ofColourway[face.slot] += 1;
  }
  return places;
}
