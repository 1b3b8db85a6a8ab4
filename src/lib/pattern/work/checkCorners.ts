import type { WorkedRound } from '../reading';
import type { Report } from '../report';
import type { RoundText } from '../syntax';
import type { CornerSearch } from './corners';

/** Tells where the corners of a motif are not as many as its sides, and where its sides differ. */
export function checkCorners(
  rounds: readonly WorkedRound[],
  texts: readonly RoundText[],
  seeming: readonly CornerSearch['seeming'][],
  sides: number,
  report: Report,
): void {
  if (sides === 0 || rounds.length === 0) return;
  const lastRight = rounds.findLastIndex(({ corner }) => corner !== null);
  const wrong = seeming.findIndex(
    (each, i) => i > lastRight && each !== null && i >= firstShaped(seeming, rounds),
  );
  const found = seeming[wrong];
  const round = rounds[wrong];
  const text = texts[wrong];
  if (found && round && text) {
    const message = `${round.label} has ${found.count} corners (${found.what}); a motif of ${sides} sides has ${sides}.`;
    report.say('warning', 'corner-count', text.header, message);
  } else if (lastRight < 0) {
    const last = texts.at(-1);
    const message = `No corners are found: the motif is meant to have ${sides} sides.`;
    if (last?.kind === 'round') report.say('note', 'corner-count', last.header, message);
  }
  rounds.forEach((each, i) => tellUnequalSides(each, texts[i], report));
}

/** A round of groups in a circle is not yet a shape: only a shape that the next rounds keep is. */
function firstShaped(
  seeming: readonly CornerSearch['seeming'][],
  rounds: readonly WorkedRound[],
): number {
  let first = rounds.length - 1;
  while (
    first > 0 &&
    rounds[first - 1]?.corner === null &&
    seeming[first - 1]?.count === seeming[first]?.count
  ) {
    first -= 1;
  }
  const lastRight = rounds.findLastIndex(({ corner }) => corner !== null);
  return lastRight >= 0 ? lastRight + 1 : first;
}

function tellUnequalSides(round: WorkedRound, text: RoundText | undefined, report: Report): void {
  if (!text || new Set(round.sideCounts).size <= 1) return;
  const message = `The sides of ${round.label} differ: ${round.sideCounts.join(', ')} stitches.`;
  report.say('note', 'side-count', text.header, message);
}
