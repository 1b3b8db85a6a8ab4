import {
  madeMotifInput,
  madeMotifListSchema,
  madeMotifSchema,
  madeMotifsQuery,
} from '../../../schemas/madeMotif';
import { createMadeMotif } from '../../../server/commands/createMadeMotif';
import { MADE_MOTIF_EXAMPLE } from '../../../server/examples';
import { handle } from '../../../server/handle';
import { listMadeMotifs } from '../../../server/queries/madeMotifs';

export const GET = handle({
  summary: 'List the motifs I made and measured, all or those of one motif',
  who: 'signed-in',
  query: madeMotifsQuery,
  response: madeMotifListSchema,
  example: { query: { motif: 'group-square', limit: '20' } },
  run: ({ user, query: { motif, ...page } }) => listMadeMotifs(user, motif, page),
});

export const POST = handle({
  summary: 'Keep what a motif I made measures and weighs',
  who: 'signed-in',
  body: madeMotifInput,
  response: madeMotifSchema,
  status: 201,
  example: { body: MADE_MOTIF_EXAMPLE },
  run: ({ user, body, transaction }) => createMadeMotif(user, body, transaction),
});
