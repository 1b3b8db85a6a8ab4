import { showMass, showPrice, showYarn, type Units } from '../../../lib/units/display';
import { YARN_CATEGORIES } from '../../../lib/yarnCategories';
import type { PresentedLot } from '../../../schemas/stash';
import type { ColourContent, LotContent } from '../../../schemas/stashEntry';
import type { Money, YarnInput } from '../../../schemas/yarn';
import type { Wording } from '../form/differences';

const priceWords = (price: Money | null): string =>
  price ? showPrice(price.priceMinor, price.currency) : '';

export const weightWords = (category: number): string =>
  `${category} ${YARN_CATEGORIES[category]?.name ?? ''}`;

/** A part skein to the tenth of a gram that it was weighed to: "62 g", "17.5 g". */
export const partWords = (massG: number): string => `${Number(massG.toFixed(1))}\u00a0g`;

/** "3 skeins and 62 g", "2 part skeins: 41 g, 17.5 g", "nothing" */
export function amountWords({
  wholeSkeins,
  partSkeins,
}: Pick<LotContent, 'wholeSkeins' | 'partSkeins'>): string {
  const parts = partSkeins.map(({ massG }) => partWords(massG)).join(', ');
  const whole = wholeSkeins > 0 && `${wholeSkeins} ${wholeSkeins === 1 ? 'skein' : 'skeins'}`;
  if (whole && parts) return `${whole} and ${parts}`;
  return whole || parts || 'nothing';
}

/** How a lot is called: "Skerry, lot 4471". */
export const lotName = ({ colourway, lotCode }: PresentedLot): string =>
  lotCode ? `${colourway.name}, lot ${lotCode}` : colourway.name;

/** All lots together: "26 skeins and 6 parts". */
export function stashWords(lots: readonly PresentedLot[]): string {
  const whole = lots.reduce((sum, { wholeSkeins }) => sum + wholeSkeins, 0);
  const parts = lots.reduce((sum, { partSkeins }) => sum + partSkeins.length, 0);
  const skeins = `${whole} ${whole === 1 ? 'skein' : 'skeins'}`;
  return parts === 0 ? skeins : `${skeins} and ${parts} ${parts === 1 ? 'part' : 'parts'}`;
}

export const lotWording: Wording<LotContent> = [
  ['Dye lot', ({ lotCode }) => lotCode],
  ['Holds', amountWords],
  ['Place', ({ location }) => location],
  ['Paid for a skein', ({ pricePaid }) => priceWords(pricePaid)],
];

export const yarnWording = (units: Units): Wording<YarnInput> => [
  ['Name', ({ name }) => name],
  ['Maker', ({ maker }) => maker],
  ['Fibre', ({ fibre }) => fibre],
  ['Weight', ({ weightCategory }) => weightWords(weightCategory)],
  ['Skein', ({ putUp }) => `${showMass(putUp.massG, 'metric')}, ${showYarn(putUp.lengthM, units)}`],
  ['Price', ({ price }) => priceWords(price)],
];

export const colourWording: Wording<ColourContent> = [
  ['Name', ({ name }) => name],
  ['Colour', ({ hex }) => hex],
];
