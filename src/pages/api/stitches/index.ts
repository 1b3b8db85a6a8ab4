import { listQuery } from '../../../schemas/fields';
import {
  ownStitchInput,
  ownStitchListSchema,
  presentedOwnStitchSchema,
} from '../../../schemas/ownStitch';
import { createOwnStitch } from '../../../server/commands/createOwnStitch';
import { STITCH_EXAMPLE } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { listOwnStitches } from '../../../server/queries/ownStitches';

export const GET = handle({
  summary: 'List the stitches of my own',
  who: 'signed-in',
  query: listQuery,
  response: ownStitchListSchema,
  example: { query: { limit: '20' } },
  run: ({ user, query }) => listOwnStitches(user, query),
});

export const POST = handle({
  summary: 'Add a stitch of my own by its moves',
  who: 'signed-in',
  body: ownStitchInput,
  response: presentedOwnStitchSchema,
  status: 201,
  example: { body: STITCH_EXAMPLE },
  run: ({ user, body, transaction }) => createOwnStitch(user, body, transaction),
});
