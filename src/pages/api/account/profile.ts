import { profileSchema } from '../../../schemas/account';
import { accountSchema } from '../../../schemas/user';
import { changeProfile } from '../../../server/commands/changeProfile';
import { handle } from '../../../server/handle';
import { presentAccount } from '../../../server/presenters/user';

export const PUT = handle({
  summary: 'Change my name and the roles I work as',
  who: 'signed-in',
  body: profileSchema,
  response: accountSchema,
  errors: ['conflict'],
  example: { body: { name: 'Odile Marchetti', roles: ['maker', 'teacher'], version: 1 } },
  async run({ user, body, transaction }) {
    return presentAccount(await changeProfile(user.id, body, transaction));
  },
});
