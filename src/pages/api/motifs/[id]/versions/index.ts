import { idParams, listOf } from '../../../../../schemas/fields';
import { motifVersionSchema } from '../../../../../schemas/motif';
import { EXAMPLE_ID } from '../../../../../server/examples';
import { handle } from '../../../../../server/handle';
import { listMotifVersions } from '../../../../../server/queries/motifs';

export const GET = handle({
  summary: 'List the saves of a motif of my own, newest first',
  who: 'signed-in',
  params: idParams,
  response: listOf(motifVersionSchema),
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => listMotifVersions(user, params.id),
});
