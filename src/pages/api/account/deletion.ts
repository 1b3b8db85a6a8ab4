import { deleteAccountSchema } from '../../../schemas/account';
import { nothingSchema } from '../../../schemas/schema';
import { deleteAccount } from '../../../server/commands/deleteAccount';
import { handle } from '../../../server/handle';
import { clearSessionCookie } from '../../../server/sessionCookie';

export const POST = handle({
  summary: 'Delete my account and all that belongs to it',
  who: 'signed-in',
  limit: 'sign-in',
  body: deleteAccountSchema,
  response: nothingSchema,
  status: 204,
  errors: ['last-administrator'],
  example: { body: { password: 'seventeen skeins' } },
  async run({ user, body, transaction, url, cookies }) {
    await deleteAccount(user.id, body.password, transaction);
    return async () => clearSessionCookie(cookies, url);
  },
});
