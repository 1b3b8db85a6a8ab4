import { blanketSchema } from '../../../../schemas/blanket';
import { idParams } from '../../../../schemas/fields';
import { restoreBlanket } from '../../../../server/commands/restoreBlanket';
import { EXAMPLE_ID } from '../../../../server/examples';
import { handle } from '../../../../server/handle';

export const POST = handle({
  summary: 'Restore a blanket that was deleted',
  who: 'signed-in',
  params: idParams,
  response: blanketSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => restoreBlanket(user, params.id, transaction),
});
