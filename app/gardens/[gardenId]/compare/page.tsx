import type { Metadata } from 'next';
import { TextLink } from '@/app/_components/link';
import { PageFrame } from '@/app/_components/page-frame';
import { PageState } from '@/app/_components/page-state';
import { compareScenarios } from '@/lib/comparison/comparison.service';
import { MOST_COMPARED } from '@/lib/comparison/comparison.schema';
import { found, isUuid, pageGardenActor } from '@/lib/http/page-access';
import { listChoices } from '@/lib/scenarios/choices.service';
import { CompareView } from './_components/compare-view';

export const metadata: Metadata = { title: 'Compare' };

interface Props {
  params: Promise<{ gardenId: string }>;
  searchParams: Promise<{ ids?: string; base?: string }>;
}

export default async function ComparePage({ params, searchParams }: Props) {
  const { gardenId } = await params;
  const actor = await pageGardenActor(gardenId);
  const { ids = '', base } = await searchParams;
  const { garden, choices } = await listChoices(actor);
  const asked = ids.split(',').filter(isUuid).slice(0, MOST_COMPARED);
  // Without a wish: the scenarios of the first tent that has two.
  const first = choices.find((tent) => tent.scenarios.length > 1) ?? choices[0];
  const wanted = asked.length > 0 ? asked : (first?.scenarios.slice(0, 4).map((scenario) => scenario.scenarioId) ?? []);
  if (wanted.length === 0) {
    return (
      <PageFrame garden={garden} current="compare" crumbs={[{ words: 'compare' }]}>
        <PageState
          title="There is nothing to compare yet."
          detail="Add a tent; then copy its scenario, change one thing, and see both here."
        >
          <TextLink href={`/gardens/${gardenId}`}>To the rooms</TextLink>
        </PageState>
      </PageFrame>
    );
  }
  const comparison = await found(compareScenarios(actor, { ids: wanted, base }));
  return <CompareView garden={garden} choices={choices} comparison={comparison} />;
}
