import { estimate, readyMotif, type Motif, type Plan } from '../../src/lib';
import { buildPlan } from '../support/plans';
import { heading, line } from './report.ts';
import { exponent, leastMs } from './timing.ts';

const SIDES = [10, 20, 50, 100, 200] as const;
const MANY = [1, 2, 5, 10, 20, 50, 100, 200] as const;
const ROUNDS = 60;
const WARM_UP = 10;
/** From here on the part that does not grow is small. */
const FIT_FROM = 10;

/** Time of an estimate against motifs of one kind, and against kinds of motif. */
export function benchEstimateTime(): void {
  heading('Time of an estimate');
  const byArea = estimateMs(
    SIDES.map((side) => buildPlan({ size: { by: 'grid', rows: side, columns: side } })),
  );
  SIDES.forEach((side, i) => {
    const ratio = (byArea[i] as number) / (byArea[0] as number);
    const flat = { most: 1.5, why: 'it must not grow with area' };
    if (i === 0) line(`estimate, ${side} × ${side} motifs`, byArea[0] as number, 'ms');
    else line(`estimate, ${side} × ${side} over 10 × 10`, ratio, 'times', flat);
  });
  growth('colourways of one motif', withColourways);
  growth('different motifs', withMotifs);
}

function growth(what: string, planOf: (count: number) => Plan): void {
  const times = estimateMs(MANY.map(planOf));
  line(`estimate, the first of the ${what}`, times[0] as number, 'ms');
  MANY.slice(1).forEach((count, i) => {
    const perEach = (times[i + 1] as number) / count / (times[0] as number);
    line(`estimate, ${count} ${what}, each over one`, perEach, 'times');
  });
  const linear = { most: 1.2, why: 'linear is 1' };
  line(
    `estimate, exponent of ${what} from ${FIT_FROM}`,
    exponent(MANY, times, FIT_FROM),
    '',
    linear,
  );
}

const estimateMs = (plans: readonly Plan[]): number[] =>
  leastMs(
    plans.map((plan) => () => void estimate(plan)),
    ROUNDS,
    WARM_UP,
  );

const COLOURS = ['c1', 'c2', 'c3', 'c4', 'c5'] as const;
const colourOf = (i: number): string => COLOURS[i % COLOURS.length] as string;
/** Large enough that even two hundred colourways are each used. */
const WIDE = { by: 'grid', rows: 200, columns: 200 } as const;

const withColourways = (count: number): Plan =>
  buildPlan({
    size: WIDE,
    colourways: Array.from({ length: count }, (_, i) => ({
      motifIndex: 0,
      roundColours: [0, 1, 2, 3].map((round) => colourOf(i + round * (1 + (i % 3)))),
    })),
  });

function withMotifs(count: number): Plan {
  const motif = readyMotif('group-square', 4) as Motif;
  return buildPlan({
    size: WIDE,
    motifs: Array.from({ length: count }, (_, i) => ({ ...motif, key: `motif-${i}` })),
    colourways: Array.from({ length: count }, (_, i) => ({
      motifIndex: i,
      roundColours: [0, 1, 2, 3].map((round) => colourOf(i + round)),
    })),
  });
}
