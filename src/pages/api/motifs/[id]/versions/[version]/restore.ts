import { restoreInput, saveParams } from '../../../../../../schemas/fields';
import { presentedMotifSchema } from '../../../../../../schemas/motif';
import { restoreMotif } from '../../../../../../server/commands/restoreMotif';
import { EXAMPLE_ID } from '../../../../../../server/examples';
import { handle } from '../../../../../../server/handle';

export const POST = handle({
  summary: 'Save an older save of a motif again',
  description: 'It becomes the newest save; nothing saved since is lost.',
  who: 'signed-in',
  limit: 'heavy',
  params: saveParams,
  body: restoreInput,
  response: presentedMotifSchema,
  errors: ['not-found', 'conflict'],
  example: { params: { id: EXAMPLE_ID, version: '3' }, body: { version: 7 } },
  run: ({ user, params, body, transaction }) =>
    restoreMotif(user, params.id, { from: params.version, version: body.version }, transaction),
});
