import {
  blanketShoppingSchema,
  colourLinkInput,
  colourLinkParams,
} from '../../../../../schemas/shoppingList';
import { linkColour, unlinkColour } from '../../../../../server/commands/linkColour';
import { EXAMPLE_ID, OTHER_EXAMPLE_ID } from '../../../../../server/examples';
import { handle } from '../../../../../server/handle';

export const PUT = handle({
  summary: 'Let a colourway of my stash serve a colour of a blanket, or none',
  who: 'signed-in',
  params: colourLinkParams,
  body: colourLinkInput,
  response: blanketShoppingSchema,
  errors: ['not-found', 'gone'],
  example: {
    params: { id: EXAMPLE_ID, colour: 'c1' },
    body: { colourwayId: OTHER_EXAMPLE_ID },
  },
  run: ({ user, params, body, transaction }) =>
    linkColour(user, params.id, params.colour, body.colourwayId, transaction),
});

export const DELETE = handle({
  summary: 'Match a colour of a blanket with my stash by its name again',
  who: 'signed-in',
  params: colourLinkParams,
  response: blanketShoppingSchema,
  errors: ['not-found', 'gone'],
  example: { params: { id: EXAMPLE_ID, colour: 'c1' } },
  run: ({ user, params, transaction }) => unlinkColour(user, params.id, params.colour, transaction),
});
