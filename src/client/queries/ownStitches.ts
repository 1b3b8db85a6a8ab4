import { queryOptions } from '@tanstack/react-query';
import {
  ownStitchListSchema,
  presentedOwnStitchSchema,
  type ownStitchInput,
  type OwnStitchInput,
  type ownStitchUpdate,
  type PresentedOwnStitch,
} from '../../schemas/ownStitch';
import { nothingSchema } from '../../schemas/schema';
import { post, put, remove } from '../api';
import { getAll } from '../getAll';

const PATH = '/api/stitches';

export const ownStitchesQuery = queryOptions({
  queryKey: ['own-stitches'],
  queryFn: ({ signal }) => getAll(PATH, ownStitchListSchema, signal),
});

export const createOwnStitch = (stitch: OwnStitchInput): Promise<PresentedOwnStitch> =>
  post<typeof presentedOwnStitchSchema, typeof ownStitchInput>(
    PATH,
    stitch,
    presentedOwnStitchSchema,
  );

/** `version` is the save that the edit began from. */
export const updateOwnStitch = (
  id: string,
  version: number,
  stitch: OwnStitchInput,
): Promise<PresentedOwnStitch> =>
  put<typeof presentedOwnStitchSchema, typeof ownStitchUpdate>(
    `${PATH}/${id}`,
    { ...stitch, version },
    presentedOwnStitchSchema,
  );

export const deleteOwnStitch = (id: string): Promise<void> =>
  remove(`${PATH}/${id}`, nothingSchema);
