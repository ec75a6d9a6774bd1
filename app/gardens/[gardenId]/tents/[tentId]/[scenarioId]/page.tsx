import type { Metadata, Route } from 'next';
import { headers } from 'next/headers';
import { notFound, redirect } from 'next/navigation';
import { connection } from 'next/server';
import { getActor, getGardenActor } from '@/lib/auth/session';
import { AppError } from '@/lib/http/app-error';
import { evaluateScenarios } from '@/lib/scenarios/evaluation.service';
import type { EvaluatedScenario } from '@/lib/scenarios/scenario.schema';
import { SectionWorkbench } from './_components/section-workbench';
import { plateOf } from './_components/plate-facts';

interface SectionPageProps {
  params: Promise<{ gardenId: string; tentId: string; scenarioId: string }>;
}

export const metadata: Metadata = { title: 'Section' };

/** The scenario and its siblings, each with its evaluation, or the answer that there is none. */
async function load(params: Awaited<SectionPageProps['params']>): Promise<EvaluatedScenario[]> {
  const { gardenId, tentId, scenarioId } = params;
  const actor = await getGardenActor(gardenId).catch(() => null);
  if (!actor) {
    if (!(await getActor()))
      redirect(
        `/sign-in?callbackUrl=${encodeURIComponent(`/gardens/${gardenId}/tents/${tentId}/${scenarioId}`)}` as Route,
      );
    notFound();
  }
  try {
    return await evaluateScenarios(actor, (scenarios) =>
      scenarios.filter((each) => each.tentId === tentId).map((each) => each.scenarioId),
    );
  } catch (error) {
    if (error instanceof AppError && (error.status === 404 || error.status === 403)) notFound();
    throw error;
  }
}

/** A phone says so itself; whatever is guessed, the browser's own width decides before the first touch. */
async function guessedWidthPx(): Promise<number> {
  const asked = await headers();
  const phone = asked.get('sec-ch-ua-mobile') === '?1' || /Mobile|Android|iPhone/.test(asked.get('user-agent') ?? '');
  return phone ? 390 : 1440;
}

export default async function SectionPage({ params }: SectionPageProps) {
  await connection();
  const named = await params;
  const siblings = await load(named);
  const open = siblings.find((each) => each.workbench.scenario.scenarioId === named.scenarioId);
  if (!open) notFound();
  return (
    <SectionWorkbench
      key={named.scenarioId}
      workbench={open.workbench}
      evaluation={open.evaluation}
      plates={siblings.map(plateOf)}
      initialWidthPx={await guessedWidthPx()}
    />
  );
}
