import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import { signUp } from '@/lib/accounts/account.service';
import { openSession, sessionCookieName, type GardenActor } from '@/lib/auth/session';
import type { Role } from '@/lib/db/database';
import { createGarden } from '@/lib/gardens/garden.service';
import { createJoinCode, join } from '@/lib/gardens/join-code.service';

export interface Person {
  accountId: string;
  /** As the browser would send it. */
  cookie: string;
}

/** An account with an open session, made as the app makes them. */
export async function newPerson(name = 'Somebody'): Promise<Person> {
  const { accountId } = await signUp(
    {
      displayName: name,
      email: `${randomUUID()}@tests.example`,
      password: `${randomUUID()} ${randomUUID()}`,
      unitSystem: 'metric',
    },
    {},
  );
  const sid = await openSession(accountId);
  const token = await encode({ token: { sub: accountId, sid }, secret: process.env['NEXTAUTH_SECRET']! });
  return { accountId, cookie: `${sessionCookieName()}=${token}` };
}

export const actorOf = (person: Person, gardenId: string, role: Role): GardenActor => ({
  accountId: person.accountId,
  displayName: 'Somebody',
  email: 'somebody@tests.example',
  unitSystem: 'metric',
  theme: 'system',
  sessionHash: Buffer.alloc(0),
  gardenId,
  role,
});

export interface TestGarden {
  gardenId: string;
  people: Record<Role, Person>;
  owner: GardenActor;
}

/** A garden with a person in each role. */
export async function newGarden(name = 'A garden'): Promise<TestGarden> {
  const ownerPerson = await newPerson('Owner');
  const garden = await createGarden(actorOf(ownerPerson, '', 'owner'), { name, currency: 'EUR' });
  const owner = actorOf(ownerPerson, garden.gardenId, 'owner');
  const people: Partial<Record<Role, Person>> = { owner: ownerPerson };
  for (const role of ['planner', 'tender', 'viewer'] as const) {
    const person = await newPerson(role);
    const { code } = await createJoinCode(owner, role);
    await join(actorOf(person, garden.gardenId, role), code);
    people[role] = person;
  }
  return { gardenId: garden.gardenId, people: people as Record<Role, Person>, owner };
}
