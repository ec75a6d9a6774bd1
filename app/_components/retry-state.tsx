'use client';

import { useEffect } from 'react';
import { Button } from './button';
import { TextLink } from './link';
import { PageState } from './page-state';

interface RetryStateProps {
  error: Error & { digest?: string };
  retry: () => void;
  back?: { href: string; words: string };
}

/** A page that broke: what is safe, and two ways on. */
export function RetryState({
  error,
  retry,
  back = { href: '/gardens', words: 'Go to your gardens' },
}: RetryStateProps) {
  useEffect(() => {
    console.error(error);
  }, [error]);
  return (
    <PageState
      title="This page could not be drawn."
      detail="What was saved before is still saved. Try again; if it stays so, say which page it was and when."
    >
      <Button onClick={retry}>Try again</Button>
      <TextLink href={back.href}>{back.words}</TextLink>
      {error.digest && <span className="text-12 text-ink-soft">Reference {error.digest}</span>}
    </PageState>
  );
}
