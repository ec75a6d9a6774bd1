import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { PageFrame } from '@/app/_components/page-frame';
import { getActor } from '@/lib/auth/session';
import { landingTariff } from '@/lib/tariffs/landing-tariff';
import { NewGardenForm } from './_components/new-garden-form';

export const metadata: Metadata = { title: 'A new garden' };

export default async function NewGardenPage({ searchParams }: { searchParams: Promise<{ keep?: string }> }) {
  const { keep } = await searchParams;
  const actor = await getActor();
  const keeping = keep === 'drawing';
  const here = keeping ? '/gardens/new?keep=drawing' : '/gardens/new';
  if (!actor) redirect(`/sign-in?callbackUrl=${encodeURIComponent(here)}` as Route);
  return (
    <PageFrame
      current="new"
      crumbs={[{ words: 'Your gardens', href: '/gardens' }, { words: 'a new garden' }]}
      headline={keeping ? 'Your drawing gets a garden to stand in.' : 'A garden of your own.'}
      lead="You are its owner. Nobody else sees it until you give them a code."
    >
      <NewGardenForm keeping={keeping ? { standIn: landingTariff() } : null} units={actor.unitSystem} />
    </PageFrame>
  );
}
