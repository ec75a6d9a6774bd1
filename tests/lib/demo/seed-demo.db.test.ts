import { expect, test } from 'vitest';
import { signUp } from '@/lib/accounts/account.service';
import { authDb } from '@/lib/db/client';
import { seedDemo } from '@/lib/demo/seed-demo';
import { skerryPoint } from '@/lib/demo/skerry-point';
import { createGarden, listGardens } from '@/lib/gardens/garden.service';
import { evaluateScenarios } from '@/lib/scenarios/evaluation.service';
import { checkSignIn } from '@/lib/auth/sign-in.service';
import { actorOf } from '../../support/people';

const ids = (scenarios: readonly { scenarioId: string }[]) => scenarios.map((each) => each.scenarioId);

async function ownedGarden(email: string) {
  const { account_id: accountId } = await authDb()
    .selectFrom('accounts')
    .where('email', '=', email)
    .select('account_id')
    .executeTakeFirstOrThrow();
  const person = { accountId, cookie: '' };
  const gardens = await listGardens(actorOf(person, '', 'owner'));
  return { gardens, actor: actorOf(person, gardens[0]!.gardenId, 'owner') };
}

test('a load that was cut short is cleared away and done again, once', async () => {
  const [owner] = skerryPoint.people;
  const { accountId } = await signUp(
    { displayName: owner.name, email: `loading.${owner.email}`, password: owner.passphrase, unitSystem: 'metric' },
    {},
  );
  await createGarden(actorOf({ accountId, cookie: '' }, '', 'owner'), { name: skerryPoint.name, currency: 'GBP' });

  const first = await seedDemo();
  expect(first.loaded).toBe(2);
  expect((await ownedGarden(owner.email)).gardens).toHaveLength(1);
  expect((await seedDemo()).loaded).toBe(0);
  expect((await ownedGarden(owner.email)).gardens).toHaveLength(1);
  const half = await authDb().selectFrom('accounts').where('email', 'like', 'loading.%').selectAll().execute();
  expect(half).toEqual([]);
  for (const { email, passphrase } of first.signIns) {
    expect(passphrase.length).toBeGreaterThanOrEqual(15);
    expect(await checkSignIn({ email, password: passphrase, headers: {} })).not.toBeNull();
  }
});

test('each demo garden has three scenarios worth comparing: tiers inside, tiers below, and three prices of a year', async () => {
  const { signIns } = await seedDemo();
  for (const { email } of signIns.filter((each) => each.what.startsWith('owner'))) {
    const { actor } = await ownedGarden(email);
    const all = await evaluateScenarios(actor, ids);
    expect(all).toHaveLength(3);
    const verdicts = all.flatMap(({ evaluation }) => evaluation.tiers.map((tier) => tier.verdict));
    expect(verdicts).toContain('inside');
    expect(verdicts).toContain('below');
    expect(verdicts).not.toContain('none');
    const costs = all.map(({ evaluation }) => evaluation.year.cost.toFixed(0));
    expect(new Set(costs).size).toBe(3);
    for (const { evaluation } of all) {
      expect(evaluation.circuits.every((circuit) => circuit.within)).toBe(true);
    }
  }
});
