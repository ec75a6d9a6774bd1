'use client';

import type { Route } from 'next';
import { useRouter } from 'next/navigation';
import { useRef, useState, type FormEvent } from 'react';
import { Button } from '@/app/_components/button';
import { TextLink } from '@/app/_components/link';
import { TextField } from '@/app/_components/text-field';
import { joinSchema } from '@/lib/gardens/garden.schema';
import { useJoinGarden } from '@/lib/gardens/garden.hooks';
import { ApiError } from '@/lib/http/api-client';

export function JoinForm() {
  const router = useRouter();
  const join = useJoinGarden();
  const [code, setCode] = useState('');
  const [problem, setProblem] = useState<string>();
  const field = useRef<HTMLInputElement>(null);
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    const read = joinSchema.safeParse({ code });
    const wrong = read.success ? undefined : read.error.issues[0]?.message;
    setProblem(wrong);
    if (!read.success) return field.current?.focus();
    try {
      const { gardenId } = await join.mutateAsync(read.data.code);
      router.push(`/gardens/${gardenId}` as Route);
      router.refresh();
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setProblem(error.problem.problems?.[0]?.message ?? `${error.problem.title} ${error.problem.detail ?? ''}`.trim());
      field.current?.focus();
    }
  };
  return (
    <form
      method="post"
      noValidate
      onSubmit={(event) => void submit(event)}
      className="flex flex-col gap-5 pt-8 pl-55 max-lg:pl-0"
    >
      <TextField
        label="Code"
        className="w-96"
        autoComplete="one-time-code"
        autoCapitalize="characters"
        spellCheck={false}
        value={code}
        onChange={setCode}
        inputRef={field}
        error={problem}
        safe="What you typed stays. A code works once, so it may have been used already."
        hint="Hyphens, spaces and small letters do not matter."
      />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <Button type="submit" busy={join.isPending && 'Opening it'}>
          Join
        </Button>
        <TextLink href="/gardens">Not now</TextLink>
      </div>
    </form>
  );
}
