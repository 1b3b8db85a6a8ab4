import type { Blanket, MakingTick, MakingWeighing } from '../../../db/models';
import { makingSchema, type Making } from '../../schemas/making';

export const presentMaking = (
  blanket: Blanket,
  ticks: readonly MakingTick[],
  weighings: readonly MakingWeighing[],
): Making =>
  makingSchema.parse({
    order: blanket.makingOrder,
    ticks: ticks.map(({ motif, done, at }) => ({ motif, done, at: at.toISOString() })),
    weighings: weighings.map(({ id, colour, leftG, resolutionG, made, tails, gone, at }) => ({
      ...{ id, colour, leftG, resolutionG, made, tails, gone },
      at: at.toISOString(),
    })),
  });
