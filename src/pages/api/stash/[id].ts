import { idParams } from '../../../schemas/fields';
import { lotSchema, lotUpdate } from '../../../schemas/stash';
import { nothingSchema } from '../../../schemas/schema';
import { deleteLot } from '../../../server/commands/deleteLot';
import { updateLot } from '../../../server/commands/updateLot';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { getLot } from '../../../server/queries/stash';

export const GET = handle({
  summary: 'Get a dye lot of my stash',
  who: 'signed-in',
  params: idParams,
  response: lotSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getLot(user, params.id),
});

export const PUT = handle({
  summary: 'Change a dye lot of my stash',
  who: 'signed-in',
  params: idParams,
  body: lotUpdate,
  response: lotSchema,
  errors: ['not-found', 'conflict'],
  example: {
    params: { id: EXAMPLE_ID },
    body: {
      lotCode: '2207',
      location: 'Blue basket',
      pricePaid: { priceMinor: 720, currency: 'EUR' },
      wholeSkeins: 3,
      partSkeins: [{ massG: 41 }],
      version: 1,
    },
  },
  run: ({ user, params, body, transaction }) => updateLot(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Remove a dye lot from my stash',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => deleteLot(user, params.id, transaction),
});
