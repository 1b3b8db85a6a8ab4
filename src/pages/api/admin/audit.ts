import { auditQuerySchema, auditSchema } from '../../../schemas/people';
import { handle } from '../../../server/handle';
import { listAudit } from '../../../server/queries/people';

export const GET = handle({
  summary: 'List who changed whose roles, newest first',
  who: ['administrator'],
  query: auditQuerySchema,
  response: auditSchema,
  example: { query: { page: '1' } },
  run: ({ query }) => listAudit(query.page),
});
