import { queryOptions } from '@tanstack/react-query';
import type { Plan } from '../../lib/plan/plan';
import { blanketSchema, blanketSummarySchema, type PresentedBlanket } from '../../schemas/blanket';
import { listOf } from '../../schemas/fields';
import { nothingSchema } from '../../schemas/schema';
import { get, post, remove } from '../api';
import { getAll } from '../getAll';

const PATH = '/api/blankets';
const blanketList = listOf(blanketSummarySchema);

export const blanketsQuery = queryOptions({
  queryKey: ['blankets'],
  queryFn: ({ signal }) => getAll(PATH, blanketList, signal),
});

type Kept = Pick<PresentedBlanket, 'id' | 'title'>;

export const createBlanket = (title: string, plan: Plan): Promise<Kept> =>
  post(PATH, { title, plan }, blanketSchema);

/** A second blanket with the plan of this one. */
export async function duplicateBlanket(id: string, title: string): Promise<Kept> {
  const { plan } = await get(`${PATH}/${id}`, blanketSchema);
  return createBlanket(title, plan);
}

export const deleteBlanket = (id: string): Promise<void> => remove(`${PATH}/${id}`, nothingSchema);

export const restoreBlanket = (id: string): Promise<Kept> =>
  post(`${PATH}/${id}/restore`, undefined, blanketSchema);
