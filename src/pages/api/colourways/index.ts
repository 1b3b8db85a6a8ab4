import { colourwayInput, colourwaySchema } from '../../../schemas/yarn';
import { createColourway } from '../../../server/commands/createColourway';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';

export const POST = handle({
  summary: 'Add a colourway to a yarn of mine',
  who: 'signed-in',
  body: colourwayInput,
  response: colourwaySchema,
  status: 201,
  example: { body: { yarnId: EXAMPLE_ID, name: 'Lock Gate', hex: '#3b4a3f' } },
  run: ({ user, body, transaction }) => createColourway(user, body, transaction),
});
