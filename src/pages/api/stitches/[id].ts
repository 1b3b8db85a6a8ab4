import { idParams } from '../../../schemas/fields';
import { ownStitchUpdate, presentedOwnStitchSchema } from '../../../schemas/ownStitch';
import { nothingSchema } from '../../../schemas/schema';
import { deleteOwnStitch } from '../../../server/commands/deleteOwnStitch';
import { updateOwnStitch } from '../../../server/commands/updateOwnStitch';
import { EXAMPLE_ID, STITCH_EXAMPLE } from '../../../server/examples';
import { handle } from '../../../server/handle';

export const PUT = handle({
  summary: 'Change a stitch of my own',
  who: 'signed-in',
  params: idParams,
  body: ownStitchUpdate,
  response: presentedOwnStitchSchema,
  errors: ['not-found', 'conflict'],
  example: { params: { id: EXAMPLE_ID }, body: { ...STITCH_EXAMPLE, version: 1 } },
  run: ({ user, params, body, transaction }) => updateOwnStitch(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Delete a stitch of my own',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => deleteOwnStitch(user, params.id, transaction),
});
