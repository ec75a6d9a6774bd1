import type { ReactNode } from 'react';
import { TextLink } from './link';

interface StateProps {
  title: string;
  detail?: ReactNode;
  children?: ReactNode;
}

/** The words of a page that has nothing to draw: a sentence, what to do, one way on. */
export function PageState({ title, detail, children }: StateProps) {
  return (
    <div className="max-w-[40rem] py-10 max-md:py-6">
      <h1 className="text-34 font-light max-md:text-30">{title}</h1>
      {detail && <p className="pt-2 text-17">{detail}</p>}
      {children && <div className="flex flex-wrap items-center gap-x-6 gap-y-2 pt-5">{children}</div>}
    </div>
  );
}

/** While a page is fetched: the place is drawn, dashed, and says so after the eye has had time. */
export function LoadingState({ what = 'the page' }: { what?: string }) {
  return (
    <div role="status" className="py-10">
      <p className="text-17 text-ink-soft">Fetching {what}.</p>
      <div aria-hidden="true" className="mt-6 h-40 w-60 max-w-full border border-dashed border-ink-soft opacity-60" />
    </div>
  );
}

/** Somebody's role does not let them in; says whose does. */
export function ForbiddenState({
  what,
  who = 'an owner of the garden',
  back,
}: {
  what: string;
  who?: string;
  back: string;
}) {
  return (
    <PageState title={`Your role does not let you ${what}.`} detail={`Ask ${who}. Nothing was changed.`}>
      <TextLink href={back}>Go back</TextLink>
    </PageState>
  );
}
