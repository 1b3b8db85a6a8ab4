import { describe, expect, it } from 'vitest';
import { hashPassword, verifyPassword } from '../../src/server/passwordHash';

describe('hashPassword', () => {
  it('makes an argon2id hash of 19 MiB, 2 passes and 1 lane', async () => {
    // The least that OWASP's Password Storage Cheat Sheet asks for of argon2id.
    expect(await hashPassword('seventeen skeins')).toMatch(
      /^\$argon2id\$v=19\$m=19456,t=2,p=1\$[\w+/]{22}\$[\w+/]{43}$/,
    );
  });

  it('salts: one password twice is two hashes', async () => {
    expect(await hashPassword('seventeen skeins')).not.toBe(await hashPassword('seventeen skeins'));
  });
});

describe('verifyPassword', () => {
  it('knows the right password from a wrong one', async () => {
    const hashed = await hashPassword('seventeen skeins');
    expect(await verifyPassword('seventeen skeins', hashed)).toBe(true);
    expect(await verifyPassword('Seventeen skeins', hashed)).toBe(false);
  });

  it('takes composed and decomposed letters as the same', async () => {
    const hashed = await hashPassword('caf\u00e9 au lait');
    expect(await verifyPassword('cafe\u0301 au lait', hashed)).toBe(true);
  });

  it('never lets anyone in where there is no account, not even with the password of nothing', async () => {
    expect(await verifyPassword('no account has this', null)).toBe(false);
  });
});
