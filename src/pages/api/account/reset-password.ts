import { ownerSchema, resetPasswordSchema } from '../../../schemas/account';
import { resetPassword } from '../../../server/commands/resetPassword';
import { handle } from '../../../server/handle';
import { sendLetter } from '../../../server/mail';

export const POST = handle({
  summary: 'Choose a new password by the token of its letter',
  description: 'Ends every session of the account.',
  who: 'anyone',
  limit: 'sign-in',
  body: resetPasswordSchema,
  response: ownerSchema,
  errors: ['gone'],
  example: {
    body: {
      token: 'Zk3v0yq8Jw2uB6nD1sXrT9fLhC5aPgQeM7iOoVbRtKU',
      password: 'eighteen skeins',
    },
  },
  async run({ body, transaction, url, now }) {
    const letter = await resetPassword(body, { origin: url.origin, transaction, now });
    return async () => {
      await sendLetter(letter);
      return { email: letter.to };
    };
  },
});
