'use client';

import { useState } from 'react';
import { Button } from '@/app/_components/button';
import { Choice } from '@/app/_components/choice';
import { SectionRow } from '@/app/_components/section-row';
import { roleSentences } from '@/lib/auth/permissions';
import { useCreateJoinCode, useDeleteJoinCode, useJoinCodes } from '@/lib/gardens/garden.hooks';
import type { JoinCode } from '@/lib/gardens/garden.schema';
import { ApiError } from '@/lib/http/api-client';

type GivenRole = JoinCode['role'];

const day = (iso: string) => new Date(iso).toLocaleDateString('en-GB', { day: 'numeric', month: 'long' });

export function JoinCodes({ gardenId, codes: first }: { gardenId: string; codes: JoinCode[] }) {
  const { data: codes } = useJoinCodes(gardenId, first);
  const create = useCreateJoinCode(gardenId);
  const [role, setRole] = useState<GivenRole>('tender');
  const [made, setMade] = useState<(JoinCode & { code: string }) | null>(null);
  const [problem, setProblem] = useState('');
  const make = async () => {
    try {
      setProblem('');
      setMade(await create.mutateAsync(role));
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setProblem(`${error.problem.title} ${error.problem.detail ?? ''}`.trim());
    }
  };
  return (
    <SectionRow title="Let somebody in" about="A code works once and for seven days. Say it, write it down or send it.">
      <div className="flex flex-col items-start gap-4">
        <Choice
          label="They come as a"
          value={role}
          onChange={setRole}
          layout="column"
          className="pl-3"
          options={(['planner', 'tender', 'viewer'] as const).map((each) => ({
            value: each,
            label: each[0]!.toUpperCase() + each.slice(1),
            hint: roleSentences[each],
          }))}
        />
        <Button onClick={() => void make()} busy={create.isPending && 'Making one'}>
          Make a code
        </Button>
        <div aria-live="polite">
          {problem && <p className="text-14 font-semibold text-ember-ink">{problem}</p>}
          {made && <MadeCode made={made} onGone={() => setMade(null)} />}
        </div>
        {codes.length > 0 && (
          <div>
            <h3 className="text-12 text-ink-soft">Open codes</h3>
            <ul>
              {codes.map((code) => (
                <OpenCode key={code.joinCodeId} gardenId={gardenId} code={code} onGone={() => setMade(null)} />
              ))}
            </ul>
          </div>
        )}
      </div>
    </SectionRow>
  );
}

function MadeCode({ made, onGone }: { made: JoinCode & { code: string }; onGone: () => void }) {
  const [said, setSaid] = useState('');
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(made.code);
      setSaid('Copied.');
    } catch {
      setSaid('This browser does not let a page copy. Select it instead.');
    }
  };
  return (
    <div className="border-l-[3px] border-l-lamp pl-3">
      <p className="font-mono text-22 break-all select-all max-md:text-17">{made.code}</p>
      <p className="pt-1 text-12 text-ink-soft">
        For one {made.role}, until {day(made.expiresAt)}. It is shown this once: only its fingerprint is kept.
      </p>
      <p className="flex flex-wrap gap-x-5 pt-1 text-12">
        <button type="button" className="min-h-6 touch-44 link-does" onClick={() => void copy()}>
          Copy
        </button>
        <button type="button" className="min-h-6 touch-44 link-does" onClick={onGone}>
          I have it
        </button>
        <span aria-live="polite" className="text-ink-soft">
          {said}
        </span>
      </p>
    </div>
  );
}

function OpenCode({ gardenId, code, onGone }: { gardenId: string; code: JoinCode; onGone: () => void }) {
  const remove = useDeleteJoinCode(gardenId);
  return (
    <li className="flex items-center gap-x-5 text-14">
      <span>
        One {code.role}, until {day(code.expiresAt)}
      </span>
      <button
        type="button"
        className="min-h-6 touch-44 text-12 link-does"
        disabled={remove.isPending}
        onClick={() => {
          onGone();
          remove.mutate(code.joinCodeId);
        }}
      >
        Take it back
      </button>
    </li>
  );
}
