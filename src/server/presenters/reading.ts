import type { Reading } from '../../lib/pattern';
import type { PresentedReading } from '../../schemas/pattern';

/** The part of a reading that other programs are given. */
export function presentReading({ rounds, diagnostics }: Reading): PresentedReading {
  return {
    rounds: rounds.map(({ label, made, tally, spaces, perSide }) => ({
      ...{ label, made, tally, spaces, perSide },
    })),
    diagnostics: diagnostics.map(({ code, severity, line, column, message, fix }) => ({
      ...{ code, severity, line, column, message },
      ...(fix && { fix }),
    })),
  };
}
