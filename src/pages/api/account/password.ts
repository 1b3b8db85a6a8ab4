import { changePasswordSchema, ownerSchema } from '../../../schemas/account';
import { changePassword } from '../../../server/commands/changePassword';
import { handle } from '../../../server/handle';
import { sendLetter } from '../../../server/mail';
import { setSessionCookie } from '../../../server/sessionCookie';

export const PUT = handle({
  summary: 'Change my password',
  description: 'Ends every other session of the account.',
  who: 'signed-in',
  limit: 'sign-in',
  body: changePasswordSchema,
  response: ownerSchema,
  example: { body: { currentPassword: 'seventeen skeins', password: 'eighteen skeins' } },
  async run({ user, body, transaction, url, now, cookies }) {
    const call = { origin: url.origin, transaction, now };
    const changed = await changePassword(user.id, body, call);
    return async () => {
      await setSessionCookie(cookies, url, changed.user);
      await sendLetter(changed.letter);
      return { email: changed.user.email };
    };
  },
});
