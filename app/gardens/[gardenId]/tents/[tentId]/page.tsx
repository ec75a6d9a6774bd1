import type { Route } from 'next';
import { notFound, redirect } from 'next/navigation';
import { connection } from 'next/server';
import { getActor, getGardenActor } from '@/lib/auth/session';
import { AppError } from '@/lib/http/app-error';
import { listScenarios } from '@/lib/scenarios/scenario.service';
import { getTent } from '@/lib/tents/tent.service';

/** A tent opens on its scenario in use. */
export default async function TentPage({ params }: { params: Promise<{ gardenId: string; tentId: string }> }) {
  await connection();
  const { gardenId, tentId } = await params;
  const path = `/gardens/${gardenId}/tents/${tentId}`;
  const actor = await getGardenActor(gardenId).catch(() => null);
  if (!actor) {
    if (!(await getActor())) redirect(`/sign-in?callbackUrl=${encodeURIComponent(path)}` as Route);
    notFound();
  }
  const scenarioId = await currentScenario();
  redirect(`${path}/${scenarioId}` as Route);

  async function currentScenario(): Promise<string> {
    try {
      const tent = await getTent(actor!, tentId);
      if (tent.currentScenarioId) return tent.currentScenarioId;
      const [first] = await listScenarios(actor!, tentId);
      if (first) return first.scenarioId;
    } catch (error) {
      if (!(error instanceof AppError) || error.status !== 404) throw error;
    }
    notFound();
  }
}
