import { listOf, listQuery } from '../../../schemas/fields';
import { swatchInput, swatchSchema } from '../../../schemas/swatch';
import { createSwatch } from '../../../server/commands/createSwatch';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { listSwatches } from '../../../server/queries/swatches';

export const GET = handle({
  summary: 'List my swatches',
  who: 'signed-in',
  query: listQuery,
  response: listOf(swatchSchema),
  example: { query: { limit: '20' } },
  run: ({ user, query }) => listSwatches(user, query),
});

export const POST = handle({
  summary: 'Add a swatch',
  who: 'signed-in',
  body: swatchInput,
  response: swatchSchema,
  status: 201,
  example: {
    body: {
      name: 'Sc in Towpath, 4.5 mm',
      yarnId: EXAMPLE_ID,
      stitch: 'sc',
      stitches: 20,
      rows: 24,
      hookMm: 4.5,
      notes: '',
      measurements: [
        { kind: 'size', measuredOn: '2026-11-08', widthMm: 140, heightMm: 154, blocked: false },
        { kind: 'weight', measuredOn: '2026-11-08', massG: 14, resolutionG: 1 },
      ],
    },
  },
  run: ({ user, body, transaction }) => createSwatch(user, body, transaction),
});
