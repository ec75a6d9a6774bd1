import type { CSSProperties, ReactNode } from 'react';
import { Figure } from '@/app/_components/figure';
import { TextLink } from '@/app/_components/link';
import { formatMoney } from '@/lib/format/money';
import { can } from '@/lib/auth/permissions';
import { RoomCut } from './room-cut';
import type { GardenShown } from './shown';

const ROLE_WORDS = { owner: 'an owner', planner: 'a planner', tender: 'a tender', viewer: 'a viewer' } as const;

interface GardenStripProps {
  shown: GardenShown;
  heightPx: number;
  /** A place for the next tent, on the level of this garden's floor. */
  adder?: ReactNode;
}

/** One garden of the house: who one is in it at the left, its rooms cut open beside each other. */
export function GardenStrip({ shown, heightPx, adder }: GardenStripProps) {
  const { garden, rooms, month } = shown;
  const at = `/gardens/${garden.gardenId}`;
  const mayAdd = can(garden.role, 'tent.create');
  return (
    <section
      aria-labelledby={`garden-${garden.gardenId}`}
      className="grid grid-cols-[196px_minmax(0,1fr)] gap-x-6 gap-y-3 pt-7 max-lg:grid-cols-1"
    >
      <div>
        <h2 id={`garden-${garden.gardenId}`} className="text-22">
          <TextLink href={at} look="plain" className="hover:underline">
            {garden.name}
          </TextLink>
        </h2>
        <p className="pt-1 text-12 text-ink-soft">
          You are {ROLE_WORDS[garden.role]}.{' '}
          {garden.memberCount === 1 ? 'Nobody else is here' : `${garden.memberCount} people`}; {garden.currency}.
        </p>
        {month && (
          <p className="pt-2 text-12">
            {month.name}, as planned:{' '}
            <span className="whitespace-nowrap">
              <Figure value={month.energyKwh} kind="energy" />, {formatMoney(month.cost, garden.currency)}
            </span>
          </p>
        )}
        <p className="flex flex-wrap gap-x-4 pt-2 text-12">
          {(['fixtures', 'crops', 'people'] as const).map((page) => (
            <TextLink
              key={page}
              href={`${at}/${page}`}
              look="opens"
              className="inline-flex min-h-6 touch-44 items-center"
            >
              {page[0]!.toUpperCase() + page.slice(1)}
            </TextLink>
          ))}
        </p>
      </div>
      <div className="flex min-w-0 flex-wrap gap-y-4 pl-2.25 max-lg:flex-col max-lg:pl-0">
        {rooms.map((room) => (
          <RoomCut
            level={3}
            key={room.room.roomId}
            gardenId={garden.gardenId}
            shown={room}
            heightPx={heightPx}
            mayAdd={mayAdd}
          />
        ))}
        {rooms.length === 0 && (
          <p className="py-2 text-14 text-ink-soft">
            No room yet.{' '}
            {can(garden.role, 'room.create') ? (
              <TextLink href={at}>Say where the first tent will stand</TextLink>
            ) : (
              'A planner or an owner adds the first.'
            )}
          </p>
        )}
        {adder && (
          <div
            className="flex grow items-end justify-end pl-16 max-lg:justify-start max-lg:pl-0 lg:h-(--tall)"
            style={{ '--tall': `${heightPx + 9}px` } as CSSProperties}
          >
            {adder}
          </div>
        )}
      </div>
    </section>
  );
}
