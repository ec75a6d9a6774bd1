import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { PageFrame } from '@/app/_components/page-frame';
import { readAccount } from '@/lib/accounts/account.service';
import { getActor } from '@/lib/auth/session';
import { listGardens } from '@/lib/gardens/garden.service';
import { AccountForm } from './_components/account-form';
import { EndSessions } from './_components/end-sessions';
import { PassphraseChange } from './_components/passphrase-change';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const actor = await getActor();
  if (!actor) redirect('/sign-in?callbackUrl=/account' as Route);
  const gardens = await listGardens(actor);
  const parts = gardens.map((garden) => `${garden.role} of ${garden.name}`);
  return (
    <PageFrame
      current="account"
      crumbs={[{ words: 'Your account' }]}
      right={<span />}
      headline={`You are here as ${actor.displayName}.`}
      lead={parts.length > 0 ? `You are ${parts.join(', ')}.` : 'You belong to no garden yet.'}
    >
      <AccountForm account={readAccount(actor)} />
      <PassphraseChange />
      <EndSessions />
    </PageFrame>
  );
}
