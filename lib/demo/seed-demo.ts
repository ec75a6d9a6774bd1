import 'server-only';

import { signUp } from '../accounts/account.service';
import { signUpSchema } from '../accounts/account.schema';
import type { GardenActor } from '../auth/session';
import { authDb } from '../db/client';
import { fixtureInputSchema } from '../fixtures/fixture.schema';
import { createFixture } from '../fixtures/fixture.service';
import { createGarden, deleteGarden, listGardens } from '../gardens/garden.service';
import { createJoinCode, join } from '../gardens/join-code.service';
import { roomInputSchema } from '../rooms/room.schema';
import { createRoom } from '../rooms/room.service';
import { evaluateScenarios } from '../scenarios/evaluation.service';
import { planSchema, type Plan } from '../scenarios/plan.schema';
import { scenarioById, scenariosOf } from '../scenarios/scenario.queries';
import { createScenario, updateScenario } from '../scenarios/scenario.service';
import { inGarden } from '../db/transactions';
import { tentInputSchema } from '../tents/tent.schema';
import { createTent } from '../tents/tent.service';
import type { DemoGarden, DemoPerson } from './demo-garden';
import { fenwickStreet } from './fenwick-street';
import { skerryPoint } from './skerry-point';

/** People bear this address until their garden is whole. One that is found with it was left by a start that was cut short. */
const provisional = (person: DemoPerson) => `loading.${person.email}`;

/** Everything goes through the services, with the schemas that the pages use, so that the demo can show nothing that a grower could not make. */
async function accountOf(person: DemoPerson): Promise<string> {
  const { accountId } = await signUp(
    signUpSchema.parse({
      displayName: person.name,
      email: provisional(person),
      password: person.passphrase,
      unitSystem: person.unitSystem,
    }),
    {},
  );
  return accountId;
}

const actorOf = (accountId: string, person: DemoPerson) => ({
  accountId,
  displayName: person.name,
  email: person.email,
  unitSystem: person.unitSystem,
  theme: 'system' as const,
  sessionHash: Buffer.alloc(0),
});

/** Replaces the demo's names of lamps by their ids. */
const withFixtures = (plan: Plan, ids: ReadonlyMap<string, string>): Plan =>
  planSchema.parse({
    ...plan,
    placements: plan.placements.map((placement) => ({ ...placement, fixture: ids.get(placement.fixture)! })),
  });

async function invitePeople(actor: GardenActor, others: readonly DemoPerson[]): Promise<void> {
  for (const person of others) {
    if (person.role === 'owner') continue;
    const { code } = await createJoinCode(actor, person.role);
    await join(actorOf(await accountOf(person), person), code);
  }
}

async function seedGarden(demo: DemoGarden): Promise<void> {
  const [owner, ...others] = demo.people;
  const who = actorOf(await accountOf(owner), owner);
  const garden = await createGarden(who, { name: demo.name, currency: demo.currency });
  const actor: GardenActor = { ...who, gardenId: garden.gardenId, role: 'owner' };
  await invitePeople(actor, others);
  const ids = new Map<string, string>();
  for (const [key, fixture] of Object.entries(demo.fixtures))
    ids.set(key, (await createFixture(actor, fixtureInputSchema.parse(fixture))).fixtureId);
  const room = await createRoom(actor, roomInputSchema.parse(demo.room));
  const [first, ...more] = demo.scenarios;
  const tent = await createTent(
    actor,
    tentInputSchema.parse({ ...demo.tent, roomId: room.roomId, tierCount: first.plan.tiers.length }),
  );
  const begun = await inGarden(actor.gardenId, (trx) => scenarioById(trx, actor.gardenId, tent.currentScenarioId!));
  await updateScenario(actor, begun.scenarioId, {
    version: begun.version,
    name: first.name,
    note: first.note,
    plan: withFixtures(first.plan, ids),
  });
  for (const { name, note, plan } of more)
    await createScenario(actor, tent.tentId, { name, note, plan: withFixtures(plan, ids) });
  // Evaluated once here, so that the first visitor does not wait for it.
  const all = await inGarden(actor.gardenId, (trx) => scenariosOf(trx, actor.gardenId));
  await evaluateScenarios(actor, () => all.map((scenario) => scenario.scenarioId));
}

/** Takes away what a start that was cut short had loaded of this garden. */
async function clearHalf(demo: DemoGarden): Promise<void> {
  const addresses = demo.people.map(provisional);
  const half = await authDb().selectFrom('accounts').where('email', 'in', addresses).selectAll().execute();
  const owner = half.find((account) => account.email === addresses[0]);
  if (owner) {
    const who = actorOf(owner.account_id, demo.people[0]);
    for (const { gardenId } of await listGardens(who)) await deleteGarden({ ...who, gardenId, role: 'owner' });
  }
  if (half.length > 0) await authDb().deleteFrom('accounts').where('email', 'in', addresses).execute();
}

/** Opens the finished garden to its people, all at once. */
async function open(demo: DemoGarden): Promise<void> {
  await authDb()
    .transaction()
    .execute(async (trx) => {
      for (const person of demo.people)
        await trx
          .updateTable('accounts')
          .set({ email: person.email })
          .where('email', '=', provisional(person))
          .execute();
    });
}

const gardens = [skerryPoint, fenwickStreet];

export interface DemoSignIn {
  email: string;
  passphrase: string;
  what: string;
}

/** Loads the invented gardens where they are not there yet, and says how to sign in. */
export async function seedDemo(): Promise<{ loaded: number; signIns: DemoSignIn[] }> {
  let loaded = 0;
  for (const demo of gardens) {
    const there = await authDb()
      .selectFrom('accounts')
      .where('email', '=', demo.people[0].email)
      .select('account_id')
      .executeTakeFirst();
    if (there) continue;
    await clearHalf(demo);
    await seedGarden(demo);
    await open(demo);
    loaded += 1;
  }
  const signIns = gardens.flatMap((demo) =>
    demo.people.map((person) => ({
      email: person.email,
      passphrase: person.passphrase,
      what: `${person.role} of ${demo.name}`,
    })),
  );
  return { loaded, signIns };
}
