import type { Metadata } from 'next';
import { ForbiddenState } from '@/app/_components/page-state';
import { PageFrame } from '@/app/_components/page-frame';
import { can } from '@/lib/auth/permissions';
import { getGarden } from '@/lib/gardens/garden.service';
import { pageGardenActor } from '@/lib/http/page-access';
import { NewRoomForm } from './_components/new-room-form';

export const metadata: Metadata = { title: 'A new room' };

export default async function NewRoomPage({ params }: { params: Promise<{ gardenId: string }> }) {
  const { gardenId } = await params;
  const actor = await pageGardenActor(gardenId);
  const garden = await getGarden(actor);
  if (!can(actor.role, 'room.create')) {
    return (
      <PageFrame garden={garden} current="garden" crumbs={[{ words: 'a new room' }]}>
        <ForbiddenState what="add a room" who="a planner or an owner" back={`/gardens/${gardenId}`} />
      </PageFrame>
    );
  }
  return (
    <PageFrame
      garden={garden}
      current="garden"
      crumbs={[{ words: 'a new room' }]}
      headline="Where will the tent stand?"
      lead="Its coldest and its warmest month decide the heater, the fan and the bill. All of it can be changed later."
    >
      <NewRoomForm gardenId={gardenId} dollars={garden.currency === 'USD' || garden.currency === 'CAD'} />
    </PageFrame>
  );
}
