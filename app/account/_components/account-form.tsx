'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Choice } from '@/app/_components/choice';
import { SaveState, type SaveStatus } from '@/app/_components/save-state';
import { SectionRow } from '@/app/_components/section-row';
import { TextField } from '@/app/_components/text-field';
import { showTheme } from '@/app/_components/theme-cookie';
import { displayNameField, type Account, type AccountChange } from '@/lib/accounts/account.schema';
import { ApiError, apiSend } from '@/lib/http/api-client';

/** Saves by itself: each change is sent as it is made, and said to be saved. */
function useAccount(first: Account) {
  const router = useRouter();
  const [account, setAccount] = useState(first);
  const [save, setSave] = useState<{ status: SaveStatus; at: number | null }>({ status: 'saved', at: null });
  const [problem, setProblem] = useState<string | null>(null);
  const change = async (part: AccountChange) => {
    const before = account;
    setAccount({ ...account, ...part });
    setSave({ status: 'saving', at: null });
    try {
      await apiSend<Account>('PATCH', '/api/v1/account', part);
      setSave({ status: 'saved', at: Date.now() });
      setProblem(null);
      router.refresh();
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setAccount(before);
      if (part.theme) showTheme(before.theme);
      setSave({ status: 'unsaved', at: null });
      setProblem([error.problem.title, error.problem.detail].filter(Boolean).join(' '));
    }
  };
  return { account, change, save, problem };
}

export function AccountForm({ account: first }: { account: Account }) {
  const { account, change, save, problem } = useAccount(first);
  const [name, setName] = useState(account.displayName);
  const [nameProblem, setNameProblem] = useState<string>();
  const commitName = () => {
    const read = displayNameField.safeParse(name);
    setNameProblem(read.success ? undefined : read.error.issues[0]?.message);
    if (read.success && read.data !== account.displayName) void change({ displayName: read.data });
  };
  return (
    <>
      <SectionRow title="You" about={<SaveState status={save.status} at={save.at} />}>
        <div className="flex flex-col gap-5">
          <TextField
            label="Name that others see"
            autoComplete="name"
            className="w-96"
            value={name}
            onChange={setName}
            onBlur={commitName}
            onKeyDown={(event) => event.key === 'Enter' && commitName()}
            error={nameProblem}
            safe={`Nothing changed: you are still ${account.displayName}.`}
          />
          <div className="text-14">
            <p className="text-12 text-ink-soft">E-mail, for signing in</p>
            <p className="pt-0.5 break-all">{account.email}</p>
          </div>
          <p aria-live="polite" className="text-14 font-semibold text-ember-ink">
            {problem}
          </p>
        </div>
      </SectionRow>
      <SectionRow title="How it looks" about="On this device at once, on your others when they load a page.">
        <div className="flex flex-col gap-6">
          <Choice
            label="Units"
            value={account.unitSystem}
            options={[
              { value: 'metric', label: 'Metric' },
              { value: 'us', label: 'US' },
            ]}
            hint="Any field takes both: 8 ft, 96 in and 2.4 m are read alike."
            onChange={(unitSystem) => void change({ unitSystem })}
          />
          <Choice
            label="Colours"
            value={account.theme}
            options={[
              { value: 'system', label: 'As the device' },
              { value: 'limewash', label: 'Limewash, light' },
              { value: 'cellar', label: 'Cellar, dark' },
            ]}
            onChange={(theme) => {
              showTheme(theme);
              void change({ theme });
            }}
          />
        </div>
      </SectionRow>
    </>
  );
}
