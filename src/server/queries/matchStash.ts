import type { Plan } from '../../lib/plan/plan';
import type { StashOfColour } from '../../schemas/shoppingList';
import type { PresentedLot } from '../../schemas/stash';

/** A colourway of one's own with the dye lots that are in the stash. */
export interface StashColourway {
  id: string;
  name: string;
  hex: string;
  yarnName: string;
  weightCategory: number;
  lots: PresentedLot[];
}

/**
 * Which colourway of the stash serves each colour of a plan. A person's own link counts first; else
 * a colourway of the plan's weight category whose name is the colour's, however capitalised, from
 * the plan's own yarn if there are several. One colourway never serves two colours.
 */
export function matchStash(
  plan: Pick<Plan, 'yarn' | 'colours'>,
  links: ReadonlyMap<string, string | null>,
  colourways: readonly StashColourway[],
): Map<string, StashOfColour> {
  const byId = new Map(colourways.map((colourway) => [colourway.id, colourway]));
  const taken = new Set(links.values());
  const isPlanYarn = ({ yarnName }: StashColourway) => sameName(yarnName, plan.yarn.name);
  const ofWeight = colourways
    .filter(
      ({ weightCategory, lots }) => weightCategory === plan.yarn.weightCategory && lots.length > 0,
    )
    .sort((left, right) => Number(isPlanYarn(right)) - Number(isPlanYarn(left)));

  return new Map(
    plan.colours.map(({ key, name }): [string, StashOfColour] => {
      const link = links.get(key);
      if (link === null) return [key, stashOf('kept out', null, plan)];
      const linked = link === undefined ? undefined : byId.get(link);
      if (linked) return [key, stashOf('linked', linked, plan)];
      const named = ofWeight.find((each) => !taken.has(each.id) && sameName(each.name, name));
      if (!named) return [key, stashOf('none', null, plan)];
      taken.add(named.id);
      return [key, stashOf('by name', named, plan)];
    }),
  );
}

const sameName = (left: string, right: string): boolean =>
  left.trim().toLowerCase() === right.trim().toLowerCase();

function stashOf(
  match: StashOfColour['match'],
  colourway: StashColourway | null,
  plan: Pick<Plan, 'yarn'>,
): StashOfColour {
  return {
    match,
    colourway: colourway && {
      id: colourway.id,
      name: colourway.name,
      hex: colourway.hex,
      yarnName: colourway.yarnName,
    },
    weightDiffers: colourway !== null && colourway.weightCategory !== plan.yarn.weightCategory,
    lots: (colourway?.lots ?? []).map(({ id, lotCode, totalM, totalG }) => ({
      id,
      lotCode,
      totalM,
      totalG,
    })),
  };
}
