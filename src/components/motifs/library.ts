import type { Gauge } from '../../lib/gauge/gauge';
import { motifGeometry } from '../../lib/motifs/geometry';
import type { Motif } from '../../lib/motifs/motif';
import { motifKind, type MotifKind } from '../../lib/motifs/motifKind';
import { motifYarnM } from '../../lib/motifs/motifYarn';
import type { MotifSummary } from '../../schemas/motif';
import type { LibraryQuery } from '../../schemas/motifLibrary';
import { joinFits, workedTo, type JoinFit } from './motifWords';

/** Rounds that a motif is shown with, or all of a smaller one. */
const SHOWN_ROUNDS = 4;

/** A motif as the library shows it: worked to a few rounds, measured, and held against every join. */
export interface LibraryItem {
  summary: MotifSummary;
  /** Null where its text gives no round. */
  shown: ShownInLibrary | null;
}

export interface ShownInLibrary {
  motif: Motif;
  kind: MotifKind;
  acrossMm: number;
  yarnM: number;
  fits: readonly JoinFit[];
}

export function libraryItem(summary: MotifSummary, gauge: Gauge): LibraryItem {
  if (!summary.motif) return { summary, shown: null };
  const motif = workedTo(summary.motif, SHOWN_ROUNDS);
  return {
    summary,
    shown: {
      motif,
      kind: motifKind(summary.motif),
      acrossMm: motifGeometry(motif, gauge, null).acrossMm,
      yarnM: motifYarnM(motif, gauge),
      fits: joinFits(motif, 'us'),
    },
  };
}

/** Those that the query asks for, in its order; a motif without rounds is only found by shape and name. */
export function inLibrary(items: readonly LibraryItem[], query: LibraryQuery): LibraryItem[] {
  const name = query.name.toLowerCase();
  const found = items.filter(({ summary, shown }) => {
    if (query.sides !== null && summary.sides !== query.sides) return false;
    if (!summary.name.toLowerCase().includes(name)) return false;
    if (query.kind !== null && shown?.kind !== query.kind) return false;
    const fit = (join: string) => shown?.fits.some((each) => each.join.key === join && each.fits);
    return query.join === null || fit(query.join) === true;
  });
  const by = ORDERS[query.order];
  return by ? found.sort(by) : found;
}

const figure =
  (of: (shown: ShownInLibrary) => number) =>
  (left: LibraryItem, right: LibraryItem): number =>
    (left.shown ? of(left.shown) : 0) - (right.shown ? of(right.shown) : 0);

type Order = (left: LibraryItem, right: LibraryItem) => number;
const ORDERS: Readonly<Record<LibraryQuery['order'], Order | null>> = {
  library: null,
  name: (left, right) => left.summary.name.localeCompare(right.summary.name, 'en'),
  rounds: (left, right) =>
    (left.summary.motif?.rounds.length ?? 0) - (right.summary.motif?.rounds.length ?? 0),
  size: figure(({ acrossMm }) => acrossMm),
  yarn: figure(({ yarnM }) => yarnM),
};
