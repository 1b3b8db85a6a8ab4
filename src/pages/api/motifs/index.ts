import { listOf, listQuery } from '../../../schemas/fields';
import { motifInput, motifSummarySchema, presentedMotifSchema } from '../../../schemas/motif';
import { createMotif } from '../../../server/commands/createMotif';
import { MOTIF_EXAMPLE } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { listMotifs } from '../../../server/queries/motifs';

export const GET = handle({
  summary: 'List the ready-made motifs and my own',
  who: 'anyone',
  query: listQuery,
  response: listOf(motifSummarySchema),
  example: { query: { limit: '20' } },
  run: ({ user, query }) => listMotifs(user, query),
});

export const POST = handle({
  summary: 'Add a motif of my own, as its pattern',
  description: 'Its rounds are worked from the text. A text with errors is kept too.',
  who: 'signed-in',
  limit: 'heavy',
  body: motifInput,
  response: presentedMotifSchema,
  status: 201,
  example: { body: MOTIF_EXAMPLE },
  run: ({ user, body, transaction }) => createMotif(user, body, transaction),
});
