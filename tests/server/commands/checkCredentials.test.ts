import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { checkCredentials } from '../../../src/server/commands/checkCredentials';
import { buildUserRow, PASSWORD } from '../../support/factories';

const somewhere = () => randomUUID();

describe('checkCredentials', () => {
  it('accepts the right password, however the address is typed', async () => {
    const { id, email } = await buildUserRow();
    const check = await checkCredentials(
      { email: ` ${email.toUpperCase()} `, password: PASSWORD },
      somewhere(),
    );
    expect(check).toMatchObject({ accepted: { id } });
  });

  it.each([
    ['a wrong password', { password: 'not mine' }],
    ['an unknown address', { email: 'nobody@example.com' }],
    ['no address', { email: '' }],
    ['no password', { password: undefined }],
  ])('refuses %s with the same answer', async (_, change) => {
    const { email } = await buildUserRow();
    const check = await checkCredentials({ email, password: PASSWORD, ...change }, somewhere());
    expect(check).toEqual({ refused: 'wrong' });
  });

  it('says that an address is to be confirmed after the right password, and not before', async () => {
    const { email } = await buildUserRow({ isConfirmed: false });
    expect(await checkCredentials({ email, password: PASSWORD }, somewhere())).toEqual({
      refused: 'unconfirmed',
    });
    expect(await checkCredentials({ email, password: 'not mine' }, somewhere())).toEqual({
      refused: 'wrong',
    });
  });

  it('refuses even the right password after ten wrong ones from one place, and not elsewhere', async () => {
    const { email } = await buildUserRow();
    const place = somewhere();
    for (let guess = 0; guess < 10; guess += 1) {
      await checkCredentials({ email, password: `guess ${guess}` }, place);
    }
    expect(await checkCredentials({ email, password: PASSWORD }, place)).toEqual({
      refused: 'too-many',
    });
    expect(await checkCredentials({ email, password: PASSWORD }, somewhere())).toHaveProperty(
      'accepted',
    );
  });

  it('counts guesses that are made at the same moment', async () => {
    const { email } = await buildUserRow();
    const place = somewhere();
    const guesses = Array.from({ length: 15 }, (_, guess) =>
      checkCredentials({ email, password: `guess ${guess}` }, place),
    );
    const checks = await Promise.all(guesses);
    expect(checks.filter((check) => 'refused' in check && check.refused === 'wrong')).toHaveLength(
      10,
    );
  });

  it('begins to count anew after the right password', async () => {
    const { email } = await buildUserRow();
    const place = somewhere();
    for (let round = 0; round < 2; round += 1) {
      for (let guess = 0; guess < 9; guess += 1) {
        await checkCredentials({ email, password: `guess ${guess}` }, place);
      }
      const check = await checkCredentials({ email, password: PASSWORD }, place);
      expect(check).toHaveProperty('accepted');
    }
  });
});
