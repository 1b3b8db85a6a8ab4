import {
  compareTensions,
  EXAMPLE_PLAN,
  estimate,
  READY_JOINS,
  widthMm,
  type Join,
} from '../../src/lib';
import { heading, line } from './report.ts';
import { leastMs } from './timing.ts';

const JOINS = 12;
const PEOPLE = 4;
const ROUNDS = 20;

/** Time of comparing joins for several hands, against as many estimates. */
export function benchCompareTime(): void {
  heading('Time of a comparison of joins');
  const joins = Array.from(
    { length: JOINS },
    (_, i) => READY_JOINS[i % READY_JOINS.length] as Join,
  );
  const swatches = Array.from({ length: PEOPLE }, (_, i) => ({
    stitch: 'sc',
    stitches: 20,
    rows: 18,
    widthMm: widthMm(130 + 10 * i),
    heightMm: widthMm(110 + 8 * i),
  }));
  const [comparedMs = 0, estimateMs = 1] = leastMs(
    [
      () => void compareTensions(EXAMPLE_PLAN, joins, swatches),
      () => void estimate({ ...EXAMPLE_PLAN, swatch: swatches[0] ?? null, evidence: [] }),
    ],
    ROUNDS,
  );
  line(`comparing ${JOINS} joins for ${PEOPLE} people`, comparedMs, 'ms');
  const each = comparedMs / (JOINS * PEOPLE) / estimateMs;
  line('each join and person, over one estimate', each, 'times', {
    most: 1.5,
    why: 'a comparison is its estimates',
  });
}
