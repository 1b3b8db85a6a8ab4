import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../schemas/fields';
import {
  motifVersionSchema,
  presentedMotifSchema,
  type MotifInput,
  type motifInput,
  type motifUpdate,
  type PresentedMotif,
} from '../../schemas/motif';
import { nothingSchema } from '../../schemas/schema';
import { get, post, put, remove } from '../api';

const PATH = '/api/motifs';
const versionList = listOf(motifVersionSchema);

/** A ready-made motif by its key, or one of one's own by its id. */
export const getMotif = (key: string): Promise<PresentedMotif> =>
  get(`${PATH}/${key}`, presentedMotifSchema);

export const motifVersionsQuery = (id: string) =>
  queryOptions({
    queryKey: ['motif-versions', id],
    queryFn: async ({ signal }) =>
      (await get(`${PATH}/${id}/versions`, versionList, { signal })).items,
  });

export const createMotif = (motif: MotifInput): Promise<PresentedMotif> =>
  post<typeof presentedMotifSchema, typeof motifInput>(PATH, motif, presentedMotifSchema);

/** `version` is the save that the edit began from. */
export const updateMotif = (
  id: string,
  version: number,
  motif: MotifInput,
): Promise<PresentedMotif> =>
  put<typeof presentedMotifSchema, typeof motifUpdate>(
    `${PATH}/${id}`,
    { ...motif, version },
    presentedMotifSchema,
  );

export const deleteMotif = (id: string): Promise<void> => remove(`${PATH}/${id}`, nothingSchema);

export const getMotifVersion = (id: string, version: number): Promise<PresentedMotif> =>
  get(`${PATH}/${id}/versions/${version}`, presentedMotifSchema);

/** Saves `from` again as the newest; `version` is the save that is newest now. */
export const restoreMotif = (id: string, from: number, version: number): Promise<PresentedMotif> =>
  post(`${PATH}/${id}/versions/${from}/restore`, { version }, presentedMotifSchema);
