'use client';

import { signIn as nextSignIn, signOut as nextSignOut } from 'next-auth/react';

const TRIES = 2;

export type SignInAnswer = 'signed-in' | 'refused' | 'unreachable';

/**
 * Signs in with an address and a passphrase.
 *
 * The library fetches a token against forged requests and posts it; when another tab fetched one in between, the answer looks
 * like success and nobody is signed in. So only an answer without that mark counts, and a stale token is tried once more.
 */
export async function signIn({ email, password }: { email: string; password: string }): Promise<SignInAnswer> {
  for (let attempt = 0; attempt < TRIES; attempt += 1) {
    const answer = await nextSignIn('credentials', { email, password, redirect: false }).catch(() => undefined);
    if (!answer) return 'unreachable';
    if (answer.url?.includes('csrf=true')) continue;
    return answer.ok && !answer.error ? 'signed-in' : 'refused';
  }
  return 'unreachable';
}

/** Ends the session on the server and goes to the first page. */
export async function signOut(): Promise<void> {
  await nextSignOut({ redirect: false }).catch(() => undefined);
  window.location.assign('/');
}
