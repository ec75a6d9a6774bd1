'use client';

import { useRef, useState, type FormEvent } from 'react';
import { PassphraseField } from '@/app/(auth)/_components/passphrase-field';
import { Button } from '@/app/_components/button';
import { SectionRow } from '@/app/_components/section-row';
import { TextField } from '@/app/_components/text-field';
import { passwordChangeSchema } from '@/lib/accounts/account.schema';
import { ApiError, apiSend } from '@/lib/http/api-client';

type Problems = Partial<Record<'current' | 'next' | 'form', string>>;

function problemsOf(error: ApiError): Problems {
  const known = (error.problem.problems ?? []).filter((each) => each.path === 'current' || each.path === 'next');
  if (known.length === 0) return { form: [error.problem.title, error.problem.detail].filter(Boolean).join(' ') };
  return Object.fromEntries(known.map((each) => [each.path, each.message]));
}

export function PassphraseChange() {
  const [current, setCurrent] = useState('');
  const [next, setNext] = useState('');
  const [problems, setProblems] = useState<Problems>({});
  const [said, setSaid] = useState('');
  const [busy, setBusy] = useState(false);
  const currentField = useRef<HTMLInputElement>(null);
  const nextField = useRef<HTMLInputElement>(null);

  const show = (found: Problems) => {
    setProblems(found);
    if (found.current) currentField.current?.focus();
    else if (found.next) nextField.current?.focus();
  };
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setSaid('');
    const read = passwordChangeSchema.safeParse({ current, next });
    if (!read.success) {
      return show(Object.fromEntries(read.error.issues.map((issue) => [String(issue.path[0]), issue.message])));
    }
    setBusy(true);
    try {
      await apiSend('POST', '/api/v1/account/password', read.data);
      setCurrent('');
      setNext('');
      show({});
      setSaid('The passphrase is changed. Every other device of yours is signed out.');
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      show(problemsOf(error));
    } finally {
      setBusy(false);
    }
  };
  return (
    <SectionRow title="Passphrase" about="Changing it ends every other sign-in of yours.">
      <form method="post" noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-5">
        <TextField
          label="Present passphrase"
          type="password"
          name="current"
          autoComplete="current-password"
          className="w-96"
          value={current}
          onChange={setCurrent}
          inputRef={currentField}
          error={problems.current}
          safe="Nothing changed."
        />
        <PassphraseField
          label="New passphrase"
          name="next"
          value={next}
          onChange={setNext}
          inputRef={nextField}
          error={problems.next}
        />
        <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
          <Button type="submit" busy={busy && 'Changing it'}>
            Change the passphrase
          </Button>
          <p aria-live="polite" className={problems.form ? 'text-14 font-semibold text-ember-ink' : 'text-14'}>
            {problems.form ?? said}
          </p>
        </div>
      </form>
    </SectionRow>
  );
}
