import { listOf, listQuery } from '../../../schemas/fields';
import { yarnInput, yarnSchema } from '../../../schemas/yarn';
import { createYarn } from '../../../server/commands/createYarn';
import { handle } from '../../../server/handle';
import { listYarns } from '../../../server/queries/yarns';

export const GET = handle({
  summary: 'List my yarns with their colourways',
  who: 'signed-in',
  query: listQuery,
  response: listOf(yarnSchema),
  example: { query: { limit: '20' } },
  run: ({ user, query }) => listYarns(user, query),
});

export const POST = handle({
  summary: 'Add a yarn',
  who: 'signed-in',
  body: yarnInput,
  response: yarnSchema,
  status: 201,
  example: {
    body: {
      name: 'Towpath DK',
      maker: 'Ostler & Fenn',
      fibre: '100 % wool',
      weightCategory: 3,
      putUp: { massG: 100, lengthM: 240 },
      price: { priceMinor: 720, currency: 'EUR' },
    },
  },
  run: ({ user, body, transaction }) => createYarn(user, body, transaction),
});
