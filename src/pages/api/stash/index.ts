import { listOf, listQuery } from '../../../schemas/fields';
import { lotInput, lotSchema } from '../../../schemas/stash';
import { createLot } from '../../../server/commands/createLot';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { listStash } from '../../../server/queries/stash';

export const GET = handle({
  summary: 'List my stash by dye lot',
  who: 'signed-in',
  query: listQuery,
  response: listOf(lotSchema),
  example: { query: { limit: '20' } },
  run: ({ user, query }) => listStash(user, query),
});

export const POST = handle({
  summary: 'Add a dye lot to my stash',
  who: 'signed-in',
  body: lotInput,
  response: lotSchema,
  status: 201,
  example: {
    body: {
      colourwayId: EXAMPLE_ID,
      lotCode: '2207',
      location: 'Blue basket',
      pricePaid: { priceMinor: 720, currency: 'EUR' },
      wholeSkeins: 3,
      partSkeins: [{ massG: 41 }],
    },
  },
  run: ({ user, body, transaction }) => createLot(user, body, transaction),
});
