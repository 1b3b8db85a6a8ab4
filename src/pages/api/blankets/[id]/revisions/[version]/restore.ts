import { blanketSchema } from '../../../../../../schemas/blanket';
import { restoreInput, saveParams } from '../../../../../../schemas/fields';
import { restoreRevision } from '../../../../../../server/commands/restoreRevision';
import { EXAMPLE_ID } from '../../../../../../server/examples';
import { handle } from '../../../../../../server/handle';

export const POST = handle({
  summary: 'Save an older save of a blanket again',
  description: 'It becomes the newest save; nothing saved since is lost.',
  who: 'signed-in',
  params: saveParams,
  body: restoreInput,
  response: blanketSchema,
  errors: ['not-found', 'conflict', 'gone'],
  example: { params: { id: EXAMPLE_ID, version: '3' }, body: { version: 7 } },
  run: ({ user, params, body, transaction }) =>
    restoreRevision(user, params.id, { from: params.version, version: body.version }, transaction),
});
