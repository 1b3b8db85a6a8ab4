import type { YarnBelief } from '../../../lib/motifs/madeYarn';
import type { MotifGeometry } from '../../../lib/motifs/geometry';
import type { MotifSides } from '../../../lib/motifs/motif';
import { mmToInches } from '../../../lib/units/conversion';
import { showFabric, showMass, showYarn, type Units } from '../../../lib/units/display';
import type { MadeMotifInput } from '../../../schemas/madeMotif';
import { acrossWord } from '../../motifs/motifWords';
import type { Wording } from '../form/differences';
import { showDay } from '../swatches/swatchWords';
import type { MadeFigures } from './madeFigures';

/** Two-sided 95 %: the standard normal quantile of 0.975. */
const Z95 = 1.96;
/** What the figures shown can still tell: a tenth of their unit. */
const LEAST_MM = { metric: 1, imperial: 2.54 } as const;
const LEAST_FINE_MM = { metric: 1, imperial: 0.254 } as const;
const LEAST_M = { metric: 0.1, imperial: 0.09144 } as const;

/** "0.2 cm": how far off a size may be, 95 % sure. */
export const sizeGiveOrTake = (sdMm: number, units: Units): string =>
  showFabric(Math.max(Z95 * sdMm, LEAST_MM[units]), units);

/** A size as finely as a tape reads, without its unit: "13.0", in inches "5.13". */
export const fineSize = (sizeMm: number, units: Units): string =>
  units === 'metric' ? (sizeMm / 10).toFixed(1) : mmToInches(sizeMm).toFixed(2);

/** "0.2": how far off such a size may be, 95 % sure, never said to be nothing. */
export const fineGiveOrTake = (sdMm: number, units: Units): string =>
  fineSize(Math.max(Z95 * sdMm, LEAST_FINE_MM[units]), units);

export const yarnGiveOrTake = (sdM: number, units: Units): string =>
  showYarn(Math.max(Z95 * sdM, LEAST_M[units]), units);

/** "by its rounds alone 13.1 cm, give or take 1.9 cm" */
export const computedWords = ({ computed }: MadeFigures, units: Units): string =>
  `by its rounds alone ${showFabric(computed.acrossMm, units)}, give or take ${sizeGiveOrTake(computed.acrossSdMm, units)}`;

/** A sentence whose answer is set apart: what comes before it, the answer, and the rest. */
export type Told = readonly [lead: string, answer: string, rest: string];

/** The size in a sentence, before and after; null while none was taken. */
export function sizeTold(figures: MadeFigures, sides: MotifSides, units: Units): Told | null {
  const { measured } = figures;
  if (!measured) return null;
  const sure = sizeGiveOrTake(measured.acrossSdMm, units);
  return [
    'Measured, it comes out ',
    `${showFabric(measured.acrossMm, units)} ${acrossWord(sides)}`,
    `, give or take ${sure}; ${computedWords(figures, units)}.`,
  ];
}

/** The yarn of one in a sentence, before and after; null while none was weighed. */
export function yarnTold({ yarn }: MadeFigures, units: Units): Told | null {
  if (!yarn) return null;
  const { before, after, gramsPerM } = yarn;
  const both = ({ meanM }: YarnBelief) =>
    [showYarn(meanM, units), showMass(meanM * gramsPerM, 'metric')] as const;
  const [length, mass] = both(after);
  const sure = yarnGiveOrTake(after.sdM, units);
  const usual = `${both(before).join(', ')}, give or take ${yarnGiveOrTake(before.sdM, units)}`;
  return [
    'Each takes ',
    `${length} of yarn`,
    `, ${mass}, give or take ${sure}; by the gauge alone ${usual}.`,
  ];
}

/** How it lies, where making it showed something else than the gauge says; else null. */
export function verdictChange({ computed, measured }: MadeFigures): string | null {
  if (!measured) return null;
  const [before, after] = [lies(computed), lies(measured)];
  return before === after ? null : `By the gauge it ${before}; as measured it ${after}.`;
}

const lies = ({ trouble }: MotifGeometry): string =>
  trouble ? `${trouble.kind} from ${trouble.label} on` : 'lies flat';

/** What to look at again, where a reading is further from the gauge than hands differ; else null. */
export function doubtWords({ measured, yarn }: MadeFigures): string | null {
  const isSizeOdd = measured?.rounds.some(({ questioned }) => questioned) ?? false;
  const what = [isSizeOdd && 'size', yarn?.questioned && 'weight'].filter(Boolean);
  return what.length > 0
    ? `Check the ${what.join(' and the ')}: further from the gauge than hands differ.`
    : null;
}

/** "4 rounds, blocked" */
export const workedWords = ({ rounds, blocked }: MadeMotifInput): string =>
  `${rounds}\u00a0${rounds === 1 ? 'round' : 'rounds'}${blocked ? ', blocked' : ''}`;

const weightWords = ({ weighed }: MadeMotifInput): string =>
  weighed
    ? `${weighed.count} weigh ${showMass(weighed.massG, 'metric')}, ${weighed.yarns} ${weighed.yarns === 1 ? 'yarn' : 'yarns'} in each`
    : '';

/** Each part of a made motif in words, to compare two saves of it. */
export const madeWording = (units: Units): Wording<MadeMotifInput> => [
  ['Made on', ({ madeOn }) => showDay(madeOn)],
  ['Worked', workedWords],
  [
    'Sizes',
    ({ sizes }) =>
      sizes.map(({ round, acrossMm }) => `${round}: ${showFabric(acrossMm, units)}`).join(', '),
  ],
  ['Weight', weightWords],
  [
    'Skein',
    ({ putUp }) =>
      putUp ? `${showMass(putUp.massG, 'metric')}, ${showYarn(putUp.lengthM, units)}` : '',
  ],
  ['Notes', ({ notes }) => notes],
];
