import type { Metadata } from 'next';
import { Suspense, type CSSProperties } from 'react';
import { DashedTent } from '@/app/gardens/_components/dashed-tent';
import { Remedy } from '@/app/gardens/_components/remedy';
import { RoomCut } from '@/app/gardens/_components/room-cut';
import { showGarden } from '@/app/gardens/_components/shown';
import { headlineOf } from '@/app/gardens/_components/tent-words';
import { roomHeightPx } from '@/app/gardens/_components/tent-place';
import { Figure } from '@/app/_components/figure';
import { TextLink } from '@/app/_components/link';
import { PageFrame } from '@/app/_components/page-frame';
import { can, roleSentences } from '@/lib/auth/permissions';
import { formatMoney } from '@/lib/format/money';
import { found, pageGardenActor } from '@/lib/http/page-access';
import { getGardenOverview } from '@/lib/scenarios/overview.service';
import { GardenSettings } from './_components/garden-settings';

interface GardenPageProps {
  params: Promise<{ gardenId: string }>;
}

export async function generateMetadata({ params }: GardenPageProps): Promise<Metadata> {
  const actor = await pageGardenActor((await params).gardenId);
  return { title: (await found(getGardenOverview(actor))).garden.name };
}

export default async function GardenPage({ params }: GardenPageProps) {
  const { gardenId } = await params;
  const actor = await pageGardenActor(gardenId);
  const shown = showGarden(await found(getGardenOverview(actor)), new Date().getMonth() + 1);
  const { garden, rooms, month } = shown;
  const tents = rooms.flatMap((room) => room.tents);
  const worst = [...tents].sort((a, b) => b.words.urgency - a.words.urgency)[0];
  const tallPx = roomHeightPx(tents.map((tent) => tent.overview));
  const mayRoom = can(garden.role, 'room.create');
  const mayTent = can(garden.role, 'tent.create');
  const headline =
    tents.length > 0
      ? headlineOf(tents.map((tent) => tent.words))
      : rooms.length > 0
        ? 'A room, and no tent in it yet.'
        : 'First a room: how cold it is decides the rest.';
  return (
    <PageFrame
      garden={garden}
      current="garden"
      crumbs={[]}
      headline={headline}
      lead={
        worst && worst.words.urgency > 0 ? (
          <Suspense fallback={<span className="text-ink-soft">Trying what would help.</span>}>
            <Remedy worst={worst} gardenId={gardenId} units={actor.unitSystem} />
          </Suspense>
        ) : rooms.length === 0 ? (
          mayRoom ? (
            'A cellar, a garage, a spare room: its air, its sockets and what power costs there.'
          ) : (
            'A planner or an owner adds the first.'
          )
        ) : null
      }
    >
      <div className="flex flex-wrap gap-y-5 pt-8 pl-2.25 [--m:84px] max-lg:flex-col max-lg:pl-0 max-md:[--m:66px]">
        {rooms.map((room) => (
          <RoomCut
            level={2}
            key={room.room.roomId}
            gardenId={gardenId}
            shown={room}
            heightPx={tallPx}
            mayAdd={mayTent}
          />
        ))}
        {(mayTent || mayRoom) && (
          <div
            className={`flex grow items-end max-lg:justify-start max-lg:pl-0 lg:h-(--tall) ${rooms.length > 0 ? 'justify-end pl-16' : ''}`}
            style={{ '--tall': `${tallPx + 9}px` } as CSSProperties}
          >
            <DashedTent>
              {rooms.length > 0 ? (
                <>
                  <TextLink href={`/gardens/${gardenId}/tents/new`} look="button">
                    Add a tent
                  </TextLink>
                  <p className="pt-2 text-12 text-ink-soft">
                    It asks where, how large and how many tiers.{' '}
                    <TextLink href={`/gardens/${gardenId}/rooms/new`}>Add a room</TextLink>
                  </p>
                </>
              ) : (
                <TextLink href={`/gardens/${gardenId}/rooms/new`} look="button">
                  Add a room
                </TextLink>
              )}
            </DashedTent>
          </div>
        )}
      </div>
      <p className="mt-8 border-t border-line pt-4 text-12 text-ink-soft">
        {month && (
          <>
            {month.name}, as planned: <Figure value={month.energyKwh} kind="energy" />,{' '}
            {formatMoney(month.cost, garden.currency)}.{' '}
          </>
        )}
        You are here as {garden.role}: {lower(roleSentences[garden.role])}
      </p>
      <GardenSettings
        garden={garden}
        mayChange={can(garden.role, 'garden.update')}
        mayDelete={can(garden.role, 'garden.delete')}
      />
    </PageFrame>
  );
}

const lower = (sentence: string) => sentence[0]!.toLowerCase() + sentence.slice(1);
