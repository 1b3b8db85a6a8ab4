import { accountSchema } from '../../schemas/user';
import { handle } from '../../server/handle';
import { findAccount } from '../../server/queries/account';

export const GET = handle({
  summary: 'My account, with my preferences',
  who: 'signed-in',
  response: accountSchema,
  example: {},
  run: ({ user }) => findAccount(user.id),
});
