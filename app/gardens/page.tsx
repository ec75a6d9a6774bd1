import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { Suspense } from 'react';
import { can } from '@/lib/auth/permissions';
import { getActor } from '@/lib/auth/session';
import { listGardenOverviews } from '@/lib/scenarios/overview.service';
import { PageFrame } from '../_components/page-frame';
import { AddTent } from './_components/add-tent';
import { GardenStrip } from './_components/garden-strip';
import { GardensTable } from './_components/gardens-table';
import { NoGardens } from './_components/no-gardens';
import { Remedy } from './_components/remedy';
import { showGarden } from './_components/shown';
import { headlineOf } from './_components/tent-words';
import { roomHeightPx } from './_components/tent-place';

export const metadata: Metadata = { title: 'Your gardens' };

export default async function GardensPage() {
  const actor = await getActor();
  if (!actor) redirect('/sign-in?callbackUrl=/gardens' as Route);
  const overviews = await listGardenOverviews(actor);
  if (overviews.length === 0) return <NoGardens name={actor.displayName} />;
  const month = new Date().getMonth() + 1;
  const gardens = overviews.map((overview) => showGarden(overview, month));
  const all = gardens.flatMap((each) =>
    each.rooms.flatMap((room) => room.tents.map((tent) => ({ tent, gardenId: each.garden.gardenId }))),
  );
  const worst = [...all].sort((a, b) => b.tent.words.urgency - a.tent.words.urgency)[0];
  const heightPx = roomHeightPx(all.map(({ tent }) => tent.overview));
  const mine = gardens.find(({ garden }) => can(garden.role, 'tent.create'));
  return (
    <PageFrame
      current="gardens"
      headline={all.length > 0 ? headlineOf(all.map(({ tent }) => tent.words)) : 'A garden, and no tent in it yet.'}
      lead={
        worst && worst.tent.words.urgency > 0 ? (
          <Suspense fallback={<span className="text-ink-soft">Trying what would help.</span>}>
            <Remedy worst={worst.tent} gardenId={worst.gardenId} units={actor.unitSystem} />
          </Suspense>
        ) : null
      }
    >
      <div className="[--m:84px] max-md:[--m:66px]">
        {gardens.map((shown, at) => (
          <GardenStrip
            key={shown.garden.gardenId}
            shown={shown}
            heightPx={heightPx}
            adder={at === gardens.length - 1 && mine && <AddTent gardenId={mine.garden.gardenId} />}
          />
        ))}
      </div>
      <div className="mt-8 flex flex-wrap items-baseline gap-x-6 gap-y-1 border-t border-line pt-4 text-12 text-ink-soft">
        <span>All tents on one scale; their light is the computed one, all lamps on.</span>
      </div>
      <GardensTable
        rows={all.map(({ tent, gardenId }) => ({
          garden: gardens.find(({ garden }) => garden.gardenId === gardenId)!.garden.name,
          tent: tent.overview.tent.name,
          says: `${tent.words.figure ?? ''}${tent.words.sentence}`,
          scenario: tent.overview.scenarioName,
          yearKwh: tent.overview.evaluation.year.energyKwh.total.toFixed(0),
        }))}
      />
    </PageFrame>
  );
}
