import { joiningOrder } from '../../lib/joining/joiningOrder';
import { joiningOrderInput, joiningOrderSchema } from '../../schemas/joiningOrder';
import { handle } from '../../server/handle';

export const POST = handle({
  summary: 'Order the joining of a layout',
  description:
    'Anyone may ask; nothing is kept. Every motif in the order it is made, the sides that link and to which motif, ' +
    'and the corners that link or, where to is null, are left open for the motif across. ' +
    'Rows and columns count from 1; second motifs (squares between octagons, small ones beside large) are numbered apart.',
  who: 'anyone',
  stateless: true,
  limit: 'heavy',
  body: joiningOrderInput,
  response: joiningOrderSchema,
  example: {
    body: { layout: 'square', rows: 2, columns: 3, corners: 'crossed', order: 'row-by-row' },
  },
  run: ({ body: { layout, edge, rows, columns, corners, order } }) => ({
    steps: joiningOrder({ layout, edge }, rows, columns, corners, order),
  }),
});
