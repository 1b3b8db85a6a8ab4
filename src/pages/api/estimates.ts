import { estimate } from '../../lib/ledger/estimate';
import { estimateSchema } from '../../schemas/estimate';
import { planSchema } from '../../schemas/plan';
import { PLAN_EXAMPLE } from '../../server/examples';
import { handle } from '../../server/handle';
import { presentEstimate } from '../../server/presenters/estimate';

export const POST = handle({
  summary: 'Estimate a plan',
  description:
    'Anyone may ask; nothing is kept. The same figures as in the browser, to the last digit.',
  who: 'anyone',
  stateless: true,
  limit: 'heavy',
  body: planSchema,
  response: estimateSchema,
  example: { body: PLAN_EXAMPLE },
  run: ({ body }) => presentEstimate(estimate(body)),
});
