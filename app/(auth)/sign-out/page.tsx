import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { getActor } from '@/lib/auth/session';
import { CellarRoom } from '../_components/cellar-room';
import { DarkCellar } from '../_components/dark-cellar';
import { SignOutForm } from '../_components/sign-out-form';

export const metadata: Metadata = { title: 'Sign out' };

export default async function SignOutPage() {
  const actor = await getActor();
  if (!actor) redirect('/sign-in' as Route);
  return (
    <CellarRoom drawing={<DarkCellar />} below={<span>All that you typed is saved.</span>}>
      <h1 className="text-34 font-light">Sign out.</h1>
      <p className="pt-1 text-17">You are here as {actor.displayName}. This ends it on this device only.</p>
      <SignOutForm />
    </CellarRoom>
  );
}
