import { describe, expect, it } from 'vitest';
import { emailSchema, newPasswordSchema, personNameSchema } from '../../src/schemas/account';

const messages = (result: { error?: { issues: { message: string }[] } }) =>
  result.error?.issues.map(({ message }) => message);

describe('emailSchema', () => {
  it('writes one address one way', () => {
    expect(emailSchema.parse('  Odile.M+wool@Example.COM ')).toBe('odile.m+wool@example.com');
  });

  it.each([
    'odile',
    'odile@',
    '@example.com',
    'a b@example.com',
    'odile@example',
    'a@b@example.com',
  ])('refuses %s', (text) => {
    expect(messages(emailSchema.safeParse(text))).toEqual([
      'Enter an address like name@example.com.',
    ]);
  });

  it('refuses line breaks, which could add a header to a letter', () => {
    expect(emailSchema.safeParse('odile@example.com\nBcc: all@example.com').success).toBe(false);
  });
});

describe('newPasswordSchema', () => {
  it.each([
    ['', ['Choose a password.']],
    ['ninechars', ['Use at least 10 characters; this has 9.']],
    ['aaaaaaaaaaaa', ['Use at least 4 different characters.']],
    ['x1'.repeat(64), ['Use at least 4 different characters.']],
    ['seventeen skeins'.repeat(9), ['Use at most 128 characters.']],
  ])('says what "%s" lacks', (password, expected) => {
    expect(messages(newPasswordSchema.safeParse(password))).toEqual(expected);
  });

  it('keeps spaces, also at the ends', () => {
    expect(newPasswordSchema.parse('  ten chars ')).toBe('  ten chars ');
  });
});

describe('personNameSchema', () => {
  it('takes names of every script, composed and trimmed', () => {
    expect(personNameSchema.parse(' Zoe\u0308 佐藤 ')).toBe('Zoë 佐藤');
  });

  it.each(['Odile\nMarchetti', 'Odile\u0000', '\u001b[31mOdile'])('refuses %j', (name) => {
    expect(personNameSchema.safeParse(name).success).toBe(false);
  });
});
