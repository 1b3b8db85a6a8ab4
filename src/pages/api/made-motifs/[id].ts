import { idParams } from '../../../schemas/fields';
import { madeMotifSchema, madeMotifUpdate } from '../../../schemas/madeMotif';
import { nothingSchema } from '../../../schemas/schema';
import { deleteMadeMotif } from '../../../server/commands/deleteMadeMotif';
import { updateMadeMotif } from '../../../server/commands/updateMadeMotif';
import { EXAMPLE_ID, MADE_MOTIF_EXAMPLE } from '../../../server/examples';
import { handle } from '../../../server/handle';

export const PUT = handle({
  summary: 'Change what a motif I made measures',
  who: 'signed-in',
  params: idParams,
  body: madeMotifUpdate,
  response: madeMotifSchema,
  errors: ['not-found', 'conflict'],
  example: { params: { id: EXAMPLE_ID }, body: { ...MADE_MOTIF_EXAMPLE, version: 1 } },
  run: ({ user, params, body, transaction }) => updateMadeMotif(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Delete a motif I made',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => deleteMadeMotif(user, params.id, transaction),
});
