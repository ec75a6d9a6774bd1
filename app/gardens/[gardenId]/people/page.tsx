import type { Metadata } from 'next';
import { countWords } from '@/app/gardens/_components/tent-words';
import { PageFrame } from '@/app/_components/page-frame';
import { can } from '@/lib/auth/permissions';
import { getGarden } from '@/lib/gardens/garden.service';
import { listJoinCodes } from '@/lib/gardens/join-code.service';
import { listMembers } from '@/lib/gardens/member.service';
import { pageGardenActor } from '@/lib/http/page-access';
import { JoinCodes } from './_components/join-codes';
import { MemberRows } from './_components/member-rows';
import { RoleTable } from './_components/role-table';

export const metadata: Metadata = { title: 'People' };

const headline = (count: number) => {
  const words = countWords(count, 'person', 'people');
  return count === 1 ? 'You grow here alone.' : `${words[0]!.toUpperCase()}${words.slice(1)} grow here.`;
};

export default async function PeoplePage({ params }: { params: Promise<{ gardenId: string }> }) {
  const { gardenId } = await params;
  const actor = await pageGardenActor(gardenId);
  const [garden, members] = await Promise.all([getGarden(actor), listMembers(actor)]);
  const rules = can(actor.role, 'joinCode.create');
  const codes = rules ? await listJoinCodes(actor) : [];
  const owners = members.filter((each) => each.role === 'owner').map((each) => each.displayName);
  return (
    <PageFrame
      garden={garden}
      current="people"
      crumbs={[{ words: 'people' }]}
      headline={headline(members.length)}
      lead={
        rules
          ? 'A code lets one more in; it says what they may do.'
          : `${owners.join(' and ')} ${owners.length === 1 ? 'decides' : 'decide'} who may do what.`
      }
    >
      <MemberRows gardenId={gardenId} members={members} mayChange={can(actor.role, 'member.update')} />
      {rules && <JoinCodes gardenId={gardenId} codes={codes} />}
      <RoleTable />
    </PageFrame>
  );
}
