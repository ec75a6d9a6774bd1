'use client';

import { signIn } from 'next-auth/react';
import { useRef, useState, type FormEvent } from 'react';
import { Button } from '@/app/_components/button';
import { TextLink } from '@/app/_components/link';
import { TextField } from '@/app/_components/text-field';
import { ShowWord } from './show-word';

const WRONG = 'Address and passphrase do not belong together. Type both again.';
const AWAY = 'The server cannot be reached. What you typed is kept; try again.';

export function SignInForm({ next }: { next: string }) {
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [shown, setShown] = useState(false);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<{ where: 'email' | 'password'; words: string } | null>(null);
  const emailField = useRef<HTMLInputElement>(null);
  const passwordField = useRef<HTMLInputElement>(null);

  const fail = (where: 'email' | 'password', words: string) => {
    setBusy(false);
    setProblem({ where, words });
    (where === 'email' ? emailField : passwordField).current?.focus();
  };
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (email.trim() === '') return fail('email', 'Type your e-mail address.');
    if (password === '') return fail('password', 'Type your passphrase.');
    setBusy(true);
    setProblem(null);
    const answer = await signIn('credentials', { email, password, redirect: false }).catch(() => null);
    if (!answer || (!answer.ok && answer.status !== 401)) return fail('password', AWAY);
    if (!answer.ok) return fail('password', WRONG);
    // A whole new page: what was fetched as a stranger must not linger.
    window.location.assign(next);
  };
  return (
    <form method="post" noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-3 pt-7">
      <TextField
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        className="w-96"
        value={email}
        onChange={setEmail}
        inputRef={emailField}
        error={problem?.where === 'email' ? problem.words : undefined}
      />
      <TextField
        label="Passphrase"
        name="password"
        type={shown ? 'text' : 'password'}
        autoComplete="current-password"
        className="w-96"
        value={password}
        onChange={setPassword}
        inputRef={passwordField}
        beside={<ShowWord shown={shown} onToggle={() => setShown(!shown)} />}
        error={problem?.where === 'password' ? problem.words : undefined}
        safe="After several wrong ones the account rests for a while; nothing in it changes."
      />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2 pt-4">
        <Button type="submit" busy={busy && 'Signing in'}>
          Sign in
        </Button>
        <TextLink href="/sign-up">I have no account yet</TextLink>
      </div>
    </form>
  );
}
