import type { Letter } from './mail';

/** The site's own address, and what a letter needs to make a link of it. */
interface Link {
  origin: string;
  token: string;
}

export function confirmationLetter(to: string, name: string, { origin, token }: Link): Letter {
  return {
    to,
    subject: 'Confirm your e-mail address',
    paragraphs: [
      `Hello ${name},`,
      'Confirm that this address is yours, and you can sign in. The link works once, within 24 hours.',
      'If you did not ask for this, leave the letter alone: nothing happens without the link.',
    ],
    link: { word: 'Confirm the address', url: `${origin}/confirm?token=${token}` },
  };
}

export function alreadyRegisteredLetter(to: string, name: string, origin: string): Letter {
  return {
    to,
    subject: 'You already have an account',
    paragraphs: [
      `Hello ${name},`,
      'Someone, perhaps you, tried to register with this address, which already has an account. Nothing was changed.',
      'Sign in with it, or choose a new password if the old one is lost.',
    ],
    link: { word: 'Choose a new password', url: `${origin}/reset` },
  };
}

export function resetLetter(to: string, name: string, { origin, token }: Link): Letter {
  return {
    to,
    subject: 'Choose a new password',
    paragraphs: [
      `Hello ${name},`,
      'Here is the link to choose a new password. It works once, within one hour.',
      'If you did not ask for it, leave the letter alone: your password stays as it is.',
    ],
    link: { word: 'Choose a new password', url: `${origin}/reset/${token}` },
  };
}

export function passwordChangedLetter(to: string, name: string, origin: string): Letter {
  return {
    to,
    subject: 'Your password was changed',
    paragraphs: [
      `Hello ${name},`,
      'The password of your account was changed just now, and every other session was ended.',
      'If that was not you, choose a new password at once.',
    ],
    link: { word: 'Choose a new password', url: `${origin}/reset` },
  };
}

/** To the address being left, in case it is not its owner who leaves it. */
export function emailChangingLetter(to: string, name: string, origin: string): Letter {
  return {
    to,
    subject: 'Your e-mail address is being changed',
    paragraphs: [
      `Hello ${name},`,
      'Someone signed in to your account, and with your password, asked to use another e-mail address for it. It changes when the new address is confirmed.',
      'If that was not you, choose a new password at once.',
    ],
    link: { word: 'Choose a new password', url: `${origin}/reset` },
  };
}

/** To the owner of an account whose address another account asked to use. */
export function addressInUseLetter(to: string, name: string, origin: string): Letter {
  return {
    to,
    subject: 'This address already has an account',
    paragraphs: [
      `Hello ${name},`,
      'Someone, perhaps you, asked to use this address for another account. One address is one account, so nothing was changed.',
      'To use the address there, first delete this account or give it another address.',
    ],
    link: { word: 'Sign in', url: `${origin}/sign-in` },
  };
}
