'use client';

import { useState } from 'react';
import { useRouter } from 'next/navigation';
import { SelectField } from '@/app/_components/select-field';
import { roleSentences } from '@/lib/auth/permissions';
import { useMembers, useRemoveMember, useUpdateMember } from '@/lib/gardens/garden.hooks';
import type { Member } from '@/lib/gardens/garden.schema';
import { ApiError } from '@/lib/http/api-client';

type Role = Member['role'];
const ROLES: Role[] = ['owner', 'planner', 'tender', 'viewer'];

interface MemberRowsProps {
  gardenId: string;
  members: Member[];
  mayChange: boolean;
}

export function MemberRows({ gardenId, members: first, mayChange }: MemberRowsProps) {
  const { data: members } = useMembers(gardenId, first);
  return (
    <ul className="mt-8 border-t border-ink">
      {members.map((member) => (
        <MemberRow key={member.accountId} {...{ gardenId, member, mayChange }} />
      ))}
    </ul>
  );
}

/** How a refusal reads beside the person it is about. */
const wordsOf = (error: unknown): string => {
  if (!(error instanceof ApiError)) throw error;
  return `${error.problem.title} ${error.problem.detail ?? ''}`.trim();
};

function MemberRow({ gardenId, member, mayChange }: { gardenId: string; member: Member; mayChange: boolean }) {
  const update = useUpdateMember(gardenId);
  const [problem, setProblem] = useState('');
  const changeRole = async (role: Role) => {
    setProblem('');
    await update.mutateAsync({ accountId: member.accountId, role }).catch((error) => setProblem(wordsOf(error)));
  };
  return (
    <li className="grid grid-cols-[minmax(0,18rem)_214px_minmax(0,1fr)_13rem] items-center gap-x-6 gap-y-2 border-b border-line py-3 max-md:grid-cols-1">
      <div className="min-w-0">
        <p className="text-14 font-semibold">
          {member.displayName}
          {member.you && <span className="font-normal text-ink-soft">, you</span>}
        </p>
        <p className="text-12 break-all text-ink-soft">{member.email}</p>
      </div>
      {mayChange ? (
        <SelectField
          label={`Role of ${member.displayName}`}
          hideLabel
          value={member.role}
          disabled={update.isPending}
          options={ROLES.map((role) => ({ value: role, label: role[0]!.toUpperCase() + role.slice(1) }))}
          onChange={(role) => void changeRole(role as Role)}
        />
      ) : (
        <p className="text-14">{member.role[0]!.toUpperCase() + member.role.slice(1)}</p>
      )}
      <p className="text-12 text-ink-soft" aria-live="polite">
        {problem ? <span className="font-semibold text-ember-ink">{problem}</span> : roleSentences[member.role]}
      </p>
      <Leaving {...{ gardenId, member, mayChange }} onProblem={setProblem} />
    </li>
  );
}

interface LeavingProps {
  gardenId: string;
  member: Member;
  mayChange: boolean;
  onProblem: (words: string) => void;
}

/** Removing asks once more, in the same place, in words. */
function Leaving({ gardenId, member, mayChange, onProblem }: LeavingProps) {
  const router = useRouter();
  const remove = useRemoveMember(gardenId);
  const [asked, setAsked] = useState(false);
  if (!mayChange && !member.you) return <span />;
  const go = async () => {
    try {
      await remove.mutateAsync(member.accountId);
      if (member.you) window.location.assign('/gardens');
      else router.refresh();
    } catch (error) {
      setAsked(false);
      onProblem(wordsOf(error));
    }
  };
  const verb = 'min-h-6 touch-44 cursor-pointer text-12 underline underline-offset-4';
  return asked ? (
    <span className="flex gap-4 md:justify-end">
      <button type="button" className={`${verb} text-ember-ink`} onClick={() => void go()} disabled={remove.isPending}>
        {member.you ? 'Leave now' : `Remove ${member.displayName}`}
      </button>
      <button type="button" className={`${verb} text-ink-soft`} onClick={() => setAsked(false)}>
        Keep
      </button>
    </span>
  ) : (
    <button
      type="button"
      className={`${verb} justify-self-start text-ink-soft md:justify-self-end`}
      aria-label={member.you ? 'Leave this garden' : `Remove ${member.displayName}`}
      onClick={() => setAsked(true)}
    >
      {member.you ? 'Leave' : 'Remove'}
    </button>
  );
}
