import type { MotifGeometry } from '../../../lib/motifs/geometry';
import type { MotifSides } from '../../../lib/motifs/motif';
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
const LEAST_M = { metric: 0.1, imperial: 0.09144 } as const;

/** "0.2 cm": how far off a size may be, 95 % sure. */
export const sizeGiveOrTake = (sdMm: number, units: Units): string =>
  showFabric(Math.max(Z95 * sdMm, LEAST_MM[units]), units);

export const yarnGiveOrTake = (sdM: number, units: Units): string =>
  showYarn(Math.max(Z95 * sdM, LEAST_M[units]), units);

/** "by its rounds alone 13.1 cm, give or take 1.9 cm" */
export const computedWords = ({ computed }: MadeFigures, units: Units): string =>
  `by its rounds alone ${showFabric(computed.acrossMm, units)}, give or take ${sizeGiveOrTake(computed.acrossSdMm, units)}`;

/** The size in a sentence, before and after; null while none was taken. */
export function sizeSentence(figures: MadeFigures, sides: MotifSides, units: Units): string | null {
  const { measured } = figures;
  if (!measured) return null;
  const comesOut = `${showFabric(measured.acrossMm, units)} ${acrossWord(sides)}`;
  const sure = sizeGiveOrTake(measured.acrossSdMm, units);
  return `Measured, it comes out ${comesOut}, give or take ${sure}; ${computedWords(figures, units)}.`;
}

/** The yarn of one in a sentence, before and after; null while none was weighed. */
export function yarnSentence({ yarn }: MadeFigures, units: Units): string | null {
  if (!yarn) return null;
  const { before, after, gramsPerM } = yarn;
  const each = `${showYarn(after.meanM, units)} (${showMass(after.meanM * gramsPerM, units)})`;
  return `Each takes ${each} of yarn, give or take ${yarnGiveOrTake(after.sdM, units)}; by the gauge alone ${showYarn(before.meanM, units)} (${showMass(before.meanM * gramsPerM, units)}), give or take ${yarnGiveOrTake(before.sdM, units)}.`;
}

/** How it lies, where making it showed something else than the gauge says; else null. */
export function verdictChange({ computed, measured }: MadeFigures): string | null {
  if (!measured) return null;
  const [before, after] = [lies(computed), lies(measured)];
  return before === after ? null : `By the gauge it ${before}; as measured it ${after}.`;
}

const lies = ({ trouble }: MotifGeometry): string =>
  trouble ? `${trouble.kind} from ${trouble.label} on` : 'lies flat';

/** "4 rounds, blocked" */
export const workedWords = ({ rounds, blocked }: MadeMotifInput): string =>
  `${rounds}\u00a0${rounds === 1 ? 'round' : 'rounds'}${blocked ? ', blocked' : ''}`;

const weightWords = ({ weighed }: MadeMotifInput, units: Units): string =>
  weighed
    ? `${weighed.count} weigh ${showMass(weighed.massG, units)}, ${weighed.yarns} ${weighed.yarns === 1 ? 'yarn' : 'yarns'} in each`
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
  ['Weight', (made) => weightWords(made, units)],
  [
    'Skein',
    ({ putUp }) =>
      putUp ? `${showMass(putUp.massG, units)}, ${showYarn(putUp.lengthM, units)}` : '',
  ],
  ['Notes', ({ notes }) => notes],
];
