import type { Place, WorkedRound } from '../reading';
import { sideCounts } from './finishRound';

/**
 * A round without corners of its own, below one whose corners are stitches worked into it, has them in
 * the stitches that those go into: the first 8 sc of a square of sc are 4 corners and 4 sides of one.
 */
export function cornersBelow(rounds: WorkedRound[], sides: number): void {
  rounds.forEach((above, i) => {
    const round = rounds[i - 1];
    if (!round || above.corner?.kind !== 'stitch' || round.corner !== null || round.kind === 'row')
      return;
    const under = new Map<number, number>();
    for (const { corner, into } of above.stitches) {
      if (corner !== null && into.kind === 'place') under.set(into.index, corner);
    }
    const codes = new Set([...under.keys()].map((index) => round.places[index]?.code));
    const [code] = codes;
    if (under.size !== sides || codes.size !== 1 || code === undefined) return;
    let last = [...under.values()].at(-1) ?? 0;
    const places = round.places.map((place, index): Place => {
      const corner = under.get(index) ?? null;
      if (corner !== null) last = corner;
      return { ...place, corner, side: (last + 1) % sides };
    });
    rounds[i - 1] = {
      ...round,
      places,
      corner: { kind: 'stitch', code },
      ...sideCounts(places, sides, true),
      stitches: round.stitches.map((stitch) => {
        const place = stitch.place === null ? null : places[stitch.place];
        return place ? { ...stitch, side: place.side, corner: place.corner } : stitch;
      }),
    };
  });
}
