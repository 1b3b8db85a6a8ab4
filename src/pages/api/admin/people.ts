import { peopleQuerySchema, peopleSchema } from '../../../schemas/people';
import { handle } from '../../../server/handle';
import { listPeople } from '../../../server/queries/people';

export const GET = handle({
  summary: 'List people, or those whose name or address holds a text',
  who: ['administrator'],
  query: peopleQuerySchema,
  response: peopleSchema,
  example: { query: { search: 'odile', page: '1' } },
  run: ({ query }) => listPeople(query),
});
