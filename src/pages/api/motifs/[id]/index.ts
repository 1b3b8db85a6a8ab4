import { idParams, keyParams } from '../../../../schemas/fields';
import { motifUpdate, presentedMotifSchema } from '../../../../schemas/motif';
import { nothingSchema } from '../../../../schemas/schema';
import { deleteMotif } from '../../../../server/commands/deleteMotif';
import { updateMotif } from '../../../../server/commands/updateMotif';
import { EXAMPLE_ID, MOTIF_EXAMPLE } from '../../../../server/examples';
import { handle } from '../../../../server/handle';
import { getMotif } from '../../../../server/queries/motifs';

export const GET = handle({
  summary: 'Get a ready-made motif by its key, or one of my own by its id',
  who: 'signed-in',
  params: keyParams,
  response: presentedMotifSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getMotif(user, params.id),
});

export const PUT = handle({
  summary: 'Change a motif of my own',
  who: 'signed-in',
  params: idParams,
  body: motifUpdate,
  limit: 'heavy',
  response: presentedMotifSchema,
  errors: ['not-found', 'conflict'],
  example: { params: { id: EXAMPLE_ID }, body: { ...MOTIF_EXAMPLE, version: 1 } },
  run: ({ user, params, body, transaction }) => updateMotif(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Delete a motif of my own',
  description: 'Blankets keep the motif as it was when they were planned.',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => deleteMotif(user, params.id, transaction),
});
