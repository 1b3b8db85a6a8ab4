import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../schemas/fields';
import { nothingSchema } from '../../schemas/schema';
import { lotSchema, type lotInput, type lotUpdate, type PresentedLot } from '../../schemas/stash';
import type { LotContent } from '../../schemas/stashEntry';
import { post, put, remove } from '../api';
import { getAll } from '../getAll';

const PATH = '/api/stash';
const lotList = listOf(lotSchema);

/** Every lot of the stash. */
export const listStash = (signal?: AbortSignal): Promise<PresentedLot[]> =>
  getAll(PATH, lotList, signal);

export const stashQuery = queryOptions({
  queryKey: ['stash'],
  queryFn: ({ signal }) => listStash(signal),
});

export const createLot = (colourwayId: string, lot: LotContent): Promise<PresentedLot> =>
  post<typeof lotSchema, typeof lotInput>(PATH, { colourwayId, ...lot }, lotSchema);

export const updateLot = ({ id, version }: PresentedLot, lot: LotContent): Promise<PresentedLot> =>
  put<typeof lotSchema, typeof lotUpdate>(`${PATH}/${id}`, { ...lot, version }, lotSchema);

export const deleteLot = (id: string): Promise<void> => remove(`${PATH}/${id}`, nothingSchema);

export function lotContent(row: PresentedLot): LotContent {
  const { lotCode, location, pricePaid, wholeSkeins, partSkeins } = row;
  return { lotCode, location, pricePaid, wholeSkeins, partSkeins };
}
