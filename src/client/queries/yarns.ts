import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../schemas/fields';
import { nothingSchema } from '../../schemas/schema';
import type { ColourContent } from '../../schemas/stashEntry';
import {
  colourwaySchema,
  yarnSchema,
  type colourwayInput,
  type colourwayUpdate,
  type PresentedColourway,
  type PresentedYarn,
  type YarnInput,
  type yarnInput,
  type yarnUpdate,
} from '../../schemas/yarn';
import { post, put, remove } from '../api';
import { getAll } from '../getAll';

const YARNS = '/api/yarns';
const COLOURWAYS = '/api/colourways';
const yarnList = listOf(yarnSchema);

export const yarnsQuery = queryOptions({
  queryKey: ['yarns'],
  queryFn: ({ signal }) => getAll(YARNS, yarnList, signal),
});

export const createYarn = (yarn: YarnInput): Promise<PresentedYarn> =>
  post<typeof yarnSchema, typeof yarnInput>(YARNS, yarn, yarnSchema);

export const updateYarn = (
  { id, version }: PresentedYarn,
  yarn: YarnInput,
): Promise<PresentedYarn> =>
  put<typeof yarnSchema, typeof yarnUpdate>(`${YARNS}/${id}`, { ...yarn, version }, yarnSchema);

export const deleteYarn = (id: string): Promise<void> => remove(`${YARNS}/${id}`, nothingSchema);

export function yarnContent(row: PresentedYarn): YarnInput {
  const { name, maker, fibre, weightCategory, putUp, price } = row;
  return { name, maker, fibre, weightCategory, putUp, price };
}

export const createColourway = (
  yarnId: string,
  colour: ColourContent,
): Promise<PresentedColourway> =>
  post<typeof colourwaySchema, typeof colourwayInput>(
    COLOURWAYS,
    { yarnId, ...colour },
    colourwaySchema,
  );

export const updateColourway = (
  { id, version }: PresentedColourway,
  colour: ColourContent,
): Promise<PresentedColourway> =>
  put<typeof colourwaySchema, typeof colourwayUpdate>(
    `${COLOURWAYS}/${id}`,
    { ...colour, version },
    colourwaySchema,
  );

export const colourContent = ({ name, hex }: PresentedColourway): ColourContent => ({ name, hex });
