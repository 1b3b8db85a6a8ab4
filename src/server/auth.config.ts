import { AuthError, CredentialsSignin } from '@auth/core/errors';
import Credentials from '@auth/core/providers/credentials';
import type { FullAuthConfig } from 'auth-astro/src/config';
import { checkCredentials, type Refusal } from './commands/checkCredentials';
import { clientAddressOf } from './clientAddress';
import { findSessionUser } from './session';

const PREFIX = '/api/auth';

/** What a caller can cause at will: each has its answer, none is worth a line in the log. */
const CALLERS_FAULTS = new Set([
  'CredentialsSignin',
  'MissingCSRF',
  'UnknownAction',
  'JWTSessionError',
  'SyntaxError',
]);

/** A refused sign-in is an answer for the form, which reads its code. */
class RefusedSignIn extends CredentialsSignin {
  constructor(refusal: Refusal) {
    super();
    this.code = refusal;
  }
}

const authConfig: FullAuthConfig = {
  prefix: PREFIX,
  basePath: PREFIX,
  // Read when the server starts: a secret known to the build would be written into it.
  secret: process.env.AUTH_SECRET,
  // Our own server entry sets host and protocol from configuration.
  trustHost: true,
  session: { strategy: 'jwt' },
  pages: { signIn: '/sign-in', signOut: '/sign-out', error: '/sign-in' },
  providers: [
    Credentials({
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      async authorize(credentials, request) {
        const check = await checkCredentials(credentials, clientAddressOf(request));
        if ('refused' in check) throw new RefusedSignIn(check.refused);
        const { id, tokenVersion } = check.accepted;
        return { id, tokenVersion };
      },
    }),
  ],
  callbacks: {
    /** The token says which account and which version; a version no longer held ends the session. */
    async jwt({ token, user }) {
      if (user) return { sub: user.id, tokenVersion: user.tokenVersion };
      const row = token.sub ? await findSessionUser(token.sub, token.tokenVersion) : null;
      return row ? { sub: token.sub, tokenVersion: token.tokenVersion } : null;
    },
    session: ({ session, token }) => ({ expires: session.expires, user: { id: token.sub } }),
  },
  logger: {
    error(error) {
      if (!CALLERS_FAULTS.has(error instanceof AuthError ? error.type : error.name))
        console.error('auth:', error);
    },
    warn: (code) => console.warn('auth:', code),
    debug: () => undefined,
  },
};

declare module '@auth/core/types' {
  interface User {
    tokenVersion?: number;
  }
}

export default authConfig;
