import { idParams } from '../../../../schemas/fields';
import { makingInput, makingSchema } from '../../../../schemas/making';
import { markMaking } from '../../../../server/commands/markMaking';
import { EXAMPLE_ID, OTHER_EXAMPLE_ID } from '../../../../server/examples';
import { handle } from '../../../../server/handle';
import { getMaking } from '../../../../server/queries/making';

export const GET = handle({
  summary: 'How far a blanket is made',
  who: 'signed-in',
  params: idParams,
  response: makingSchema,
  errors: ['not-found', 'gone'],
  example: { params: { id: EXAMPLE_ID } },
  run: ({ user, params }) => getMaking(user, params.id),
});

export const POST = handle({
  summary: 'Mark motifs as made, weigh what is left, choose the order',
  description:
    'Marks carry the moment they were made, so that devices that were offline can send theirs later: ' +
    'of two marks of one thing the later counts, and the same mark twice is one. Answers with everything marked.',
  who: 'signed-in',
  params: idParams,
  body: makingInput,
  response: makingSchema,
  errors: ['not-found', 'gone'],
  example: {
    params: { id: EXAMPLE_ID },
    body: {
      ticks: [{ motif: 'm0:0', done: true, at: '2026-11-30T18:00:00Z' }],
      weighings: [
        {
          id: OTHER_EXAMPLE_ID,
          colour: 'c1',
          leftG: 62,
          resolutionG: 1,
          made: { dc: 480, ch: 96 },
          tails: 16,
          gone: false,
          at: '2026-11-30T18:05:00Z',
        },
      ],
      order: { order: 'outwards', at: '2026-11-30T17:00:00Z' },
    },
  },
  run: ({ user, params, body, now, transaction }) =>
    markMaking(user, params.id, body, now, transaction),
});
