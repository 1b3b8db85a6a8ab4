import { letterSchema, registerSchema } from '../../../schemas/account';
import { registerAccount } from '../../../server/commands/registerAccount';
import { handle } from '../../../server/handle';
import { sendLetter } from '../../../server/mail';

export const POST = handle({
  summary: 'Register',
  description:
    'Sends a letter to the address: with a link to confirm it, or, when it has an account already, saying so. The answer is the same.',
  who: 'anyone',
  limit: 'sign-in',
  body: registerSchema,
  response: letterSchema,
  status: 201,
  example: {
    body: {
      name: 'Odile Marchetti',
      email: 'odile@example.com',
      password: 'seventeen skeins',
      roles: ['maker', 'designer'],
    },
  },
  async run({ body, transaction, url, now }) {
    const letter = await registerAccount(body, { origin: url.origin, transaction, now });
    return async () => ({ isMailSent: await sendLetter(letter) });
  },
});
