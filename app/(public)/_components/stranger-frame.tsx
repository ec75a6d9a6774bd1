import type { ReactNode } from 'react';
import { TextLink } from '@/app/_components/link';
import { PageFoot } from '@/app/_components/page-foot';

interface StrangerFrameProps {
  headline: string;
  lead: string;
  children: ReactNode;
}

/** A page of words for whoever is not signed in. */
export function StrangerFrame({ headline, lead, children }: StrangerFrameProps) {
  return (
    <div className="mx-auto min-h-dvh max-w-360 px-18 max-lg:px-8 max-md:px-4">
      <header className="flex min-h-17 items-center justify-between border-b border-line">
        <TextLink href="/" look="plain" className="inline-flex min-h-6 touch-44 items-center text-17 font-semibold">
          Cellarsun
        </TextLink>
        <TextLink href="/sign-in" look="opens" className="inline-flex min-h-6 touch-44 items-center text-14">
          Sign in
        </TextLink>
      </header>
      <main id="main" tabIndex={-1} className="pb-16 outline-none">
        <h1 className="max-w-[46rem] pt-7 text-34 font-light text-pretty max-md:pt-5 max-md:text-30">{headline}</h1>
        <p className="max-w-[56rem] pt-2 text-17 max-md:text-14">{lead}</p>
        {children}
      </main>
      <PageFoot />
    </div>
  );
}
