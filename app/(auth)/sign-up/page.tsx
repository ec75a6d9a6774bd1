import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { TextLink } from '@/app/_components/link';
import { getActor } from '@/lib/auth/session';
import { CellarRoom } from '../_components/cellar-room';
import { KeptDrawing } from '../_components/kept-drawing';
import { SignUpForm } from '../_components/sign-up-form';

export const metadata: Metadata = { title: 'Sign up' };

export default async function SignUpPage() {
  if (await getActor()) redirect('/gardens' as Route);
  return (
    <CellarRoom
      drawing={<KeptDrawing />}
      below={
        <span>
          No account is needed to go on drawing. <TextLink href="/">Back to the tent</TextLink>
        </span>
      }
    >
      <h1 className="text-34 font-light">Keep your tent.</h1>
      <p className="pt-1 text-17">
        An account costs nothing and asks for three things. Nobody sees your tent until you invite them.
      </p>
      <SignUpForm />
      <p className="pt-8 text-12 text-ink-soft">
        The address is only for signing in: nothing is sent to it, so a forgotten passphrase cannot be reset by mail.
        Keep it where you keep keys.{' '}
        <TextLink href="/stored" look="opens" className="inline-flex min-h-6 touch-44 items-center">
          What is stored
        </TextLink>
      </p>
    </CellarRoom>
  );
}
