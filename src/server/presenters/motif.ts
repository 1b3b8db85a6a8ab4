import type { MotifRow, MotifVersion } from '../../../db/models';
import { READY_MOTIFS } from '../../lib/motifs/readyMotifs';
import { READY_PATTERNS } from '../../lib/motifs/ready/readyPatterns';
import type { ReadyPattern } from '../../lib/motifs/ready/readyPattern';
import type { MotifSummary, PresentedMotif, PresentedMotifVersion } from '../../schemas/motif';
import { motifSchema } from '../../schemas/workedMotif';

/** A motif of one's own; its key in a plan is its id. */
export const presentOwnMotifSummary = (row: MotifRow): MotifSummary =>
  summaryOf(row.id, row.updatedAt, row);

export const presentOwnMotif = (row: MotifRow): PresentedMotif => ({
  ...presentOwnMotifSummary(row),
  pattern: patternOf(row),
});

/** A motif as it was at one of its saves. */
export const presentMotifAsSaved = (row: MotifVersion): PresentedMotif => ({
  ...summaryOf(row.motifId, row.savedAt, row),
  pattern: patternOf(row),
});

export function presentMotifVersion(row: MotifVersion, current: number): PresentedMotifVersion {
  const { version, name, rounds, errors, warnings } = row;
  return {
    version,
    name,
    savedAt: row.savedAt.toISOString(),
    isCurrent: version === current,
    rounds: rounds.length,
    problems: { errors, warnings },
  };
}

function summaryOf(key: string, savedAt: Date, row: MotifRow | MotifVersion): MotifSummary {
  const { version, name, sides, ring, rounds, errors, warnings } = row;
  const motif =
    rounds.length === 0 ? null : motifSchema.parse({ key, version, name, sides, ring, rounds });
  const updatedAt = savedAt.toISOString();
  const problems = { errors, warnings };
  return { key, readyMade: false, version, updatedAt, name, sides, motif, problems };
}

const patternOf = ({ name, text, terms, sides, size, stitches }: MotifRow | MotifVersion) => ({
  ...{ name, text, terms, sides, size, stitches },
});

/** The ready-made motifs never change while the program runs: each is presented once. */
const READY: ReadonlyMap<string, () => PresentedMotif> = new Map(
  READY_PATTERNS.map((pattern) => {
    let presented: PresentedMotif | undefined;
    return [pattern.key, () => (presented ??= presentPattern(pattern))];
  }),
);

function presentPattern({ key, name, sides, text }: ReadyPattern): PresentedMotif {
  const motif = READY_MOTIFS.find((each) => each.key === key);
  return {
    key,
    readyMade: true,
    version: null,
    updatedAt: null,
    name,
    sides,
    motif: motifSchema.parse(motif),
    problems: { errors: 0, warnings: 0 },
    pattern: { name, text, terms: 'us', sides, size: 0, stitches: [] },
  };
}

/** A ready-made motif by its key; null when there is none. */
export const presentReadyMotif = (key: string): PresentedMotif | null => READY.get(key)?.() ?? null;
