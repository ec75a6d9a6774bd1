'use client';

import { useEffect, useMemo, useState } from 'react';
import { Button } from '@/app/_components/button';
import { keepDraft, useDraft } from '@/app/_components/draft';
import { TextLink } from '@/app/_components/link';
import { PageFoot } from '@/app/_components/page-foot';
import { LiveTent } from '@/app/_components/section/live-tent';
import type { ScenarioDocument, Target } from '@/lib/evaluation/evaluate-scenario';
import { LandingWords } from './landing-words';

export interface LandingCrop {
  crop: string;
  stage: string;
  target: Target;
}

const LAMP = 'bar-left';

const OWN_NAME = 'A new tent';

/** An empty tent in the same cellar, to draw one's own. */
function emptied(doc: ScenarioDocument): ScenarioDocument {
  const { heater: _heater, exhaust: _exhaust, ...climate } = doc.climate;
  return { ...doc, name: OWN_NAME, tiers: [], placements: [], climate, water: undefined };
}

/** The lamp has the keys from the start, unless a finger or a link came first. */
function useLampFocus(wanted: boolean) {
  useEffect(() => {
    if (!wanted || !matchMedia('(pointer: fine) and (min-width: 1180px)').matches) return;
    if (document.activeElement && document.activeElement !== document.body) return;
    document.querySelector<SVGElement>(`[data-lamp="${LAMP}"]`)?.focus({ preventScroll: true });
  }, [wanted]);
}

/** Two lines of words: above a narrow tent; on a wide page in its left column, where the leader of the lamp would start. */
function Headline({ moved }: { moved: boolean }) {
  return (
    <div className="z-10 px-4 pb-3 md:px-6 min-[1180px]:pointer-events-none min-[1180px]:absolute min-[1180px]:top-30 min-[1180px]:left-[max(44px,calc(50%-676px))] min-[1180px]:w-[calc(min(676px,50%-44px)-290px)] min-[1180px]:p-0">
      <h1 className="text-30 font-light min-[1400px]:text-34">
        A tent in a cold cellar.
        <br />
        <span className="text-lamp-ink">Move the lamp.</span>
      </h1>
      <p className={`pt-2 text-14 text-ink-soft ${moved ? 'invisible max-[1179px]:hidden' : ''}`}>
        Drag it, or press the up and down keys. Every figure follows your hand.
      </p>
    </div>
  );
}

export function LandingTent({ document: example, crops }: { document: ScenarioDocument; crops: LandingCrop[] }) {
  const draft = useDraft();
  const [edited, setEdited] = useState<ScenarioDocument | null>(null);
  const doc = edited ?? draft ?? example;
  // A drawing of one's own, from today or from before: its fields stand where the example's words would.
  const own = doc.name === OWN_NAME;
  const change = (next: ScenarioDocument) => {
    setEdited(next);
    keepDraft(next);
  };
  const words = useMemo(
    () => (own ? undefined : <LandingWords doc={doc} crops={crops} onChange={change} />),
    // `change` closes over nothing that varies.
    [own, doc, crops],
  );
  useLampFocus(!own);
  return (
    <div className="min-h-dvh">
      <header className="flex min-h-17 flex-wrap items-center justify-between gap-x-8 px-11 max-lg:px-6 max-md:px-4">
        <p className="text-22 font-semibold max-md:text-17">Cellarsun</p>
        <p className="text-14 text-ink-soft max-lg:hidden">
          Light, warmth and the bill of a tent for growing, worked out as you draw it
        </p>
        <nav aria-label="Pages" className="flex gap-x-6 text-14">
          <TextLink href="/sources" look="opens" className="inline-flex min-h-6 touch-44 items-center max-md:hidden">
            Where the figures come from
          </TextLink>
          <TextLink href="/sign-in" look="opens" className="inline-flex min-h-6 touch-44 items-center">
            Sign in
          </TextLink>
        </nav>
      </header>
      <main id="main" tabIndex={-1} className="relative outline-none">
        {own ? <h1 className="sr-only">A tent of your own, cut open</h1> : <Headline moved={edited !== null} />}
        <LiveTent
          key={own ? 'own' : 'example'}
          document={doc}
          onChange={change}
          initialWidthPx={1440}
          initialSelection={own ? null : { kind: 'lamp', id: LAMP }}
          left={words}
          footEnd={
            <div>
              <div className="flex flex-wrap items-center gap-x-6 gap-y-2 pt-3">
                <TextLink href="/sign-up" look="button">
                  Keep this tent
                </TextLink>
                {own ? (
                  <Button look="plain" onClick={() => change(example)}>
                    Back to the example
                  </Button>
                ) : (
                  <Button
                    look="plain"
                    onClick={() => {
                      // The button stands at the foot; the empty tent begins at the top.
                      window.scrollTo({ top: 0 });
                      change(emptied(example));
                    }}
                  >
                    Draw my own
                  </Button>
                )}
              </div>
              <p className="pt-1.5 text-12 text-ink-soft">No account till you keep it. Nothing is sent.</p>
            </div>
          }
        />
      </main>
      <div className="px-11 max-lg:px-6 max-md:px-4">
        <PageFoot />
      </div>
    </div>
  );
}
