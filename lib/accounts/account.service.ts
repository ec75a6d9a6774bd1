import 'server-only';

import { randomUUID } from 'node:crypto';
import { countAttempt } from '../auth/attempts';
import { clientAddress } from '../auth/client-address';
import { hashPassword, isCommonPassword, verifyPassword } from '../auth/password';
import { closeOtherSessions, type Actor } from '../auth/session';
import { authDb } from '../db/client';
import { env } from '../env';
import { AppError, invalid } from '../http/app-error';
import type { Account, AccountChange, PasswordChange, SignUp } from './account.schema';

const tooCommon = (path: string) =>
  invalid([
    {
      path,
      message: 'This one is on the list that guessers try first. Four unrelated words make a good one.',
    },
  ]);

const UNIQUE_VIOLATION = '23505';

/** Makes an account. Until mail can confirm an address, sign-up is the one place that says it is taken. */
export async function signUp(
  input: SignUp,
  headers: Record<string, string | undefined>,
): Promise<{ accountId: string }> {
  const allowed = await countAttempt({
    subject: `sign-up:${clientAddress(headers)}`,
    most: env().SIGN_UPS_PER_HOUR,
    windowMinutes: 60,
  });
  if (!allowed) {
    throw new AppError({
      status: 429,
      code: 'too-many',
      title: 'Too many accounts were made from here in the last hour.',
      detail: 'Try again in an hour. What you typed is kept on this page.',
      retryAfterS: 3600,
    });
  }
  if (isCommonPassword(input.password)) throw tooCommon('password');
  const accountId = randomUUID();
  try {
    await authDb()
      .insertInto('accounts')
      .values({
        account_id: accountId,
        email: input.email.trim(),
        display_name: input.displayName.trim(),
        password_hash: await hashPassword(input.password),
        unit_system: input.unitSystem ?? 'metric',
      })
      .execute();
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === UNIQUE_VIOLATION) {
      throw invalid([{ path: 'email', message: 'This address has an account already. Sign in instead.' }]);
    }
    throw error;
  }
  return { accountId };
}

export function readAccount(actor: Actor): Account {
  const { accountId, email, displayName, unitSystem, theme } = actor;
  return { accountId, email, displayName, unitSystem, theme };
}

export async function updateAccount(actor: Actor, change: AccountChange): Promise<Account> {
  const columns = {
    ...(change.displayName !== undefined && { display_name: change.displayName }),
    ...(change.unitSystem !== undefined && { unit_system: change.unitSystem }),
    ...(change.theme !== undefined && { theme: change.theme }),
  };
  if (Object.keys(columns).length > 0) {
    await authDb().updateTable('accounts').set(columns).where('account_id', '=', actor.accountId).execute();
  }
  return { ...readAccount(actor), ...change };
}

/** Changes the passphrase and ends every other sign-in of this account at once. */
export async function changePassword(actor: Actor, { current, next }: PasswordChange): Promise<void> {
  const allowed = await countAttempt({
    subject: `password:${actor.accountId}`,
    most: env().SIGN_IN_ATTEMPTS,
    windowMinutes: env().SIGN_IN_WINDOW_MINUTES,
  });
  const account = await authDb()
    .selectFrom('accounts')
    .select('password_hash')
    .where('account_id', '=', actor.accountId)
    .executeTakeFirstOrThrow();
  if (!allowed || !(await verifyPassword(account.password_hash, current))) {
    throw invalid([{ path: 'current', message: 'This is not your present passphrase. Type it again.' }]);
  }
  if (isCommonPassword(next)) throw tooCommon('next');
  const passwordHash = await hashPassword(next);
  await authDb()
    .updateTable('accounts')
    .set({ password_hash: passwordHash })
    .where('account_id', '=', actor.accountId)
    .execute();
  await closeOtherSessions(actor.accountId, actor.sessionHash);
}
