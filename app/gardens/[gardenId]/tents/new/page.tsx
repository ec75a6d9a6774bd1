import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { ForbiddenState } from '@/app/_components/page-state';
import { PageFrame } from '@/app/_components/page-frame';
import { can } from '@/lib/auth/permissions';
import { getGarden } from '@/lib/gardens/garden.service';
import { pageGardenActor } from '@/lib/http/page-access';
import { listRooms } from '@/lib/rooms/room.service';
import { NewTentForm } from './_components/new-tent-form';

export const metadata: Metadata = { title: 'A new tent' };

interface NewTentProps {
  params: Promise<{ gardenId: string }>;
  searchParams: Promise<{ room?: string }>;
}

export default async function NewTentPage({ params, searchParams }: NewTentProps) {
  const { gardenId } = await params;
  const { room } = await searchParams;
  const actor = await pageGardenActor(gardenId);
  const garden = await getGarden(actor);
  if (!can(actor.role, 'tent.create')) {
    return (
      <PageFrame garden={garden} current="garden" crumbs={[{ words: 'a new tent' }]}>
        <ForbiddenState what="add a tent" who="a planner or an owner" back={`/gardens/${gardenId}`} />
      </PageFrame>
    );
  }
  const rooms = await listRooms(actor);
  if (rooms.length === 0) redirect(`/gardens/${gardenId}/rooms/new` as Route);
  return (
    <PageFrame
      garden={garden}
      current="garden"
      crumbs={[{ words: 'a new tent' }]}
      headline="A tent, as it says on its box."
      lead="Type its three sizes on the lines. Tiers are spaced evenly to begin with; in the section you slide them."
    >
      <NewTentForm
        gardenId={gardenId}
        rooms={rooms.map(({ roomId, name }) => ({ roomId, name }))}
        wanted={rooms.some((each) => each.roomId === room) ? room! : rooms[0]!.roomId}
      />
    </PageFrame>
  );
}
