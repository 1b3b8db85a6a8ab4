import { compareTensions } from '../../../lib/joins/compareJoins';
import { readyJoin } from '../../../lib/joins/readyJoins';
import { compareJoinsInput, compareJoinsSchema } from '../../../schemas/compareJoins';
import { PLAN_EXAMPLE } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { presentTension } from '../../../server/presenters/joinComparison';

export const POST = handle({
  summary: 'Compare joins on a plan',
  description:
    'Anyone may ask; nothing is kept. Each join on the grid of the plan, at its own tension or, where swatches ' +
    'are sent, at the tension of each of them. Yarn, skeins, cost, size, tails and time of each, and why the thriftiest is.',
  who: 'anyone',
  stateless: true,
  limit: 'heavy',
  body: compareJoinsInput,
  response: compareJoinsSchema,
  example: {
    body: {
      plan: PLAN_EXAMPLE,
      joins: ['slip-stitch', 'sc-ridge', 'flat-braid'],
      swatches: [{ stitch: 'sc', stitches: 20, rows: 18, widthMm: 140, heightMm: 118 }],
    },
  },
  run: ({ body: { plan, joins, swatches } }) => {
    const tried = joins.flatMap((key) => readyJoin(key) ?? []);
    const asked = swatches.length > 0 ? swatches : [null];
    return {
      tensions: compareTensions(plan, tried, asked).map((comparisons, i) =>
        presentTension(swatches.length > 0 ? i : null, comparisons),
      ),
    };
  },
});
