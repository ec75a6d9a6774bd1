import { afterAll, describe, expect, it } from 'vitest';
import { closePools } from '@/lib/db/client';
import { createJoinCode, join } from '@/lib/gardens/join-code.service';
import { listMembers, removeMember, updateMember } from '@/lib/gardens/member.service';
import { actorOf, newGarden, newPerson } from '../../support/people';

afterAll(closePools);

describe('members', () => {
  it('always keep an owner, when two leave at once, a hundred times over', async () => {
    for (let round = 0; round < 100; round += 1) {
      const garden = round % 25 === 0 ? await newGarden() : shared!;
      shared = garden;
      const second = garden.people.planner;
      await updateMember(garden.owner, second.accountId, 'owner');
      const secondActor = actorOf(second, garden.gardenId, 'owner');
      const results = await Promise.allSettled([
        updateMember(garden.owner, garden.owner.accountId, 'viewer'),
        updateMember(secondActor, second.accountId, 'viewer'),
      ]);
      const owners = (await listMembers(garden.owner)).filter((member) => member.role === 'owner');
      expect(owners, `round ${round}`).toHaveLength(1);
      expect(results.filter((result) => result.status === 'rejected')).toHaveLength(1);
      // Put things back for the next round.
      const left = owners[0]!.accountId;
      if (left !== garden.owner.accountId) {
        await updateMember(secondActor, garden.owner.accountId, 'owner');
        await updateMember(garden.owner, second.accountId, 'planner');
      }
    }
  }, 120_000);

  it('refuse to let the only owner go', async () => {
    const { owner } = await newGarden();
    await expect(removeMember(owner, owner.accountId)).rejects.toMatchObject({ status: 409 });
  });

  it('join with a code that works once, however often it is sent', async () => {
    const { owner, gardenId } = await newGarden();
    const { code } = await createJoinCode(owner, 'tender');
    const people = await Promise.all(Array.from({ length: 6 }, () => newPerson()));
    const results = await Promise.allSettled(
      people.map((person) => join(actorOf(person, gardenId, 'viewer'), ` ${code.toLowerCase().replaceAll('-', ' ')}`)),
    );
    expect(results.filter((result) => result.status === 'fulfilled')).toHaveLength(1);
    await expect(join(actorOf(people[0]!, gardenId, 'viewer'), code)).rejects.toMatchObject({ status: 422 });
  });
});

let shared: Awaited<ReturnType<typeof newGarden>> | undefined;
