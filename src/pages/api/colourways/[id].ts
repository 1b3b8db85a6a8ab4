import { idParams } from '../../../schemas/fields';
import { colourwaySchema, colourwayUpdate } from '../../../schemas/yarn';
import { nothingSchema } from '../../../schemas/schema';
import { deleteColourway } from '../../../server/commands/deleteColourway';
import { updateColourway } from '../../../server/commands/updateColourway';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { getColourway } from '../../../server/queries/yarns';

export const GET = handle({
  summary: 'Get a colourway of mine',
  who: 'signed-in',
  params: idParams,
  response: colourwaySchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getColourway(user, params.id),
});

export const PUT = handle({
  summary: 'Change a colourway of mine',
  who: 'signed-in',
  params: idParams,
  body: colourwayUpdate,
  response: colourwaySchema,
  errors: ['not-found', 'conflict'],
  example: { params: { id: EXAMPLE_ID }, body: { name: 'Lock Gate', hex: '#3b4a3f', version: 1 } },
  run: ({ user, params, body, transaction }) => updateColourway(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Delete a colourway of mine',
  description: 'Refused while it is in the stash.',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found', 'in-use'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => deleteColourway(user, params.id, transaction),
});
