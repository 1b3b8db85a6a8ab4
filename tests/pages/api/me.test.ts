import { describe, expect, it } from 'vitest';
import { GET } from '../../../src/pages/api/me';
import { callRoute } from '../../support/callRoute';
import { buildUser } from '../../support/factories';

describe('GET /api/me', () => {
  it('is for whoever is signed in', async () => {
    expect((await callRoute(GET)).status).toBe(401);
  });

  it('answers the account, and nothing of its password', async () => {
    const user = await buildUser({ roles: ['seller', 'maker'] });
    const { status, json } = await callRoute(GET, { user });
    expect(status).toBe(200);
    expect(json).toEqual({
      id: user.id,
      name: 'Tamsin Okafor',
      email: user.email,
      roles: ['maker', 'seller'],
      preferences: { units: 'metric', terms: 'us', theme: 'system', currency: 'EUR' },
      pendingEmail: null,
      version: 1,
    });
  });
});
