import { describe, expect, it } from 'vitest';
import { readSignInRefusal } from '../../src/client/signIn';

describe('readSignInRefusal', () => {
  it.each([
    ['', null],
    ['email=a@example.com', null],
    ['error=CredentialsSignin&code=wrong', 'wrong'],
    ['error=CredentialsSignin&code=unconfirmed', 'unconfirmed'],
    ['error=CredentialsSignin&code=too-many', 'too-many'],
    ['error=Configuration', 'failed'],
    ['error=CredentialsSignin&code=%3Cscript%3E', 'failed'],
  ])('of "%s" is %s', (query, refusal) => {
    expect(readSignInRefusal(new URLSearchParams(query))).toBe(refusal);
  });
});
