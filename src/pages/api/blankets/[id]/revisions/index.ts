import { revisionSchema } from '../../../../../schemas/blanket';
import { idParams, listOf } from '../../../../../schemas/fields';
import { EXAMPLE_ID } from '../../../../../server/examples';
import { handle } from '../../../../../server/handle';
import { listRevisions } from '../../../../../server/queries/blankets';

export const GET = handle({
  summary: 'List the saves of a blanket, newest first',
  who: 'signed-in',
  params: idParams,
  response: listOf(revisionSchema),
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => listRevisions(user, params.id),
});
