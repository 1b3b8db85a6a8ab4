import { idParams } from '../../../schemas/fields';
import { yarnSchema, yarnUpdate } from '../../../schemas/yarn';
import { nothingSchema } from '../../../schemas/schema';
import { deleteYarn } from '../../../server/commands/deleteYarn';
import { updateYarn } from '../../../server/commands/updateYarn';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { getYarn } from '../../../server/queries/yarns';

export const GET = handle({
  summary: 'Get a yarn of mine',
  who: 'signed-in',
  params: idParams,
  response: yarnSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getYarn(user, params.id),
});

export const PUT = handle({
  summary: 'Change a yarn of mine',
  who: 'signed-in',
  params: idParams,
  body: yarnUpdate,
  response: yarnSchema,
  errors: ['not-found', 'conflict'],
  example: {
    params: { id: EXAMPLE_ID },
    body: {
      name: 'Towpath DK',
      maker: 'Ostler & Fenn',
      fibre: '100 % wool',
      weightCategory: 3,
      putUp: { massG: 100, lengthM: 240 },
      price: { priceMinor: 720, currency: 'EUR' },
      version: 1,
    },
  },
  run: ({ user, params, body, transaction }) => updateYarn(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Delete a yarn of mine',
  description: 'Its colourways go with it, swatches stay. Refused while it is in the stash.',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found', 'in-use'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => deleteYarn(user, params.id, transaction),
});
