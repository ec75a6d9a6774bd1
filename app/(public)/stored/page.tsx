import type { Metadata } from 'next';
import { PageFrame } from '@/app/_components/page-frame';
import { SectionRow } from '@/app/_components/section-row';
import { getActor, SESSION_IDLE_DAYS, SESSION_LONGEST_DAYS } from '@/lib/auth/session';
import { StrangerFrame } from '../_components/stranger-frame';

export const metadata: Metadata = { title: 'What is stored' };

const HEADLINE = 'What is stored, and who sees it.';
const LEAD = 'No trackers, no outside services, no mail. What you type stays in this installation.';

const ROWS = [
  {
    title: 'Before you sign up',
    text: 'Your drawing stays in this browser. Nothing of it is sent until you keep it in a garden. Clearing the site’s data in the browser clears it.',
  },
  {
    title: 'Your account',
    text: 'The name that others see, the address that you sign in with, your units and colours, and a salted, slow hash of the passphrase (Argon2id). The passphrase itself is never kept, so nobody can read it or send it to you.',
  },
  {
    title: 'Signing in',
    text: `One cookie that scripts cannot read, and a row with its hash. It ends after ${SESSION_IDLE_DAYS} days without a visit, after ${SESSION_LONGEST_DAYS} days at the latest, and at once when you sign out. A second cookie remembers your colours. Attempts to sign in are counted for a while, so that guessing does not pay.`,
  },
  {
    title: 'A garden',
    text: 'Its rooms, tents, lamps, targets and scenarios, and who changed what and when. Only its members see it; the server checks that on every request, and the tables refuse rows of another garden.',
  },
  {
    title: 'Leaving',
    text: 'You can leave a garden on its page of people. An owner can delete a garden with everything in it. What a garden planned stays with it when somebody leaves.',
  },
] as const;

export default async function StoredPage() {
  const body = ROWS.map((row) => (
    <SectionRow key={row.title} title={row.title}>
      <p className="max-w-[40rem] text-14">{row.text}</p>
    </SectionRow>
  ));
  return (await getActor()) ? (
    <PageFrame crumbs={[{ words: 'What is stored' }]} headline={HEADLINE} lead={LEAD}>
      {body}
    </PageFrame>
  ) : (
    <StrangerFrame headline={HEADLINE} lead={LEAD}>
      {body}
    </StrangerFrame>
  );
}
