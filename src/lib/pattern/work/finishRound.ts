import type { StitchCounts } from '../../stitches/stitch';
import type { Place, WorkedRound, WorkedStitch } from '../reading';
import type { CountNote, RoundText } from '../syntax';
import { cornersOf, placesOf, type CornerSearch } from './corners';
import type { Hand } from './hand';
import { heightOf } from './height';
import { liesOf } from './lie';
import type { DraftStitch } from './state';

export interface FinishedRound {
  readonly round: WorkedRound;
  readonly seeming: CornerSearch['seeming'];
}

/** Counts a round that has been worked, and finds its corners, sides and height. */
export function finishRound(
  hand: Hand,
  text: RoundText,
  number: number,
  sides: number,
  note: CountNote | null,
): FinishedRound {
  const lies = liesOf(hand.places, hand.below);
  const { corners, seeming } =
    text.kind === 'row'
      ? { corners: null, seeming: null }
      : cornersOf(hand.places, lies, hand.below, sides);
  const places = placesOf(hand.places, lies, corners, sides);
  const squaringOff = hand.below.kind === 'places' && hand.below.corner === null;
  const round: WorkedRound = {
    kind: text.kind,
    label: `${text.kind === 'row' ? 'Row' : 'Rnd'} ${number}`,
    number,
    made: countBy(hand.stitches, ({ code }) => code),
    travel: countBy(
      hand.stitches.filter(({ role }) => role === 'travel'),
      ({ code }) => code,
    ),
    tally: countBy(
      places.filter(({ kind }) => kind === 'stitch'),
      ({ code }) => code,
    ),
    spaces: countBy(
      places.filter(({ kind }) => kind === 'space'),
      ({ code }) => code,
    ),
    ...sideCounts(places, text.kind === 'row' ? 0 : sides, corners !== null),
    corner: corners?.corner ?? null,
    height: heightOf(places, lies, corners !== null, squaringOff),
    stitches: stitchesOf(hand, places),
    places,
    colours: [...new Set(hand.stitches.flatMap(({ colour }) => (colour === null ? [] : [colour])))],
    turned: hand.isBack,
    joined: hand.joined,
    note,
    span: { begin: text.begin, end: text.end },
  };
  return { round, seeming };
}

function countBy<Item>(items: readonly Item[], key: (item: Item) => string): StitchCounts {
  const counts: Record<string, number> = {};
  for (const item of items) counts[key(item)] = (counts[key(item)] ?? 0) + 1;
  return counts;
}

/** Widths of all places between the corners, shared out where there are no corners. */
export function sideCounts(
  places: readonly Place[],
  sides: number,
  hasCorners: boolean,
): Pick<WorkedRound, 'perSide' | 'sideCounts'> {
  const onSides = places.filter(({ corner }) => corner === null);
  const total = onSides.reduce((sum, { width }) => sum + width, 0);
  if (sides === 0) return { perSide: total, sideCounts: [total] };
  const perSide = Math.round(total / sides);
  if (!hasCorners) return { perSide, sideCounts: [] };
  const counts = Array.from({ length: sides }, () => 0);
  for (const { side, width } of onSides) counts[side] = (counts[side] ?? 0) + width;
  return { perSide, sideCounts: counts };
}

function stitchesOf(hand: Hand, places: readonly Place[]): WorkedStitch[] {
  let lastSide = places[0]?.side ?? 0;
  return hand.stitches.map((draft: DraftStitch): WorkedStitch => {
    const place = draft.place === null ? null : places[draft.place];
    if (place) lastSide = place.side;
    const { code, role, into, colour, span } = draft;
    const at = { side: lastSide, corner: place?.corner ?? null, place: draft.place };
    return { code, role, into, ...at, colour, span: { begin: span.begin, end: span.end } };
  });
}
