import type { ReactNode } from 'react';
import { TextLink } from './link';
import { PageFoot } from './page-foot';
import { PageNames, type PageName } from './page-names';
import { ScenarioPlates, type ScenarioPlate } from './scenario-plates';

export type TentPage = 'section' | 'light' | 'climate' | 'power' | 'compare' | 'advice' | 'grow';

interface TentFrameProps {
  gardenId: string;
  tent: { tentId: string; name: string; currentScenarioId?: string | null };
  room: { roomId?: string; name: string };
  /** The scenarios of the tent, in their order; each gets a letter. */
  scenarios: readonly ScenarioPlate[];
  scenarioId: string;
  page: TentPage;
  /** A copy to try; absent where the role may not. */
  onTryAnother?: ReactNode;
  /** Undo, redo, save state. */
  right?: ReactNode;
  /** The section draws its own slabs and uses the whole width; the other pages stand on the 1440 grid. */
  wide?: boolean;
  /** One sentence that is the answer, in place of a title. */
  headline?: ReactNode;
  lead?: ReactNode;
  children: ReactNode;
}

/** The pages of a tent that exist; names of pages not built yet are not shown, for nothing may dead-end. */
function namesOf({ gardenId, tent, scenarioId, scenarios, page }: TentFrameProps): PageName[] {
  const at = `/gardens/${gardenId}/tents/${tent.tentId}/${scenarioId}`;
  const all = scenarios.map((each) => each.scenarioId);
  // What the tent runs by is what others are measured against; the open one is never left out.
  const base = all.find((id) => id === tent.currentScenarioId) ?? scenarioId;
  const ids = [...new Set([base, scenarioId, ...all])].slice(0, 4);
  const name = (words: string, key: TentPage, href: string): PageName => ({ words, href, current: page === key });
  return [
    name('Section', 'section', at),
    name('Climate', 'climate', `${at}/climate`),
    name('Power', 'power', `${at}/power`),
    name('Compare', 'compare', `/gardens/${gardenId}/compare?ids=${ids.join(',')}&base=${base}`),
  ];
}

/** "Upstairs": the tent's name and pages, its scenarios as plates, and whether all is saved. */
export function TentFrame(props: TentFrameProps) {
  const { gardenId, tent, room, scenarios, scenarioId, page, onTryAnother, right, wide, headline, lead } = props;
  const edge = wide ? 'px-11 max-lg:px-6 max-md:px-4' : 'px-18 max-lg:px-8 max-md:px-4';
  return (
    <div className={`mx-auto min-h-dvh ${wide ? '' : 'max-w-360'}`}>
      <header className={`border-b border-line ${edge} print:hidden`}>
        <div className="grid grid-cols-[minmax(0,452px)_minmax(0,1fr)_auto] gap-x-6 max-lg:grid-cols-[minmax(0,1fr)_auto]">
          <div className="flex min-w-0 flex-col justify-between pt-2">
            <div className="flex flex-wrap items-baseline gap-x-6">
              {headline ? (
                <span className="text-22 font-semibold max-md:text-17">{tent.name}</span>
              ) : (
                <h1 className="text-22 font-semibold max-md:text-17">{tent.name}</h1>
              )}
              <span className="text-12 text-ink-soft">
                {room.roomId ? (
                  <TextLink href={`/gardens/${gardenId}/rooms/${room.roomId}`} look="opens" className="text-ink-soft">
                    {room.name}
                  </TextLink>
                ) : (
                  room.name
                )}
                ,{' '}
                <TextLink href={`/gardens/${gardenId}`} look="opens" className="text-ink-soft">
                  all rooms
                </TextLink>
              </span>
            </div>
            <PageNames names={namesOf(props)} className="max-lg:hidden" />
          </div>
          <div className="flex min-w-0 flex-wrap items-end gap-x-8 max-lg:order-last max-lg:col-span-2">
            <ScenarioPlates
              plates={scenarios}
              current={scenarioId}
              hrefOf={(id) => `/gardens/${gardenId}/tents/${tent.tentId}/${id}${page === 'section' ? '' : `/${page}`}`}
            />
            {onTryAnother && <div className="pb-3">{onTryAnother}</div>}
          </div>
          <div className="pt-2.5 text-right text-14">{right}</div>
        </div>
        <PageNames names={namesOf(props)} className="lg:hidden" />
      </header>
      <main id="main" tabIndex={-1} className={`outline-none ${wide ? '' : edge}`}>
        {headline && (
          <h1 className="max-w-[46rem] pt-7 text-34 font-light text-pretty max-md:pt-5 max-md:text-30">{headline}</h1>
        )}
        {lead && <p className="max-w-[56rem] pt-2 text-17 max-md:text-14">{lead}</p>}
        {props.children}
      </main>
      <div className={edge}>
        <PageFoot />
      </div>
    </div>
  );
}
