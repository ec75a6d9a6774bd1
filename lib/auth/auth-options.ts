import 'server-only';

import type { NextAuthOptions } from 'next-auth';
import Credentials from 'next-auth/providers/credentials';
import { env } from '../env';
import { closeSession, openSession, SESSION_LONGEST_DAYS, sessionCookieName } from './session';
import { checkSignIn } from './sign-in.service';

/**
 * Sign-in with an address and a passphrase.
 *
 * The token carries the account and a random session id, nothing else: roles and settings are read from the tables on
 * each request, so a copied cookie is worth nothing once its session row is gone.
 */
export function authOptions(): NextAuthOptions {
  const secure = env().NEXTAUTH_URL.startsWith('https://');
  return {
    secret: env().NEXTAUTH_SECRET,
    session: { strategy: 'jwt', maxAge: SESSION_LONGEST_DAYS * 24 * 3600 },
    pages: { signIn: '/sign-in', error: '/sign-in' },
    cookies: {
      sessionToken: {
        name: sessionCookieName(),
        options: { httpOnly: true, sameSite: 'lax', path: '/', secure },
      },
    },
    providers: [
      Credentials({
        name: 'passphrase',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        async authorize(credentials, request) {
          // Whatever goes wrong, the answer is the same: an error thrown here would be printed into the address bar.
          try {
            const accountId = await checkSignIn({
              email: credentials?.email ?? '',
              password: credentials?.password ?? '',
              headers: request.headers ?? {},
            });
            return accountId ? { id: accountId } : null;
          } catch (error) {
            console.error('sign-in failed', error instanceof Error ? error.message : error);
            return null;
          }
        },
      }),
    ],
    callbacks: {
      // `session` of an update call is the client's word and is never read.
      async jwt({ token, user }) {
        if (user) return { sub: user.id, sid: await openSession(user.id) };
        return { sub: token.sub, sid: token['sid'] };
      },
      session: ({ session }) => ({ expires: session.expires }),
    },
    events: {
      async signOut({ token }) {
        if (typeof token?.['sid'] === 'string') await closeSession(token['sid']);
      },
    },
  };
}
