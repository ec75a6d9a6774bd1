import type { ReactNode } from 'react';
import { TextLink } from './link';
import { PageFoot } from './page-foot';
import { PageNames, type PageName } from './page-names';

interface Crumb {
  words: string;
  href?: string;
}

interface PageFrameProps {
  /** The garden whose pages these are; without one only the gardens stand. */
  garden?: { gardenId: string; name: string } | undefined;
  current?: 'gardens' | 'garden' | 'fixtures' | 'crops' | 'people' | 'compare' | 'account' | 'new' | 'join';
  /** Where one is, inside the garden; the last is this page. */
  crumbs?: readonly Crumb[];
  /** Save state, undo: what belongs to the whole page. */
  right?: ReactNode;
  /** The sentence that is the answer, in place of a title. */
  headline?: ReactNode;
  /** The sentence that is the remedy, with its price and one link. */
  lead?: ReactNode;
  children: ReactNode;
}

function namesOf({ garden, current }: PageFrameProps): PageName[] {
  const all: PageName[] = [{ words: 'Gardens', href: '/gardens', current: current === 'gardens' }];
  if (!garden) {
    return [
      ...all,
      { words: 'Make a garden', href: '/gardens/new', current: current === 'new' },
      { words: 'Join with a code', href: '/gardens/join', current: current === 'join' },
    ];
  }
  const at = `/gardens/${garden.gardenId}`;
  return [
    ...all,
    { words: 'Rooms', href: at, current: current === 'garden' },
    { words: 'Fixtures', href: `${at}/fixtures`, current: current === 'fixtures' },
    { words: 'Crops', href: `${at}/crops`, current: current === 'crops' },
    { words: 'People', href: `${at}/people`, current: current === 'people' },
    { words: 'Compare', href: `${at}/compare`, current: current === 'compare' },
  ];
}

/** A page of a garden: name left, where one is, the other pages; then the sentence that is the answer. */
export function PageFrame(props: PageFrameProps) {
  const { garden, crumbs = [], right, headline, lead, children } = props;
  const trail: Crumb[] = garden
    ? [{ words: garden.name, href: `/gardens/${garden.gardenId}` }, ...crumbs]
    : [...crumbs];
  return (
    <div className="mx-auto min-h-dvh max-w-360 px-18 max-lg:px-8 max-md:px-4">
      <header className="grid grid-cols-[196px_1fr_auto] items-baseline gap-x-6 border-b border-line pt-6 max-lg:grid-cols-[1fr_auto] max-md:pt-4 print:hidden">
        <TextLink href="/gardens" look="plain" className="text-17 font-semibold max-lg:hidden">
          Cellarsun
        </TextLink>
        <Trail trail={trail} />
        <div className="text-right text-14">
          {right ?? (
            <TextLink href="/account" look="quiet" className="inline-flex min-h-6 touch-44 items-center">
              Account
            </TextLink>
          )}
        </div>
        <PageNames names={namesOf(props)} className="col-start-2 max-lg:col-span-2 max-lg:col-start-1" />
      </header>
      <main id="main" tabIndex={-1} className="pb-16 outline-none">
        {headline && (
          <h1 className="max-w-[46rem] pt-7 text-34 font-light text-pretty max-md:pt-5 max-md:text-30">{headline}</h1>
        )}
        {lead && <p className="max-w-[56rem] pt-2 text-17 max-md:text-14">{lead}</p>}
        {children}
      </main>
      <PageFoot />
    </div>
  );
}

function Trail({ trail }: { trail: readonly Crumb[] }) {
  if (trail.length === 0) return <p className="inline-flex min-h-6 items-center text-14 font-semibold">Your gardens</p>;
  return (
    <nav aria-label="Where you are" className="min-w-0 text-14">
      <ol>
        {trail.map((crumb, at) => {
          const last = at === trail.length - 1;
          return (
            <li key={at} className={`inline ${last ? 'font-semibold' : "text-ink-soft after:content-[',_']"}`}>
              {crumb.href && !last ? (
                <TextLink href={crumb.href} look="plain" className="py-1 hover:text-ink">
                  {crumb.words}
                </TextLink>
              ) : (
                <span aria-current={last ? 'page' : undefined}>{crumb.words}</span>
              )}
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
