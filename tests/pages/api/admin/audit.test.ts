import { describe, expect, it } from 'vitest';
import { GET } from '../../../../src/pages/api/admin/audit';
import { WORKING_ROLES } from '../../../../src/schemas/roles';
import { callRoute } from '../../../support/callRoute';
import { buildUser } from '../../../support/factories';

describe('GET /api/admin/audit', () => {
  it('is for administrators alone', async () => {
    expect((await callRoute(GET)).status).toBe(401);
    for (const role of WORKING_ROLES) {
      const user = await buildUser({ roles: [role] });
      expect((await callRoute(GET, { user })).status).toBe(403);
    }
  });

  it('refuses pages that are none', async () => {
    const user = await buildUser({ roles: ['administrator'] });
    const { status, json } = await callRoute(GET, { user, url: '/api/admin/audit?page=0' });
    expect(status).toBe(400);
    expect(json.error.fields).toEqual({ page: 'A page is a whole number from 1 to 10000.' });
  });
});
