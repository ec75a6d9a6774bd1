'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/app/_components/button';
import { SaveState } from '@/app/_components/save-state';
import { SectionRow } from '@/app/_components/section-row';
import { SelectField } from '@/app/_components/select-field';
import { TextField } from '@/app/_components/text-field';
import { currencies } from '@/lib/format/money';
import { nameField, type Garden, type GardenChange } from '@/lib/gardens/garden.schema';
import { useDeleteGarden, useUpdateGarden } from '@/lib/gardens/garden.hooks';
import { ApiError } from '@/lib/http/api-client';

interface GardenSettingsProps {
  garden: Garden;
  mayChange: boolean;
  mayDelete: boolean;
}

export function GardenSettings({ garden: first, mayChange, mayDelete }: GardenSettingsProps) {
  const router = useRouter();
  const update = useUpdateGarden(first.gardenId);
  const [garden, setGarden] = useState(first);
  const [name, setName] = useState(first.name);
  const [savedAt, setSavedAt] = useState<number | null>(null);
  const [problem, setProblem] = useState<string>();
  if (!mayChange) return null;

  const change = async (part: Omit<GardenChange, 'version'>) => {
    try {
      const saved = await update.mutateAsync({ version: garden.version, ...part });
      setGarden(saved);
      setSavedAt(Date.now());
      setProblem(undefined);
      router.refresh();
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      const current = error.status === 409 ? (error.problem.current as Garden | undefined) : undefined;
      if (current) setGarden(current);
      setProblem(
        current
          ? `Somebody else has just changed it: now “${current.name}”, ${current.currency}. Type yours again if it should be so.`
          : `${error.problem.title} ${error.problem.detail ?? ''}`.trim(),
      );
    }
  };
  const commitName = () => {
    const read = nameField.safeParse(name);
    if (!read.success) return setProblem(read.error.issues[0]?.message);
    if (read.data !== garden.name) void change({ name: read.data });
    else setProblem(undefined);
  };
  return (
    <SectionRow
      title="The garden itself"
      about={<SaveState status={update.isPending ? 'saving' : 'saved'} at={savedAt} />}
    >
      <div className="flex flex-col gap-5">
        <TextField
          label="Name"
          className="w-96"
          value={name}
          onChange={setName}
          onBlur={commitName}
          onKeyDown={(event) => event.key === 'Enter' && commitName()}
          error={problem}
          safe={`Nothing changed: it is still “${garden.name}”.`}
        />
        <SelectField
          label="Money"
          value={garden.currency}
          options={[...new Set([garden.currency, ...currencies])].map((code) => ({ value: code, label: code }))}
          onChange={(currency) => void change({ currency })}
          hint="Amounts are not converted: only the sign before them changes."
        />
        {mayDelete && <DeleteGarden garden={garden} />}
      </div>
    </SectionRow>
  );
}

/** Everything in it goes: the name must be typed first. */
function DeleteGarden({ garden }: { garden: Garden }) {
  const remove = useDeleteGarden(garden.gardenId);
  const [typed, setTyped] = useState('');
  const [problem, setProblem] = useState<string>();
  const end = async () => {
    if (typed.trim() !== garden.name) return setProblem(`Type “${garden.name}” to delete it.`);
    try {
      await remove.mutateAsync();
      window.location.assign('/gardens');
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setProblem(`${error.problem.title} ${error.problem.detail ?? ''}`.trim());
    }
  };
  return (
    <details>
      <summary className="inline-flex min-h-6 touch-44 list-none items-center text-12 link-opens [&::-webkit-details-marker]:hidden">
        Delete this garden
      </summary>
      <div className="flex flex-col items-start gap-3 pt-3">
        <p className="max-w-96 text-14">
          Its rooms, tents, lamps, targets and scenarios go with it, for everybody in it. Nothing brings them back.
        </p>
        <TextField
          label="The garden’s name, to be sure"
          className="w-96"
          value={typed}
          onChange={setTyped}
          error={problem}
          safe="Nothing was deleted."
        />
        <Button look="danger" busy={remove.isPending && 'Deleting it'} onClick={() => void end()}>
          Delete it for good
        </Button>
      </div>
    </details>
  );
}
