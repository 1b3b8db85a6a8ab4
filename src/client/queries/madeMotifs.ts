import { queryOptions } from '@tanstack/react-query';
import {
  madeMotifListSchema,
  madeMotifSchema,
  type madeMotifInput,
  type MadeMotifInput,
  type madeMotifUpdate,
  type PresentedMadeMotif,
} from '../../schemas/madeMotif';
import { nothingSchema } from '../../schemas/schema';
import { get, post, put, remove } from '../api';
import { LIST_LIMITS } from '../../schemas/limits';

const PATH = '/api/made-motifs';

/** Those made of one motif: the newest, as many as one page of the list holds. */
export const madeMotifsOf = (motifKey: string) =>
  queryOptions({
    queryKey: ['made-motifs', motifKey],
    queryFn: async ({ signal }) => {
      const asked = new URLSearchParams({ motif: motifKey, limit: `${LIST_LIMITS.most}` });
      return (await get(`${PATH}?${asked}`, madeMotifListSchema, { signal })).items;
    },
  });

export const createMadeMotif = (made: MadeMotifInput): Promise<PresentedMadeMotif> =>
  post<typeof madeMotifSchema, typeof madeMotifInput>(PATH, made, madeMotifSchema);

/** `version` is the save that the edit began from. */
export const updateMadeMotif = (
  id: string,
  version: number,
  made: MadeMotifInput,
): Promise<PresentedMadeMotif> =>
  put<typeof madeMotifSchema, typeof madeMotifUpdate>(
    `${PATH}/${id}`,
    { ...made, version },
    madeMotifSchema,
  );

export const deleteMadeMotif = (id: string): Promise<void> =>
  remove(`${PATH}/${id}`, nothingSchema);
