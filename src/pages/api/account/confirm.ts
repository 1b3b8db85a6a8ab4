import { confirmSchema, ownerSchema } from '../../../schemas/account';
import { confirmEmail } from '../../../server/commands/confirmEmail';
import { handle } from '../../../server/handle';

export const POST = handle({
  summary: 'Confirm an e-mail address by the token of its letter',
  who: 'anyone',
  limit: 'sign-in',
  body: confirmSchema,
  response: ownerSchema,
  errors: ['gone', 'conflict'],
  example: { body: { token: 'Zk3v0yq8Jw2uB6nD1sXrT9fLhC5aPgQeM7iOoVbRtKU' } },
  async run({ body, transaction, now }) {
    const { email } = await confirmEmail(body.token, { transaction, now });
    return { email };
  },
});
