'use client';

import type { Route } from 'next';
import { useRouter } from 'next/navigation';
import { useRef, useState, type FormEvent } from 'react';
import { Button } from '@/app/_components/button';
import { Choice } from '@/app/_components/choice';
import { TextLink } from '@/app/_components/link';
import { SelectField } from '@/app/_components/select-field';
import { TextField } from '@/app/_components/text-field';
import { useUnits } from '@/app/_components/units-context';
import { ApiError } from '@/lib/http/api-client';
import { firstSizes } from '@/lib/tents/first-sizes';
import { useCreateTent } from '@/lib/tents/tent.hooks';
import { SizedTent, type TentSizes } from './sized-tent';

interface NewTentFormProps {
  gardenId: string;
  rooms: { roomId: string; name: string }[];
  wanted: string;
}

const TIERS = ['1', '2', '3', '4', '5'] as const;
type TierCount = (typeof TIERS)[number];

export function NewTentForm({ gardenId, rooms, wanted }: NewTentFormProps) {
  const router = useRouter();
  const create = useCreateTent(gardenId);
  const [tentId] = useState(() => crypto.randomUUID());
  const [roomId, setRoomId] = useState(wanted);
  const [name, setName] = useState('');
  const units = useUnits();
  const [sizes, setSizes] = useState<TentSizes>(firstSizes[units]);
  const [tiers, setTiers] = useState<TierCount>('2');
  const [problem, setProblem] = useState<{ name?: string; form?: string }>({});
  const field = useRef<HTMLInputElement>(null);

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (name.trim() === '') {
      setProblem({ name: 'Type a name, such as “Boiler-house tent”.' });
      return field.current?.focus();
    }
    try {
      const tent = await create.mutateAsync({
        tentId,
        roomId,
        name: name.trim(),
        body: sizes,
        tierCount: Number(tiers),
      });
      const at = `/gardens/${gardenId}/tents/${tent.tentId}`;
      router.push((tent.currentScenarioId ? `${at}/${tent.currentScenarioId}` : at) as Route);
      router.refresh();
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      const named = error.problem.problems?.find((each) => each.path === 'name');
      setProblem(
        named ? { name: named.message } : { form: `${error.problem.title} ${error.problem.detail ?? ''}`.trim() },
      );
    }
  };
  return (
    <form
      method="post"
      noValidate
      onSubmit={(event) => void submit(event)}
      className="grid grid-cols-[214px_minmax(0,1fr)] gap-x-20 gap-y-8 pt-8 max-lg:grid-cols-1"
    >
      <div className="flex flex-col gap-5">
        <TextField
          label="Name of the tent"
          value={name}
          onChange={setName}
          inputRef={field}
          error={problem.name}
          safe="Nothing is saved yet."
        />
        {rooms.length > 1 ? (
          <SelectField
            label="Room"
            value={roomId}
            options={rooms.map((room) => ({ value: room.roomId, label: room.name }))}
            onChange={setRoomId}
          />
        ) : (
          <div>
            <p className="text-12 text-ink-soft">Room</p>
            <p className="text-14">{rooms[0]?.name}</p>
          </div>
        )}
        <TextLink href={`/gardens/${gardenId}/rooms/new`} className="text-12">
          Another room
        </TextLink>
        <Choice
          label="Tiers, levels of the rack"
          value={tiers}
          onChange={setTiers}
          options={TIERS.map((count) => ({ value: count, label: count }))}
        />
        <div className="flex flex-wrap items-center gap-x-6 gap-y-2 pt-3 max-lg:hidden">
          <Verbs gardenId={gardenId} busy={create.isPending} />
        </div>
        <p aria-live="polite" className="text-14 font-semibold text-ember-ink">
          {problem.form}
        </p>
      </div>
      <SizedTent sizes={sizes} tiers={Number(tiers)} onChange={setSizes} />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2 lg:hidden">
        <Verbs gardenId={gardenId} busy={create.isPending} />
      </div>
    </form>
  );
}

function Verbs({ gardenId, busy }: { gardenId: string; busy: boolean }) {
  return (
    <>
      <Button type="submit" busy={busy && 'Adding it'}>
        Add the tent
      </Button>
      <TextLink href={`/gardens/${gardenId}`}>Not now</TextLink>
    </>
  );
}
