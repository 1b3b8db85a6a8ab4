import { saveParams } from '../../../../../../schemas/fields';
import { presentedMotifSchema } from '../../../../../../schemas/motif';
import { EXAMPLE_ID } from '../../../../../../server/examples';
import { handle } from '../../../../../../server/handle';
import { getMotifVersion } from '../../../../../../server/queries/motifs';

export const GET = handle({
  summary: 'Get a motif of my own as it was saved',
  who: 'signed-in',
  params: saveParams,
  response: presentedMotifSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID, version: '3' } },
  run: ({ user, params }) => getMotifVersion(user, params.id, params.version),
});
