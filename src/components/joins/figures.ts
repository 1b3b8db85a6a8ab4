import type { JoinComparison } from '../../lib/joins/compareJoins';
import {
  showDuration,
  showFabric,
  showPrice,
  yarnFigure,
  type Units,
} from '../../lib/units/display';

interface FigureShown {
  readonly word: string;
  readonly of: (row: JoinComparison) => number | null;
  readonly show: (row: JoinComparison, units: Units, currency?: string) => string;
}

/** What is compared of a join, in numbers. */
export const FIGURES = {
  'join yarn': {
    word: 'Yarn of the join',
    of: ({ joinM }) => joinM,
    show: ({ joinM }, units) => yarnFigure(joinM, units),
  },
  'all yarn': {
    word: 'Yarn of the blanket',
    of: ({ totalM }) => totalM,
    show: ({ totalM }, units) => yarnFigure(totalM, units),
  },
  skeins: { word: 'Skeins', of: ({ skeins }) => skeins, show: ({ skeins }) => String(skeins) },
  cost: {
    word: 'Cost',
    of: ({ costMinor }) => costMinor,
    show: ({ costMinor }, _, currency) =>
      costMinor === null || !currency ? '' : showPrice(costMinor, currency),
  },
  width: {
    word: 'Finished width',
    of: ({ widthMm }) => widthMm,
    show: ({ widthMm }, units) => showFabric(widthMm, units),
  },
  seam: {
    word: 'Width a seam adds',
    of: ({ seamMm }) => seamMm,
    show: ({ seamMm }, units) => showFabric(seamMm, units),
  },
  tails: {
    word: 'Tails',
    of: ({ tails }) => tails,
    show: ({ tails }) => String(Math.round(tails)),
  },
  time: {
    word: 'Time to join',
    of: ({ durationS }) => durationS,
    show: ({ durationS }) => showDuration(durationS),
  },
} as const satisfies Record<string, FigureShown>;
export type Figure = keyof typeof FIGURES;
