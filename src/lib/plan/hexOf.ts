import type { Plan } from './plan';

/** sRGB of a colour of the plan; grey for a key that it does not have. */
export const hexOf = ({ colours }: Pick<Plan, 'colours'>, key: string): string =>
  colours.find((colour) => colour.key === key)?.hex ?? '#888888';
