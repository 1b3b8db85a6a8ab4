import type { Reading } from '../../lib/pattern/reading';

/** The ink of each round: its own, or that of its yarn where the pattern names its yarns. */
export function roundInks({ rounds }: Reading): number[] {
  const yarns = [...new Set(rounds.flatMap(({ colours }) => colours))];
  return rounds.map(({ colours }, i) =>
    yarns.length > 1 && colours[0] !== undefined ? yarns.indexOf(colours[0]) : i,
  );
}
