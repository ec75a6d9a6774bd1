import {
  createLightCache,
  evaluateScenario,
  type Evaluation,
  type ScenarioDocument,
} from '@/lib/evaluation/evaluate-scenario';
import type { UnitSystem } from '@/lib/format/quantity';
import { waysOut, type WayOut } from '@/lib/scenarios/ways-out';
import { sectionWords } from '@/app/_components/section/section-words';
import { TextLink } from '@/app/_components/link';
import type { TentShown } from './shown';

const pause = () => new Promise<void>((resolve) => setImmediate(resolve));

interface RemedyProps {
  worst: TentShown;
  gardenId: string;
  units: UnitSystem;
}

/** The cheapest way out, tried with the whole physics; null where no small change would do or none can be tried. */
async function cheapest(doc: ScenarioDocument, evaluation: Evaluation, tierId: string): Promise<WayOut | null> {
  const lightCache = createLightCache();
  try {
    const [way] = await waysOut(doc, evaluation, tierId, {
      evaluate: (trial, { year }) => evaluateScenario(trial, { year, lightCache }),
      pause,
    });
    return way ?? null;
  } catch {
    return null;
  }
}

/** What would help the tent that wants a person most, with its price, and one link. */
export async function Remedy({ worst, gardenId, units }: RemedyProps) {
  const { overview, words } = worst;
  const { document: doc, evaluation, tent } = overview;
  const href = `/gardens/${gardenId}/tents/${tent.tentId}/${tent.currentScenarioId ?? ''}${words.link?.page ?? ''}`;
  const link = <TextLink href={href}>{words.link?.words ?? 'Open the tent'}</TextLink>;
  const way = words.tierId ? await cheapest(doc, evaluation, words.tierId) : null;
  const say = sectionWords(doc.tiers, units);
  const price = way && say.wayPrice(way);
  const sentence = way
    ? `${say.way(way)} would do${price ? `, for ${price}` : ''}.`
    : words.tierId
      ? 'No small change of its lamps would do.'
      : (words.remedy ?? '');
  return (
    <>
      {sentence} {link}
    </>
  );
}
