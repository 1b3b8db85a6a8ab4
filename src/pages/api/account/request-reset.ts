import { acceptedSchema, emailOnlySchema } from '../../../schemas/account';
import { mailInBackground } from '../../../server/background';
import { requestReset } from '../../../server/commands/requestReset';
import { handle } from '../../../server/handle';
import { limitCall } from '../../../server/rateLimit';

export const POST = handle({
  summary: 'Ask for a link to choose a new password',
  description: 'The answer is the same whether or not the address has an account.',
  who: 'anyone',
  limit: 'sign-in',
  body: emailOnlySchema,
  response: acceptedSchema,
  example: { body: { email: 'odile@example.com' } },
  async run({ body: { email }, url: { origin }, now }) {
    await limitCall('mail', email);
    return async () => {
      mailInBackground((transaction) => requestReset(email, { origin, transaction, now }));
      return { isAccepted: true };
    };
  },
});
