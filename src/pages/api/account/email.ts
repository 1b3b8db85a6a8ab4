import { changeEmailSchema, letterSchema } from '../../../schemas/account';
import { requestEmailChange } from '../../../server/commands/requestEmailChange';
import { handle } from '../../../server/handle';
import { sendLetter } from '../../../server/mail';

export const PUT = handle({
  summary: 'Ask to use another e-mail address',
  description: 'The address changes when the link of the letter sent to it is followed.',
  who: 'signed-in',
  limit: 'sign-in',
  body: changeEmailSchema,
  response: letterSchema,
  example: { body: { email: 'odile.m@example.com', password: 'seventeen skeins' } },
  async run({ user, body, transaction, url, now }) {
    const call = { origin: url.origin, transaction, now };
    const { toNew, toOld } = await requestEmailChange(user.id, body, call);
    return async () => {
      const [isMailSent] = await Promise.all([sendLetter(toNew), sendLetter(toOld)]);
      return { isMailSent };
    };
  },
});
