import { acceptedSchema, emailOnlySchema } from '../../../schemas/account';
import { mailInBackground } from '../../../server/background';
import { resendConfirmation } from '../../../server/commands/resendConfirmation';
import { handle } from '../../../server/handle';
import { limitCall } from '../../../server/rateLimit';

export const POST = handle({
  summary: 'Send the confirmation letter again',
  description: 'The answer is the same whether or not an account waits to be confirmed.',
  who: 'anyone',
  limit: 'sign-in',
  body: emailOnlySchema,
  response: acceptedSchema,
  example: { body: { email: 'odile@example.com' } },
  async run({ body: { email }, url: { origin }, now }) {
    await limitCall('mail', email);
    return async () => {
      mailInBackground((transaction) => resendConfirmation(email, { origin, transaction, now }));
      return { isAccepted: true };
    };
  },
});
