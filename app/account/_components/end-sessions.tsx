'use client';

import { useState } from 'react';
import { Button } from '@/app/_components/button';
import { TextLink } from '@/app/_components/link';
import { SectionRow } from '@/app/_components/section-row';
import { ApiError, apiSend } from '@/lib/http/api-client';

export function EndSessions() {
  const [problem, setProblem] = useState('');
  const [busy, setBusy] = useState(false);
  const end = async () => {
    setBusy(true);
    try {
      await apiSend('DELETE', '/api/v1/account/sessions');
      window.location.assign('/sign-in');
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setBusy(false);
      setProblem(`${error.problem.title} You are still signed in everywhere.`);
    }
  };
  return (
    <SectionRow title="Signing out" about="A sign-in ends by itself after seven days without a visit.">
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <TextLink href="/sign-out">Sign out on this device</TextLink>
        <Button look="outline" busy={busy && 'Signing out'} onClick={() => void end()}>
          Sign out everywhere
        </Button>
      </div>
      <p className="pt-2 text-12 text-ink-soft">Everywhere means every browser and phone, this one too.</p>
      <p aria-live="polite" className="pt-2 text-14 font-semibold text-ember-ink">
        {problem}
      </p>
    </SectionRow>
  );
}
