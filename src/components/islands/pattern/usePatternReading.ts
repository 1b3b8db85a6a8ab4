import { useDeferredValue, useMemo, useState } from 'react';
import { gaugeOf } from '../../../lib/gauge/gauge';
import { motifGeometry } from '../../../lib/motifs/geometry';
import { motifOf } from '../../../lib/pattern/motifOf';
import { readPattern } from '../../../lib/pattern/readPattern';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import type { Units } from '../../../lib/units/display';
import { gaugeChoices } from '../motifs/gaugeChoices';
import type { PatternDraft } from './usePatternDraft';

interface ReadingOptions {
  pattern: PatternDraft;
  ownStitches: readonly OwnStitch[] | undefined;
  swatches: GaugeSwatch[];
  units: Units;
  /** Rounds to begin with; null for all. */
  firstRounds: number | null;
}

/** A pattern as it is read, drawn and measured while it is typed. */
export function usePatternReading(options: ReadingOptions) {
  const { pattern, ownStitches, swatches, units, firstRounds } = options;
  const { text, terms, sides, size, name } = pattern;
  const [rounds, setRounds] = useState(firstRounds);
  const [gaugeKey, setGaugeKey] = useState(swatches[0]?.id ?? 'weight-4');

  // A key is on the screen before a long pattern is read again, and read before it is drawn again.
  const readText = useDeferredValue(text);
  const reading = useMemo(
    () => readPattern(readText, { terms, sides, size, ...(ownStitches && { ownStitches }) }),
    [readText, terms, sides, size, ownStitches],
  );
  const drawn = useDeferredValue(reading);
  const count = drawn.rounds.length;
  const shown = useMemo(
    () =>
      rounds === null || rounds >= count
        ? drawn
        : { ...drawn, rounds: drawn.rounds.slice(0, rounds) },
    [drawn, rounds, count],
  );

  const choices = useMemo(() => gaugeChoices(swatches, units), [swatches, units]);
  const choice = choices.find(({ key }) => key === gaugeKey) ?? choices[0];
  const gauge = useMemo(
    () => gaugeOf(choice?.swatch ?? null, choice?.category ?? 4),
    [choice?.swatch, choice?.category],
  );
  const motif = useMemo(() => motifOf(shown, '', name), [shown, name]);
  const geometry = useMemo(() => motifGeometry(motif, gauge, null), [motif, gauge]);

  return {
    readText,
    /** Of the text as it stands, all rounds. */
    reading,
    /** As far as it is worked; it may lag a moment behind the text. */
    shown,
    motif,
    geometry,
    gauge,
    gaugeChoice: choice,
    gaugeChoices: choices,
    setGaugeKey,
    rounds: shown.rounds.length,
    mostRounds: count,
    /** Of all rounds there are, whatever is typed, null. */
    setRounds: (wanted: number) => setRounds(wanted >= count ? null : wanted),
  };
}
