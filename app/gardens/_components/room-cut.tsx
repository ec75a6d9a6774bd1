import type { CSSProperties } from 'react';
import { Figure } from '@/app/_components/figure';
import { TextLink } from '@/app/_components/link';
import { VerdictMark } from '@/app/_components/verdict-mark';
import type { RoomOverview, TentShown } from './shown';
import { countWords } from './tent-words';
import { TentPlace } from './tent-place';

interface RoomCutProps {
  gardenId: string;
  shown: RoomOverview;
  heightPx: number;
  /** Under a room without a tent. */
  mayAdd: boolean;
  /** Under a garden's name a room is one level deeper than on the garden's own page. */
  level: 2 | 3;
}

/** A room cut open: slabs and walls hatched, its tents on the floor, each tent's sentence below the slab. */
export function RoomCut({ gardenId, shown, heightPx, mayAdd, level }: RoomCutProps) {
  const { room, tents } = shown;
  const Heading = `h${level}` as const;
  const columns = Math.max(1, tents.length);
  return (
    <section
      aria-labelledby={`room-${room.roomId}`}
      className="-ml-2.25 grid min-w-0 max-w-full grid-cols-1 content-start max-lg:ml-0 lg:[grid-template-columns:var(--columns)]"
      style={{ '--columns': `repeat(${columns}, minmax(0, auto))`, '--tall': `${heightPx}px` } as CSSProperties}
    >
      <div className="hatch-cut pt-2.25 lg:row-start-1 lg:min-w-96 lg:px-2.25 lg:pb-2.25 lg:[grid-column:1/-1]">
        <div className="border-t-[1.5px] border-ink bg-paper lg:h-(--tall) lg:border-[1.5px]">
          <Heading id={`room-${room.roomId}`} className="px-7.5 pt-1.5 text-12 max-lg:px-3 max-lg:pb-1.5 lg:text-right">
            <TextLink
              href={`/gardens/${gardenId}/rooms/${room.roomId}`}
              look="opens"
              className="inline-flex min-h-6 touch-44 items-center font-semibold"
            >
              {room.name}
            </TextLink>
            <span className="pl-2 font-normal text-ink-soft lg:block lg:pl-0">
              <Figure value={shown.airTempC} kind="temperature" /> and {shown.relHumidityPct.toFixed(0)} % in{' '}
              {shown.monthName}
            </span>
          </Heading>
        </div>
      </div>
      {tents.map((tent, at) => (
        <TentColumn key={tent.overview.tent.tentId} {...{ gardenId, tent, at, heightPx, level }} />
      ))}
      {tents.length === 0 && (
        <p className="pt-3 pl-9.75 text-14 text-ink-soft max-lg:pl-3">
          No tent stands here.{' '}
          {mayAdd && <TextLink href={`/gardens/${gardenId}/tents/new?room=${room.roomId}`}>Put one up</TextLink>}
        </p>
      )}
    </section>
  );
}

interface TentColumnProps extends Pick<RoomCutProps, 'gardenId' | 'heightPx' | 'level'> {
  tent: TentShown;
  at: number;
}

function TentColumn({ gardenId, tent, at, heightPx, level }: TentColumnProps) {
  const Heading = `h${level === 2 ? 3 : 4}` as const;
  const { overview, words } = tent;
  const { tent: row, document: doc } = overview;
  const base = `/gardens/${gardenId}/tents/${row.tentId}/${row.currentScenarioId ?? ''}`;
  const column = { '--at': at + 1 } as CSSProperties;
  return (
    <>
      <div
        className="pointer-events-none flex items-end lg:row-start-1 lg:mb-[10.5px] lg:[grid-column:var(--at)] lg:pl-2.25 max-lg:border-b-[1.5px] max-lg:border-ink max-lg:pt-3"
        style={column}
      >
        <TentPlace overview={overview} heightPx={heightPx} />
      </div>
      <div aria-hidden="true" className="hatch-cut h-2.25 lg:hidden" />
      <div
        className="relative pt-2 pr-6 pb-5 pl-9.75 text-14 lg:row-start-2 lg:min-w-56 lg:[grid-column:var(--at)]"
        style={column}
      >
        <Heading>
          <TextLink href={base} look="opens" strong className="inline-flex min-h-6 touch-44 items-center">
            {row.name}
          </TextLink>{' '}
          <span className="font-normal text-ink-soft max-md:block">
            {countWords(doc.tiers.length, 'tier', 'tiers')}, {countWords(doc.placements.length, 'lamp', 'lamps')}
          </span>
        </Heading>
        <p className="max-w-[24rem]">
          <span className="absolute left-0.5">
            <VerdictMark verdict={words.mark.verdict} tone={words.mark.tone} />
          </span>
          {words.figure && <span className={`font-semibold ${FIGURE_TONES[words.mark.tone]}`}>{words.figure}</span>}
          {words.sentence}
        </p>
        {words.link && (
          <TextLink href={`${base}${words.link.page}`} strong>
            {words.link.words}
          </TextLink>
        )}
      </div>
    </>
  );
}

const FIGURE_TONES = {
  lamp: 'text-lamp-ink',
  moss: 'text-moss',
  ember: 'text-ember-ink',
  frost: 'text-frost',
  soft: 'text-ink-soft',
} as const;
