import type { Metadata } from 'next';
import { can } from '@/lib/auth/permissions';
import { getGarden } from '@/lib/gardens/garden.service';
import { found, isUuid, pageGardenActor } from '@/lib/http/page-access';
import { notFound } from 'next/navigation';
import { referenceData } from '@/lib/reference-data/reference-data';
import { getRoom } from '@/lib/rooms/room.service';
import { defaultTariff } from '@/lib/tariffs/default-tariff';
import { RoomView } from './_components/room-view';

export const metadata: Metadata = { title: 'Room' };

export default async function RoomPage({ params }: { params: Promise<{ gardenId: string; roomId: string }> }) {
  const { gardenId, roomId } = await params;
  const actor = await pageGardenActor(gardenId);
  if (!isUuid(roomId)) notFound();
  const [garden, room] = await Promise.all([getGarden(actor), found(getRoom(actor, roomId))]);
  return (
    <RoomView
      garden={garden}
      room={room}
      readOnly={!can(actor.role, 'room.update')}
      reference={defaultTariff(garden.currency, referenceData().prices)}
    />
  );
}
