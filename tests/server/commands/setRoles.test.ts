import { setTimeout } from 'node:timers/promises';
import { beforeEach, describe, expect, it } from 'vitest';
import { sequelize } from '../../../db/models';
import { setRoles } from '../../../src/server/commands/setRoles';
import { emptyDatabase } from '../../support/database';
import { buildUser } from '../../support/factories';

beforeEach(emptyDatabase);

describe('setRoles', () => {
  it('waits for another who is removing an administrator, and then keeps the last', async () => {
    const ada = await buildUser({ name: 'Ada', roles: ['administrator'] });
    const bram = await buildUser({ name: 'Bram', roles: ['administrator'] });
    const change = { roles: ['maker' as const], version: 1 };

    const first = await sequelize.transaction();
    await setRoles(ada, bram.id, change, first);
    const second = sequelize.transaction((transaction) =>
      setRoles(bram, ada.id, change, transaction),
    );
    const refused = expect(second).rejects.toMatchObject({ code: 'last-administrator' });
    // Time enough for the second to read both administrators, if nothing made it wait.
    await setTimeout(300);
    await first.commit();
    await refused;
  });
});
