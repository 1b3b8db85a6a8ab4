import * as z from './zod';
import { READY_JOINS } from '../lib/joins/readyJoins';
import { MOTIF_SIDES } from '../lib/motifs/motif';
import { MOTIF_KINDS } from '../lib/motifs/motifKind';

export const LIBRARY_ORDERS = ['library', 'name', 'rounds', 'size', 'yarn'] as const;

/** What of the library is looked at, as its address says; whatever cannot be read is left open. */
export const libraryQuery = z.object({
  name: z.string().trim().max(80).catch(''),
  sides: z.string().min(1).transform(Number).pipe(z.literal(MOTIF_SIDES)).nullable().catch(null),
  kind: z.literal(MOTIF_KINDS).nullable().catch(null),
  /** Key of a join that has to fit. */
  join: z
    .literal(READY_JOINS.map(({ key }) => key))
    .nullable()
    .catch(null),
  order: z.literal(LIBRARY_ORDERS).catch('library'),
});
export type LibraryQuery = z.output<typeof libraryQuery>;
