'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { signIn } from 'next-auth/react';
import { useEffect, useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { Button } from '@/app/_components/button';
import { useDraft } from '@/app/_components/draft';
import { TextLink } from '@/app/_components/link';
import { RhfTextField } from '@/app/_components/text-field';
import { signUpSchema, type SignUp } from '@/lib/accounts/account.schema';
import { ApiError, apiSend } from '@/lib/http/api-client';
import { PassphraseField } from './passphrase-field';

/** Inches where the browser says so; it can be changed on the account's page at any time. */
const unitsOfBrowser = () => (/^en-(US|LR)/.test(navigator.language) ? 'us' : 'metric');

export function SignUpForm() {
  const draft = useDraft();
  const [refusal, setRefusal] = useState<string | null>(null);
  const form = useForm<SignUp>({
    resolver: zodResolver(signUpSchema),
    defaultValues: { displayName: '', email: '', password: '' },
    mode: 'onSubmit',
    reValidateMode: 'onChange',
  });
  const { control, handleSubmit, setError, formState, setFocus } = form;

  useEffect(() => {
    // On a phone it would raise the keyboard over the page.
    if (matchMedia('(pointer: fine)').matches) setFocus('displayName');
  }, [setFocus]);

  const send = async (input: SignUp) => {
    setRefusal(null);
    try {
      await apiSend('POST', '/api/v1/accounts', { ...input, unitSystem: unitsOfBrowser() });
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      const known = error.problem.problems?.filter((each) => /^(displayName|email|password)$/.test(each.path)) ?? [];
      for (const each of known)
        setError(each.path as keyof SignUp, { message: each.message }, { shouldFocus: each === known[0] });
      if (known.length === 0) setRefusal([error.problem.title, error.problem.detail].filter(Boolean).join(' '));
      return;
    }
    const answer = await signIn('credentials', { ...input, redirect: false }).catch(() => null);
    window.location.assign(answer?.ok ? (draft ? '/gardens/new?keep=drawing' : '/gardens') : '/sign-in');
  };
  return (
    <form
      method="post"
      noValidate
      onSubmit={(event) => void handleSubmit(send)(event)}
      className="flex flex-col gap-4 pt-7"
    >
      <RhfTextField
        control={control}
        name="displayName"
        label="Name that others see"
        autoComplete="name"
        className="w-96"
      />
      <RhfTextField
        control={control}
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        className="w-96"
        safe="Nothing you typed is lost."
      />
      <Controller
        control={control}
        name="password"
        render={({ field, fieldState }) => (
          <PassphraseField
            value={field.value}
            onChange={field.onChange}
            inputRef={field.ref}
            error={fieldState.error?.message}
          />
        )}
      />
      <div aria-live="polite">{refusal && <p className="text-14 font-semibold text-ember-ink">{refusal}</p>}</div>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2 pt-1">
        <Button type="submit" busy={formState.isSubmitting && 'Signing up'}>
          {draft ? 'Sign up and keep it' : 'Sign up'}
        </Button>
        <TextLink href="/sign-in">I have an account</TextLink>
      </div>
    </form>
  );
}
