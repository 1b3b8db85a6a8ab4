import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../schemas/fields';
import { nothingSchema } from '../../schemas/schema';
import {
  swatchSchema,
  type PresentedSwatch,
  type swatchInput,
  type swatchUpdate,
  type SwatchInput,
} from '../../schemas/swatch';
import { post, put, remove } from '../api';
import { getAll } from '../getAll';

const PATH = '/api/swatches';
const swatchList = listOf(swatchSchema);

export const swatchesQuery = queryOptions({
  queryKey: ['swatches'],
  queryFn: ({ signal }) => getAll(PATH, swatchList, signal),
});

export const createSwatch = (swatch: SwatchInput): Promise<PresentedSwatch> =>
  post<typeof swatchSchema, typeof swatchInput>(PATH, swatch, swatchSchema);

/** `version` is the save that the edit began from. */
export const updateSwatch = (
  id: string,
  version: number,
  swatch: SwatchInput,
): Promise<PresentedSwatch> =>
  put<typeof swatchSchema, typeof swatchUpdate>(
    `${PATH}/${id}`,
    { ...swatch, version },
    swatchSchema,
  );

export const deleteSwatch = (id: string): Promise<void> => remove(`${PATH}/${id}`, nothingSchema);

/** The content of a kept swatch, to save it anew. */
export function swatchContent(swatch: PresentedSwatch): SwatchInput {
  const { name, yarnId, stitch, stitches, rows, hookMm, notes, measurements } = swatch;
  return { name, yarnId, stitch, stitches, rows, hookMm, notes, measurements };
}
