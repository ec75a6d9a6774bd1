import 'server-only';

import { sql } from 'kysely';
import { authDb } from '../db/client';
import { env } from '../env';
import { countAttempt, forgetAttempts } from './attempts';
import { clientAddress, DIRECT } from './client-address';
import { verifyPassword } from './password';

interface SignIn {
  email: string;
  password: string;
  headers: Record<string, string | undefined>;
}

/**
 * The account that this address and passphrase belong to, or null.
 *
 * No account, a wrong passphrase and too many attempts give one answer, after one hash each, so that nobody learns from
 * the words or the time whether an address is known.
 */
export async function checkSignIn({ email, password, headers }: SignIn): Promise<string | null> {
  const address = email.trim().toLowerCase();
  const windowMinutes = env().SIGN_IN_WINDOW_MINUTES;
  const subject = `account:${address}`;
  const from = clientAddress(headers);
  const allowed = await Promise.all([
    countAttempt({ subject, most: env().SIGN_IN_ATTEMPTS, windowMinutes }),
    countAttempt({
      subject: `address:${from}`,
      most: env().SIGN_IN_ATTEMPTS * (from === DIRECT ? 50 : 5),
      windowMinutes,
    }),
  ]);
  const account = await authDb()
    .selectFrom('accounts')
    .select(['account_id', 'password_hash'])
    .where(sql<string>`lower(email)`, '=', address)
    .executeTakeFirst();
  const matches = await verifyPassword(account?.password_hash, password.slice(0, 256));
  if (!matches || !allowed.every(Boolean)) return null;
  await forgetAttempts(subject);
  return account?.account_id ?? null;
}
