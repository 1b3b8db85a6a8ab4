import { idParams } from '../../../schemas/fields';
import { swatchSchema, swatchUpdate } from '../../../schemas/swatch';
import { nothingSchema } from '../../../schemas/schema';
import { deleteSwatch } from '../../../server/commands/deleteSwatch';
import { updateSwatch } from '../../../server/commands/updateSwatch';
import { EXAMPLE_ID } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { getSwatch } from '../../../server/queries/swatches';

export const GET = handle({
  summary: 'Get a swatch of mine',
  who: 'signed-in',
  params: idParams,
  response: swatchSchema,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getSwatch(user, params.id),
});

export const PUT = handle({
  summary: 'Change a swatch of mine',
  who: 'signed-in',
  params: idParams,
  body: swatchUpdate,
  response: swatchSchema,
  errors: ['not-found', 'conflict'],
  example: {
    params: { id: EXAMPLE_ID },
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
      version: 1,
    },
  },
  run: ({ user, params, body, transaction }) => updateSwatch(user, params.id, body, transaction),
});

export const DELETE = handle({
  summary: 'Delete a swatch of mine',
  who: 'signed-in',
  params: idParams,
  response: nothingSchema,
  status: 204,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params, transaction }) => deleteSwatch(user, params.id, transaction),
});
