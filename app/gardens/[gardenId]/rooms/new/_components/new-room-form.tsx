'use client';

import type { Route } from 'next';
import { useRouter } from 'next/navigation';
import { useRef, useState, type FormEvent } from 'react';
import { Button } from '@/app/_components/button';
import { CautionNote } from '@/app/_components/caution-note';
import { Choice } from '@/app/_components/choice';
import { TextLink } from '@/app/_components/link';
import { QuantityField } from '@/app/_components/quantity-field';
import { TextField } from '@/app/_components/text-field';
import { ApiError } from '@/lib/http/api-client';
import { useCreateRoom } from '@/lib/rooms/room.hooks';
import { placeOfClock, yearBetween } from './two-months';

type Supply = '230' | '120';
type Residual = 'yes' | 'no' | 'unknown';

export function NewRoomForm({ gardenId, dollars }: { gardenId: string; dollars: boolean }) {
  const router = useRouter();
  const create = useCreateRoom(gardenId);
  const [roomId] = useState(() => crypto.randomUUID());
  const [name, setName] = useState('');
  const [coldC, setColdC] = useState<number | null>(null);
  const [warmC, setWarmC] = useState<number | null>(null);
  const [supply, setSupply] = useState<Supply>(dollars ? '120' : '230');
  const [ratingA, setRatingA] = useState<number | null>(null);
  const [residual, setResidual] = useState<Residual>('unknown');
  const [problems, setProblems] = useState<{ name?: string; cold?: string; warm?: string; form?: string }>({});
  const nameInput = useRef<HTMLInputElement>(null);
  const coldInput = useRef<HTMLInputElement>(null);
  const warmInput = useRef<HTMLInputElement>(null);
  const usualA = supply === '120' ? 15 : 16;

  const check = () => {
    const found: typeof problems = {};
    if (name.trim() === '') found.name = 'Type a name, such as “Cellar”.';
    if (coldC === null) found.cold = 'Type how cold it gets. A guess is enough.';
    if (warmC === null) found.warm = 'Type how warm it gets. A guess is enough.';
    else if (coldC !== null && warmC < coldC)
      found.warm = 'The warmest month cannot be colder than the coldest. Type the higher of the two here.';
    setProblems(found);
    (found.name ? nameInput : found.cold ? coldInput : found.warm ? warmInput : null)?.current?.focus();
    return Object.keys(found).length === 0;
  };
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (!check() || coldC === null || warmC === null) return;
    const { south, ...place } = placeOfClock();
    try {
      const room = await create.mutateAsync({
        roomId,
        name: name.trim(),
        place: { ...place, altitudeM: 0 },
        climate: { airTempC: yearBetween({ coldC, warmC, south }) },
        power: {
          supplyV: Number(supply),
          // What nobody has read off the breaker is not given; loads are then not checked, and a caution says so.
          circuits: ratingA === null ? [] : [{ id: 'c1', name: `${name.trim()} sockets`, ratingA }],
          tariff: null,
        },
        residualCurrentDevice: residual,
      });
      router.push(`/gardens/${gardenId}/tents/new?room=${room.roomId}` as Route);
      router.refresh();
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setProblems({ form: `${error.problem.title} ${error.problem.detail ?? ''}`.trim() });
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
        label="Name of the room"
        className="w-96"
        value={name}
        onChange={setName}
        inputRef={nameInput}
        error={problems.name}
      />
      <div className="flex flex-wrap gap-x-6 gap-y-5">
        <QuantityField
          label="Coldest month, mean of its air"
          kind="temperature"
          value={coldC}
          min={-40}
          max={60}
          onCommit={setColdC}
          inputRef={coldInput}
          error={coldC === null ? problems.cold : undefined}
          safe="Nothing is saved yet."
          hint="12 °C and 54 °F are read alike."
        />
        <QuantityField
          label="Warmest month, mean of its air"
          kind="temperature"
          value={warmC}
          min={-40}
          max={60}
          onCommit={setWarmC}
          inputRef={warmInput}
          error={problems.warm}
          safe="Nothing is saved yet."
          hint="The months between follow; each can be typed later."
        />
      </div>
      <div className="flex flex-wrap items-start gap-x-10 gap-y-5">
        <Choice
          label="Sockets"
          value={supply}
          onChange={setSupply}
          options={[
            { value: '230', label: '230 V' },
            { value: '120', label: '120 V' },
          ]}
        />
        <QuantityField
          label="Breaker of that circuit"
          kind="current"
          value={ratingA ?? usualA}
          min={1}
          max={200}
          onCommit={setRatingA}
          isDefault={ratingA === null}
          defaultReason="Read it on the breaker; until you do, no circuit is counted."
          onConfirmDefault={() => setRatingA(usualA)}
        />
      </div>
      <Choice
        label="Residual-current or ground-fault device of 30 mA or less"
        value={residual}
        onChange={setResidual}
        options={[
          { value: 'yes', label: 'Yes' },
          { value: 'no', label: 'No' },
          { value: 'unknown', label: 'I don’t know' },
        ]}
      />
      {residual !== 'yes' && (
        <CautionNote
          severity="warning"
          text="Water will stand beside mains here. Until you know of such a device it counts as missing. Ask a licensed electrician; local code decides."
        />
      )}
      <p className="max-w-96 text-12 text-ink-soft">
        Place and clock start as this device has them, the price of power as the mean of the country’s households; both
        stand on the room’s page to be put right.
      </p>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <Button type="submit" busy={create.isPending && 'Adding it'}>
          Add the room
        </Button>
        <TextLink href={`/gardens/${gardenId}`}>Not now</TextLink>
      </div>
      <p aria-live="polite" className="text-14 font-semibold text-ember-ink">
        {problems.form}
      </p>
    </form>
  );
}
