import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { found, pageGardenActor } from '@/lib/http/page-access';
import { getEvaluatedScenario } from '@/lib/scenarios/evaluation.service';
import { documentOf } from '@/lib/scenarios/garden-data';
import { PowerView } from './_components/power-view';

export const metadata: Metadata = { title: 'Power' };

interface Props {
  params: Promise<{ gardenId: string; tentId: string; scenarioId: string }>;
}

export default async function PowerPage({ params }: Props) {
  const { gardenId, tentId, scenarioId } = await params;
  const actor = await pageGardenActor(gardenId);
  const { workbench, evaluation } = await found(getEvaluatedScenario(actor, scenarioId));
  if (workbench.tent.tentId !== tentId) notFound();
  return <PowerView workbench={workbench} document={documentOf(workbench)} evaluation={evaluation} />;
}
