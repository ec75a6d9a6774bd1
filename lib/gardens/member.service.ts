import 'server-only';

import { audit } from '../audit/audit';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import type { Role } from '../db/database';
import { inGarden, type GardenTransaction } from '../db/transactions';
import { inUse, notFoundHere } from '../http/app-error';
import { lockOwners, membersOf, roleOfMember } from './garden.queries';
import type { Member } from './garden.schema';

export async function listMembers(actor: GardenActor): Promise<Member[]> {
  requireAllowed(actor, 'member.read');
  const members = await inGarden(actor.gardenId, (trx) => membersOf(trx, actor.gardenId));
  return members.map((member) => ({ ...member, you: member.accountId === actor.accountId }));
}

/** A garden always has an owner: the last one can neither step down nor leave. */
async function keepAnOwner(trx: GardenTransaction, gardenId: string, leaving: string): Promise<void> {
  const owners = await lockOwners(trx, gardenId);
  if (owners.length === 1 && owners[0] === leaving) {
    throw inUse('This is the only owner. Make somebody else an owner first.');
  }
}

export async function updateMember(actor: GardenActor, accountId: string, role: Role): Promise<Member[]> {
  requireAllowed(actor, 'member.update');
  await inGarden(actor.gardenId, async (trx) => {
    if (!(await roleOfMember(trx, actor.gardenId, accountId))) throw notFoundHere('person');
    if (role !== 'owner') await keepAnOwner(trx, actor.gardenId, accountId);
    await trx
      .updateTable('memberships')
      .set({ role })
      .where('garden_id', '=', actor.gardenId)
      .where('account_id', '=', accountId)
      .execute();
    await audit(trx, { ...actor, action: 'member.update', targetId: accountId, detail: { role } });
  });
  return listMembers(actor);
}

/** Removes a person, or lets one leave. Access ends with the next request, since membership is read on each. */
export async function removeMember(actor: GardenActor, accountId: string): Promise<void> {
  requireAllowed(actor, accountId === actor.accountId ? 'garden.leave' : 'member.remove');
  await inGarden(actor.gardenId, async (trx) => {
    if (!(await roleOfMember(trx, actor.gardenId, accountId))) throw notFoundHere('person');
    await keepAnOwner(trx, actor.gardenId, accountId);
    await trx
      .deleteFrom('memberships')
      .where('garden_id', '=', actor.gardenId)
      .where('account_id', '=', accountId)
      .execute();
    await audit(trx, { ...actor, action: 'member.remove', targetId: accountId });
  });
}
