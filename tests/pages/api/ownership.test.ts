import { randomUUID } from 'node:crypto';
import type { APIRoute } from 'astro';
import { beforeEach, describe, expect, it } from 'vitest';
import { sequelize } from '../../../db/models';
import * as blankets from '../../../src/pages/api/blankets';
import * as blanket from '../../../src/pages/api/blankets/[id]';
import * as colourLink from '../../../src/pages/api/blankets/[id]/colour-links/[colour]';
import * as making from '../../../src/pages/api/blankets/[id]/making';
import * as restore from '../../../src/pages/api/blankets/[id]/restore';
import * as revisions from '../../../src/pages/api/blankets/[id]/revisions';
import * as revision from '../../../src/pages/api/blankets/[id]/revisions/[version]';
import * as restoreRevision from '../../../src/pages/api/blankets/[id]/revisions/[version]/restore';
import * as shopping from '../../../src/pages/api/blankets/[id]/shopping-list';
import * as shoppingCsv from '../../../src/pages/api/blankets/[id]/shopping-list.csv';
import * as colourways from '../../../src/pages/api/colourways';
import * as colourway from '../../../src/pages/api/colourways/[id]';
import * as motifs from '../../../src/pages/api/motifs';
import * as motif from '../../../src/pages/api/motifs/[id]';
import * as motifVersions from '../../../src/pages/api/motifs/[id]/versions';
import * as motifVersion from '../../../src/pages/api/motifs/[id]/versions/[version]';
import * as restoreMotif from '../../../src/pages/api/motifs/[id]/versions/[version]/restore';
import * as shoppingLists from '../../../src/pages/api/shopping-lists';
import * as keptList from '../../../src/pages/api/shopping-lists/[id]';
import * as stash from '../../../src/pages/api/stash';
import * as lot from '../../../src/pages/api/stash/[id]';
import * as stitches from '../../../src/pages/api/stitches';
import * as stitch from '../../../src/pages/api/stitches/[id]';
import * as swatches from '../../../src/pages/api/swatches';
import * as swatch from '../../../src/pages/api/swatches/[id]';
import * as yarns from '../../../src/pages/api/yarns';
import * as yarn from '../../../src/pages/api/yarns/[id]';
import { createShoppingList } from '../../../src/server/commands/createShoppingList';
import type { Route } from '../../../src/server/handle';
import { callRoute } from '../../support/callRoute';
import { emptyDatabase } from '../../support/database';
import {
  buildBlanket,
  buildColourway,
  buildLot,
  buildMotif,
  buildOwnStitch,
  buildSwatch,
  buildUser,
  buildYarn,
} from '../../support/factories';
import type { CurrentUser } from '../../../src/schemas/user';

type Build = (user: CurrentUser) => Promise<{ id: string } | { key: string }>;
const buildList = async (user: CurrentUser) => {
  const { id } = await buildBlanket(user);
  return sequelize.transaction((transaction) => createShoppingList(user, id, transaction));
};

const LISTS: [string, Record<string, APIRoute | unknown>][] = [
  ['yarns', yarns],
  ['colourways', colourways],
  ['stash', stash],
  ['swatches', swatches],
  ['motifs', motifs],
  ['stitches', stitches],
  ['blankets', blankets],
  ['shopping-lists', shoppingLists],
];
const ONE: [string, object, Build][] = [
  ['yarns/[id]', yarn, buildYarn],
  ['colourways/[id]', colourway, buildColourway],
  ['stash/[id]', lot, buildLot],
  ['swatches/[id]', swatch, buildSwatch],
  ['motifs/[id]', motif, buildMotif],
  ['motifs/[id]/versions', motifVersions, buildMotif],
  ['motifs/[id]/versions/[version]', motifVersion, buildMotif],
  ['motifs/[id]/versions/[version]/restore', restoreMotif, buildMotif],
  ['stitches/[id]', stitch, buildOwnStitch],
  ['blankets/[id]', blanket, buildBlanket],
  ['blankets/[id]/making', making, buildBlanket],
  ['blankets/[id]/restore', restore, buildBlanket],
  ['blankets/[id]/revisions', revisions, buildBlanket],
  ['blankets/[id]/revisions/[version]', revision, buildBlanket],
  ['blankets/[id]/revisions/[version]/restore', restoreRevision, buildBlanket],
  ['blankets/[id]/shopping-list', shopping, buildBlanket],
  ['blankets/[id]/shopping-list.csv', shoppingCsv, buildBlanket],
  ['blankets/[id]/colour-links/[colour]', colourLink, buildBlanket],
  ['shopping-lists/[id]', keptList, buildList],
];

const methodsOf = (module: object) =>
  Object.entries(module).filter(([name]) => /^[A-Z]+$/.test(name)) as [string, Route][];
const everyOne = ONE.flatMap(([path, module, build]) =>
  methodsOf(module).map(([method, route]) => ({ method, path, route, build })),
);
const everyList = LISTS.flatMap(([path, module]) =>
  methodsOf(module).map(([method, route]) => ({ method, path, route })),
);

beforeEach(emptyDatabase);

describe('what a person keeps', () => {
  it.each(everyOne)('$method /api/$path answers 401 to a stranger', async ({ method, route }) => {
    const { params, body } = route.spec.example;
    const answer = await callRoute(route, { method, params: params as never, body });
    expect([answer.status, answer.json.error]).toEqual([
      401,
      { code: 'unauthenticated', message: 'Sign in to do this.' },
    ]);
  });

  it.each(everyList.filter(({ route }) => route.spec.who !== 'anyone'))(
    '$method /api/$path answers 401 to a stranger',
    async ({ method, route }) => {
      const answer = await callRoute(route, { method, body: route.spec.example.body });
      expect(answer.status).toBe(401);
    },
  );

  it.each(everyOne)(
    "$method /api/$path answers another person's id as an unknown one, and changes nothing",
    async ({ method, route, build }) => {
      const [owner, other] = [await buildUser(), await buildUser({ roles: ['administrator'] })];
      const row = await build(owner);
      const id = 'id' in row ? row.id : row.key;
      const call = (ofId: string, user: CurrentUser) =>
        callRoute(route, {
          method,
          user,
          params: { ...(route.spec.example.params as object), id: ofId },
          body: route.spec.example.body,
        });
      const before = await rowsOf(owner);
      const foreign = await call(id, other);
      const unknown = await call(randomUUID(), other);
      expect(foreign.status).toBe(404);
      expect(foreign.json).toEqual(unknown.json);
      expect(foreign.json.error.code).toBe('not-found');
      expect(await rowsOf(owner)).toEqual(before);
    },
  );

  it.each(everyOne.filter(({ path }) => path !== 'motifs/[id]'))(
    '$method /api/$path refuses an id that is none',
    async ({ method, route }) => {
      const user = await buildUser();
      const { params, body } = route.spec.example;
      const answer = await callRoute(route, {
        method,
        user,
        params: { ...(params as object), id: "1' or true" },
        body,
      });
      expect([answer.status, answer.json.error.fields.id]).toEqual([
        400,
        'This is not the id of anything kept here',
      ]);
    },
  );
});

/** Everything the owner has, as far as lists show it. */
async function rowsOf(owner: CurrentUser) {
  const routes = [yarns, stash, swatches, motifs, stitches, blankets, shoppingLists];
  return Promise.all(
    routes.map(async ({ GET }) => (await callRoute(GET, { user: owner, url: '/api/x' })).json),
  );
}
