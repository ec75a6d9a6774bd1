import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { PageFrame } from '@/app/_components/page-frame';
import { getActor } from '@/lib/auth/session';
import { JoinForm } from './_components/join-form';

export const metadata: Metadata = { title: 'Join a garden' };

export default async function JoinPage() {
  if (!(await getActor())) redirect('/sign-in?callbackUrl=/gardens/join' as Route);
  return (
    <PageFrame
      current="join"
      crumbs={[{ words: 'Your gardens', href: '/gardens' }, { words: 'join one' }]}
      headline="Join a garden with a code."
      lead="An owner makes the code, for one person and seven days. It says what you may do there."
    >
      <JoinForm />
    </PageFrame>
  );
}
