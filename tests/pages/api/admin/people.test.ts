import { beforeEach, describe, expect, it } from 'vitest';
import { GET } from '../../../../src/pages/api/admin/people';
import { WORKING_ROLES } from '../../../../src/schemas/roles';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildUser } from '../../../support/factories';

beforeEach(emptyDatabase);

async function list(query = '') {
  const user = await buildUser({ name: 'Zadie Administrator', roles: ['administrator'] });
  return callRoute(GET, { user, url: `/api/admin/people?${query}` });
}
const names = (json: { people: { name: string }[] }) => json.people.map(({ name }) => name);

describe('GET /api/admin/people', () => {
  it('is for administrators alone', async () => {
    expect((await callRoute(GET)).status).toBe(401);
    for (const role of WORKING_ROLES) {
      const user = await buildUser({ roles: [role] });
      expect((await callRoute(GET, { user })).status).toBe(403);
    }
  });

  it('lists everyone by name with their roles', async () => {
    await buildUser({ name: 'Odile Marchetti', roles: ['teacher', 'maker'], isConfirmed: false });
    const { status, json } = await list();
    expect(status).toBe(200);
    expect(json).toMatchObject({
      totalCount: 2,
      page: 1,
      pageCount: 1,
      people: [
        { name: 'Odile Marchetti', roles: ['maker', 'teacher'], isConfirmed: false, version: 1 },
        { name: 'Zadie Administrator', roles: ['administrator'], isConfirmed: true },
      ],
    });
    expect(JSON.stringify(json)).not.toContain('argon2');
  });

  it('searches names and addresses, in any case, and takes % as itself', async () => {
    await buildUser({ name: 'Odile 100% Wool', email: 'odile@example.com' });
    await buildUser({ name: 'Bram de Wit', email: 'bram@example.org' });
    expect(names((await list('search=ODILE')).json)).toEqual(['Odile 100% Wool']);
    expect(names((await list('search=example.org')).json)).toEqual(['Bram de Wit']);
    expect(names((await list('search=%25')).json)).toEqual(['Odile 100% Wool']);
    expect(names((await list('search=_')).json)).toEqual([]);
  });

  it('sorts by name, address or day, up or down', async () => {
    await buildUser({ name: 'Bram', email: 'z@wool.example' });
    await buildUser({ name: 'Odile', email: 'a@wool.example' });
    const sorted = async (query: string) =>
      names((await list(`search=wool.example&${query}`)).json);
    expect(await sorted('sort=email')).toEqual(['Odile', 'Bram']);
    expect(await sorted('sort=name')).toEqual(['Bram', 'Odile']);
    expect(await sorted('sort=name&direction=down')).toEqual(['Odile', 'Bram']);
    expect(await sorted('sort=registered')).toEqual(['Bram', 'Odile']);
    const { json } = await list('sort=password&direction=left');
    expect(json.error.fields).toEqual({
      sort: 'Sort by name, email or registered.',
      direction: 'A direction is up or down.',
    });
  });

  it('pages by fifty', async () => {
    for (let person = 0; person < 50; person += 1) await buildUser({ name: `Person ${person}` });
    const first = await list('page=1');
    const second = await list('page=2');
    expect(first.json.people).toHaveLength(50);
    expect(second.json).toMatchObject({ totalCount: 52, page: 2, pageCount: 2 });
    expect(second.json.people).toHaveLength(2);
  });

  it('refuses pages that are none, and long searches', async () => {
    for (const page of ['0', '-1', '1.5', 'x', '99999']) {
      const { status, json } = await list(`page=${page}`);
      expect(status).toBe(400);
      expect(json.error.fields).toEqual({ page: 'A page is a whole number from 1 to 10000.' });
    }
    const { json } = await list(`search=${'x'.repeat(101)}`);
    expect(json.error.fields).toEqual({ search: 'Search for at most 100 characters.' });
  });
});
