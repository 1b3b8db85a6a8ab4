import { preferencesChangeSchema, preferencesSchema } from '../../../schemas/preferences';
import { changePreferences } from '../../../server/commands/changePreferences';
import { handle } from '../../../server/handle';

export const PATCH = handle({
  summary: 'Change some of my preferences',
  who: 'signed-in',
  body: preferencesChangeSchema,
  response: preferencesSchema,
  example: { body: { units: 'imperial', currency: 'GBP' } },
  async run({ user, preferences, body, transaction }) {
    await changePreferences(user.id, body, transaction);
    return { ...preferences, ...body };
  },
});
