'use client';

import { signOut } from 'next-auth/react';
import { useState } from 'react';
import { Button } from '@/app/_components/button';
import { TextLink } from '@/app/_components/link';

export function SignOutForm() {
  const [busy, setBusy] = useState(false);
  const [failed, setFailed] = useState(false);
  const leave = async () => {
    setBusy(true);
    setFailed(false);
    try {
      await signOut({ redirect: false });
      window.location.assign('/sign-in');
    } catch {
      setBusy(false);
      setFailed(true);
    }
  };
  return (
    <div className="pt-7">
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <Button busy={busy && 'Signing out'} onClick={() => void leave()}>
          Sign out
        </Button>
        <TextLink href="/gardens">Stay, and go to the gardens</TextLink>
      </div>
      <p aria-live="polite" className="pt-3 text-14 font-semibold text-ember-ink">
        {failed && 'The server cannot be reached. You are still signed in; try again.'}
      </p>
    </div>
  );
}
