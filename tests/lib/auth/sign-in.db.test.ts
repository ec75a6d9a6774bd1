import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import { afterAll, describe, expect, it } from 'vitest';
import { changePassword, signUp } from '@/lib/accounts/account.service';
import { countAttempt } from '@/lib/auth/attempts';
import { isCommonPassword, verifyPassword } from '@/lib/auth/password';
import { authenticate, closeSession, openSession } from '@/lib/auth/session';
import { checkSignIn } from '@/lib/auth/sign-in.service';
import { closePools } from '@/lib/db/client';

afterAll(closePools);

const passphrase = 'nine grey herons over water';

async function account() {
  const email = `${randomUUID()}@tests.example`;
  const { accountId } = await signUp(
    { displayName: 'Somebody', email, password: passphrase, unitSystem: 'metric' },
    {},
  );
  return { accountId, email };
}

async function sessionOf(accountId: string) {
  const sid = await openSession(accountId);
  const cookie = await encode({ token: { sub: accountId, sid }, secret: process.env['NEXTAUTH_SECRET']! });
  return { sid, cookie };
}

describe('signing in', () => {
  it('knows the account by address, whatever its letters’ case, and passphrase', async () => {
    const { accountId, email } = await account();
    expect(await checkSignIn({ email: email.toUpperCase(), password: passphrase, headers: {} })).toBe(accountId);
    expect(await checkSignIn({ email, password: `${passphrase}.`, headers: {} })).toBeNull();
    expect(await checkSignIn({ email: 'nobody@tests.example', password: passphrase, headers: {} })).toBeNull();
  });

  it('takes as long for an address that nobody has as for a wrong passphrase', async () => {
    const { email } = await account();
    const unknown = 'nobody-at-all@tests.example';
    const fastest = { [email]: Infinity, [unknown]: Infinity };
    // In turn, and the fastest of many: what else the machine does slows both alike and counts for neither.
    for (let i = 0; i < 12; i += 1) {
      for (const address of [email, unknown]) {
        const from = performance.now();
        await checkSignIn({ email: address, password: 'wrong wrong wrong wrong', headers: {} });
        fastest[address] = Math.min(fastest[address]!, performance.now() - from);
      }
    }
    const ratio = fastest[unknown]! / fastest[email]!;
    // One hash each; without it the unknown address would answer in a tenth of the time.
    expect(ratio).toBeGreaterThan(0.5);
    expect(ratio).toBeLessThan(2);
  });

  it('stops counting for nobody: after too many attempts even the right passphrase is refused', async () => {
    const { email } = await account();
    const most = 10;
    for (let i = 0; i < most; i += 1) await checkSignIn({ email, password: 'wrong wrong wrong', headers: {} });
    expect(await checkSignIn({ email, password: passphrase, headers: {} })).toBeNull();
  });

  it('counts attempts one by one, however many come at once', async () => {
    const subject = `test:${randomUUID()}`;
    const answers = await Promise.all(
      Array.from({ length: 20 }, () => countAttempt({ subject, most: 5, windowMinutes: 15 })),
    );
    expect(answers.filter(Boolean)).toHaveLength(5);
  });

  it('refuses the passphrases that guessers try first, and short ones repeated', async () => {
    for (const common of [
      'passwordpassword',
      'Password 1234567890',
      'qwertyuiopasdfgh',
      'aaaaaaaaaaaaaaa',
      'abcabcabcabcabc',
      'correct horse battery staple',
    ])
      expect(isCommonPassword(common), common).toBe(true);
    expect(isCommonPassword(passphrase)).toBe(false);
    await expect(
      signUp(
        {
          displayName: 'x',
          email: `${randomUUID()}@tests.example`,
          password: 'iloveyouiloveyou',
          unitSystem: 'metric',
        },
        {},
      ),
    ).rejects.toMatchObject({ status: 422 });
  });

  it('tells nobody that a hash is missing', async () =>
    expect(await verifyPassword(undefined, passphrase)).toBe(false));
});

describe('a session', () => {
  it('ends at once with signing out, though the cookie is kept', async () => {
    const { accountId } = await account();
    const { sid, cookie } = await sessionOf(accountId);
    expect((await authenticate(cookie, null))?.accountId).toBe(accountId);
    await closeSession(sid);
    expect(await authenticate(cookie, null)).toBeNull();
  });

  it('ends everywhere else when the passphrase changes, and not here', async () => {
    const { accountId, email } = await account();
    const here = await sessionOf(accountId);
    const elsewhere = await sessionOf(accountId);
    const actor = (await authenticate(here.cookie, null))!;
    await expect(
      changePassword(actor, { current: 'not the one', next: 'a new and longer passphrase' }),
    ).rejects.toMatchObject({ status: 422 });
    await changePassword(actor, { current: passphrase, next: 'a new and longer passphrase' });
    expect(await authenticate(elsewhere.cookie, null)).toBeNull();
    expect(await authenticate(here.cookie, null)).not.toBeNull();
    expect(await checkSignIn({ email, password: passphrase, headers: {} })).toBeNull();
    expect(await checkSignIn({ email, password: 'a new and longer passphrase', headers: {} })).toBe(accountId);
  });

  it('is not opened by a forged or foreign token', async () => {
    const { accountId } = await account();
    const { sid } = await sessionOf(accountId);
    expect(
      await authenticate(
        await encode({ token: { sub: accountId, sid }, secret: 'another secret altogether, long enough' }),
        null,
      ),
    ).toBeNull();
    expect(await authenticate('nonsense', null)).toBeNull();
    expect(await authenticate(undefined, null)).toBeNull();
  });
});
