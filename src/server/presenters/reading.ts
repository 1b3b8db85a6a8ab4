import type { Reading } from '../../lib/pattern';
import { abbreviationOf } from '../../lib/stitches/ownStitch';
import type { StitchCounts } from '../../lib/stitches/stitch';
import type { PresentedReading } from '../../schemas/pattern';

/** The part of a reading that other programs are given. */
export function presentReading({ rounds, diagnostics }: Reading): PresentedReading {
  return {
    rounds: rounds.map(({ label, made, tally, spaces, perSide }) => ({
      label,
      made: byAbbreviation(made),
      tally: byAbbreviation(tally),
      spaces,
      perSide,
    })),
    diagnostics: diagnostics.map(({ code, severity, line, column, message, fix }) => ({
      ...{ code, severity, line, column, message },
      ...(fix && { fix }),
    })),
  };
}

/** A program that sends stitches of its own knows them by their abbreviations, of which each is one stitch. */
const byAbbreviation = (counts: StitchCounts): StitchCounts =>
  Object.fromEntries(Object.entries(counts).map(([code, count]) => [abbreviationOf(code), count]));
