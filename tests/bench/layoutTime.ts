import { estimate } from '../../src/lib';
import { joiningOrder } from '../../src/lib/joining/joiningOrder';
import { LAYOUTS, type Layout } from '../../src/lib/layout/layouts';
import { buildPlan } from '../support/plans';
import { heading, line } from './report.ts';
import { exponent, leastMs } from './timing.ts';

const SIDES = [10, 20, 50, 100, 200] as const;
const ROUNDS = 5;
/** n log n from 400 to 40,000 motifs, as an exponent of n. */
const LOG_LINEAR = 1.14;
/** What a garbage collection may add. */
const SLACK = 0.08;

/** Layout, ledger and joining order together, against the number of motifs. */
export function benchLayoutTime(): void {
  heading('Time of layout, ledger and joining order');
  for (const layout of LAYOUTS) withOrder(layout);
  atRandom();
}

function withOrder(layout: Layout): void {
  const times = leastMs(
    SIDES.map((side) => () => {
      estimate(buildPlan({ size: { by: 'grid', rows: side, columns: side } }));
      joiningOrder({ layout, edge: 'straight' }, side, side, 'crossed', 'row-by-row');
    }),
    ROUNDS,
    1,
  );
  report(layout, times);
}

/** Colourways at random, no two alike side by side: laid out motif by motif. */
function atRandom(): void {
  const times = leastMs(
    SIDES.map((side) => () => {
      const placement = {
        rule: { by: 'random', seed: 1, counts: null },
        painted: [],
        byHand: [],
      } as const;
      estimate(buildPlan({ size: { by: 'grid', rows: side, columns: side }, placement }));
    }),
    ROUNDS,
    1,
  );
  report('placed at random', times);
}

function report(what: string, times: readonly number[]): void {
  const motifs = SIDES.map((side) => side ** 2);
  line(`${what}, 200 × 200 over 10 × 10`, (times.at(-1) ?? 0) / (times[0] ?? 1), 'times');
  line(`${what}, exponent of motifs from 20 × 20`, exponent(motifs, times, 400), '', {
    most: LOG_LINEAR + SLACK,
    why: 'n log n at worst',
  });
}
