import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { TextLink } from '@/app/_components/link';
import { getActor } from '@/lib/auth/session';
import { CellarRoom } from '../_components/cellar-room';
import { DarkCellar } from '../_components/dark-cellar';
import { SignInForm } from '../_components/sign-in-form';
import { pathAfter } from '../_components/path-after';

export const metadata: Metadata = { title: 'Sign in' };

interface SignInProps {
  searchParams: Promise<{ callbackUrl?: string | string[] }>;
}

export default async function SignInPage({ searchParams }: SignInProps) {
  const { callbackUrl } = await searchParams;
  const next = pathAfter(typeof callbackUrl === 'string' ? callbackUrl : undefined);
  if (await getActor()) redirect(next as Route);
  return (
    <CellarRoom
      drawing={<DarkCellar />}
      below={
        <span>
          No account is needed to draw a tent. <TextLink href="/">Draw one first</TextLink>; signing up comes after.
        </span>
      }
    >
      <h1 className="text-34 font-light">Sign in.</h1>
      <p className="pt-1 text-17">Your gardens are as you left them.</p>
      <SignInForm next={next} />
      <p className="pt-8 text-12 text-ink-soft">
        A forgotten passphrase cannot be reset by mail yet: nothing is ever sent to your address.
      </p>
    </CellarRoom>
  );
}
