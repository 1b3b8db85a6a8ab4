import { idParams } from '../../../../schemas/fields';
import { blanketSchema, blanketUpdate } from '../../../../schemas/blanket';
import { nothingSchema } from '../../../../schemas/schema';
import { deleteBlanket } from '../../../../server/commands/deleteBlanket';
import { updateBlanket } from '../../../../server/commands/updateBlanket';
import { EXAMPLE_ID, PLAN_EXAMPLE } from '../../../../server/examples';
import { handle } from '../../../../server/handle';
import { getBlanket } from '../../../../server/queries/blankets';

export const GET = handle({
  summary: 'Get a blanket of mine',
  who: 'signed-in',
  params: idParams,
  response: blanketSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getBlanket(user, params.id),
});

export const PUT = handle({
  summary: 'Save a blanket of mine',
  who: 'signed-in',
  params: idParams,
  body: blanketUpdate,
  response: blanketSchema,
  errors: ['not-found', 'conflict', 'gone'],
  example: {
    params: { id: EXAMPLE_ID },
    body: { title: 'Eighty squares', plan: PLAN_EXAMPLE, version: 1 },
  },
  run: ({ user, params, body, transaction }) => updateBlanket(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Delete a blanket of mine',
  description: 'It can be restored.',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, now, transaction }) => deleteBlanket(user, params.id, now, transaction),
});
