import { revisionWithPlanSchema } from '../../../../../../schemas/blanket';
import { saveParams } from '../../../../../../schemas/fields';
import { EXAMPLE_ID } from '../../../../../../server/examples';
import { handle } from '../../../../../../server/handle';
import { getRevision } from '../../../../../../server/queries/blankets';

export const GET = handle({
  summary: 'Get a blanket as it was saved',
  who: 'signed-in',
  params: saveParams,
  response: revisionWithPlanSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID, version: '3' } },
  run: ({ user, params }) => getRevision(user, params.id, params.version),
});
