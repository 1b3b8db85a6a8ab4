import { personParamsSchema, personSchema, rolesChangeSchema } from '../../../../../schemas/people';
import { setRoles } from '../../../../../server/commands/setRoles';
import { handle } from '../../../../../server/handle';
import { presentPerson } from '../../../../../server/presenters/people';

export const PUT = handle({
  summary: "Set a person's roles",
  description: 'The change is written down with who made it. The last administrator stays one.',
  who: ['administrator'],
  params: personParamsSchema,
  body: rolesChangeSchema,
  response: personSchema,
  errors: ['not-found', 'conflict', 'last-administrator'],
  example: {
    params: { id: '5f0c2a54-7c1e-4c52-9a39-5b2f0f6f0b11' },
    body: { roles: ['teacher', 'administrator'], version: 3 },
  },
  async run({ user, params, body, transaction }) {
    return presentPerson(await setRoles(user, params.id, body, transaction));
  },
});
