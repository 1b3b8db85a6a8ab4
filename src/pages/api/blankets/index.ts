import { listOf } from '../../../schemas/fields';
import {
  blanketInput,
  blanketSchema,
  blanketsQuery,
  blanketSummarySchema,
} from '../../../schemas/blanket';
import { createBlanket } from '../../../server/commands/createBlanket';
import { PLAN_EXAMPLE } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { listBlankets } from '../../../server/queries/blankets';

export const GET = handle({
  summary: 'List my blankets',
  who: 'signed-in',
  query: blanketsQuery,
  response: listOf(blanketSummarySchema),
  example: { query: { deleted: 'no' } },
  run: ({ user, query }) => listBlankets(user, query),
});

export const POST = handle({
  summary: 'Keep a blanket',
  who: 'signed-in',
  body: blanketInput,
  response: blanketSchema,
  status: 201,
  example: { body: { title: 'Eighty squares', plan: PLAN_EXAMPLE } },
  run: ({ user, body, transaction }) => createBlanket(user, body, transaction),
});
