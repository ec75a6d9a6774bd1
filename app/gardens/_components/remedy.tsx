import { createLightCache, evaluateScenario } from '@/lib/evaluation/evaluate-scenario';
import type { UnitSystem } from '@/lib/format/quantity';
import { waysOut } from '@/lib/scenarios/ways-out';
import { sectionWords } from '@/app/_components/section/section-words';
import { TextLink } from '@/app/_components/link';
import type { TentShown } from './shown';

const pause = () => new Promise<void>((resolve) => setImmediate(resolve));

interface RemedyProps {
  worst: TentShown;
  gardenId: string;
  units: UnitSystem;
}

/** The cheapest way out for the tier that wants one most, tried with the whole physics; told with its price. */
export async function Remedy({ worst, gardenId, units }: RemedyProps) {
  const { overview, words } = worst;
  const { document: doc, evaluation, tent } = overview;
  const href = `/gardens/${gardenId}/tents/${tent.tentId}/${tent.currentScenarioId ?? ''}${words.link?.page ?? ''}`;
  const link = <TextLink href={href}>{words.link?.words ?? 'Open the tent'}</TextLink>;
  if (!words.tierId) return link;
  const lightCache = createLightCache();
  try {
    const [way] = await waysOut(doc, evaluation, words.tierId, {
      evaluate: (trial, { year }) => evaluateScenario(trial, { year, lightCache }),
      pause,
    });
    if (!way) return <>No small change of its lamps would do. {link}</>;
    const say = sectionWords(doc.tiers, units);
    const price = say.wayPrice(way);
    return (
      <>
        {say.way(way)} would do{price && `, for ${price}`}. {link}
      </>
    );
  } catch {
    return link;
  }
}
