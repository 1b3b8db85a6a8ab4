import { signInAnswerSchema, type SignInForm, type SignInRefusal } from '../schemas/account';
import { post } from './api';

/** What Auth.js asks of a sign-in beside the form: its double-submit token and where to go. */
interface Errand {
  csrfToken: string;
  callbackUrl: string;
}

/** Signs in; null when it succeeded and the session cookie is set, else why not. */
export async function signIn(form: SignInForm, errand: Errand): Promise<SignInRefusal | null> {
  const { url } = await post(
    '/api/auth/callback/credentials',
    { ...form, ...errand },
    signInAnswerSchema,
    // Without it the answer is a redirect, which a fetch would follow.
    { headers: { 'X-Auth-Return-Redirect': '1' } },
  );
  return readSignInRefusal(new URL(url).searchParams);
}

/** Auth.js tells by the address it sends the browser to. */
export function readSignInRefusal(query: URLSearchParams): SignInRefusal | null {
  if (!query.has('error')) return null;
  const code = query.get('code');
  return code === 'wrong' || code === 'unconfirmed' || code === 'too-many' ? code : 'failed';
}
