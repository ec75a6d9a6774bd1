import type { Metadata } from 'next';
import { documentOf } from '@/lib/scenarios/garden-data';
import { getEvaluatedScenario } from '@/lib/scenarios/evaluation.service';
import { found, pageGardenActor } from '@/lib/http/page-access';
import { notFound } from 'next/navigation';
import { ClimateView } from './_components/climate-view';

export const metadata: Metadata = { title: 'Climate' };

interface Props {
  params: Promise<{ gardenId: string; tentId: string; scenarioId: string }>;
}

export default async function ClimatePage({ params }: Props) {
  const { gardenId, tentId, scenarioId } = await params;
  const actor = await pageGardenActor(gardenId);
  const { workbench, evaluation } = await found(getEvaluatedScenario(actor, scenarioId));
  if (workbench.tent.tentId !== tentId) notFound();
  return <ClimateView workbench={workbench} document={documentOf(workbench)} evaluation={evaluation} />;
}
