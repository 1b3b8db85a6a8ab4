import { readPattern } from '../../../lib/pattern/readPattern';
import { ownStitchCode, type OwnStitch } from '../../../lib/stitches/ownStitch';
import type { MotifInput } from '../../../schemas/motif';
import type { PatternDraft } from './usePatternDraft';

/** Those of one's own stitches that a text uses: the ones a kept motif has to carry along. */
export function usedStitches(pattern: PatternDraft, stitches: readonly OwnStitch[]): OwnStitch[] {
  if (stitches.length === 0) return [];
  const { rounds } = readPattern(pattern.text, { ...pattern, ownStitches: stitches });
  const made = new Set(rounds.flatMap((round) => Object.keys(round.made)));
  return stitches.filter((each) => made.has(ownStitchCode(each)));
}

/** A draft as it is kept: a motif needs a name. */
export function checkedMotif(draft: PatternDraft, stitches: readonly OwnStitch[]): MotifInput {
  const name = draft.name.trim() || 'Motif without a name';
  return { ...draft, name, stitches: usedStitches(draft, stitches) };
}
