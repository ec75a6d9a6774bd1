'use client';

import type { Route } from 'next';
import { useRouter } from 'next/navigation';
import { useRef, useState, useSyncExternalStore, type FormEvent } from 'react';
import { Button } from '@/app/_components/button';
import { Choice } from '@/app/_components/choice';
import { dropDraft, useDraft } from '@/app/_components/draft';
import { TextLink } from '@/app/_components/link';
import { SelectField } from '@/app/_components/select-field';
import { TextField } from '@/app/_components/text-field';
import type { Tariff } from '@/lib/evaluation/evaluate-scenario';
import { nameField } from '@/lib/gardens/garden.schema';
import { currencies, currencySymbol } from '@/lib/format/money';
import type { UnitSystem } from '@/lib/format/quantity';
import { ApiError, apiSend } from '@/lib/http/api-client';
import { useCreateGarden } from '@/lib/gardens/garden.hooks';
import { keepDrawing, typedTariff } from './keep-drawing';

const money = currencies.map((code) => ({
  value: code,
  label: currencySymbol(code) === code ? code : `${code}, ${currencySymbol(code)}`,
}));

const neverChanges = () => () => {};

/** The money of where the browser says one is; a first guess that stands in the field to be changed. */
function currencyOfBrowser(): string {
  const region = typeof navigator === 'undefined' ? '' : (navigator.language.split('-')[1] ?? '');
  const known: Record<string, string> = {
    US: 'USD',
    GB: 'GBP',
    CA: 'CAD',
    AU: 'AUD',
    NZ: 'NZD',
    CH: 'CHF',
    NO: 'NOK',
    SE: 'SEK',
    DK: 'DKK',
    IS: 'ISK',
    PL: 'PLN',
    CZ: 'CZK',
    JP: 'JPY',
  };
  return known[region] ?? 'EUR';
}

interface NewGardenFormProps {
  /** The price in a drawing that nobody typed; null where no drawing is to be kept. */
  keeping: { standIn: Tariff } | null;
  units: UnitSystem;
}

export function NewGardenForm({ keeping, units: first }: NewGardenFormProps) {
  const router = useRouter();
  const draft = useDraft();
  const typed = keeping && draft ? typedTariff(draft, keeping.standIn) : null;
  const create = useCreateGarden();
  const [gardenId] = useState(() => crypto.randomUUID());
  const [name, setName] = useState('');
  const [chosen, setCurrency] = useState<string | null>(null);
  const [units, setUnits] = useState(first);
  const [nameProblem, setNameProblem] = useState<string>();
  const [problem, setProblem] = useState('');
  const [busy, setBusy] = useState(false);
  const field = useRef<HTMLInputElement>(null);
  const ids = useRef(new Map<string, string>());
  const idOf = (key: string) => {
    const id = ids.current.get(key) ?? crypto.randomUUID();
    ids.current.set(key, id);
    return id;
  };

  // The server does not know the browser's region: the guess stands from hydration on, in the field as in what is sent.
  const guessed = useSyncExternalStore(neverChanges, currencyOfBrowser, () => 'EUR');
  // A drawing that is kept stays as it is, its money too.
  const currency = chosen ?? (keeping && draft ? draft.power.tariff.currency : guessed);

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    const read = nameField.safeParse(name);
    setNameProblem(read.success ? undefined : read.error.issues[0]?.message);
    if (!read.success) return field.current?.focus();
    setBusy(true);
    setProblem('');
    try {
      if (units !== first) await apiSend('PATCH', '/api/v1/account', { unitSystem: units });
      const garden = await create.mutateAsync({ gardenId, name: read.data, currency });
      if (keeping && draft) {
        const tariff = typed?.currency === currency ? typed : null;
        const at = await keepDrawing({ gardenId, draft, tariff, idOf });
        dropDraft();
        router.push(at as Route);
      } else {
        router.push(`/gardens/${garden.gardenId}` as Route);
      }
      router.refresh();
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      setBusy(false);
      setProblem([error.problem.title, error.problem.detail].filter(Boolean).join(' '));
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
        label="Name of the garden"
        className="w-96"
        value={name}
        onChange={setName}
        inputRef={field}
        error={nameProblem}
        hint="As people call it: “Alder Lane”, “School cellar”."
      />
      <SelectField
        label="Money"
        value={currency}
        options={money}
        onChange={setCurrency}
        hint={
          typed && typed.currency !== currency
            ? `The price in your drawing is in ${typed.currency} and stays behind; type yours in the room.`
            : 'Prices and bills of this garden are in it. An owner can change it later; amounts are not converted.'
        }
      />
      <Choice
        label="Units that you read"
        value={units}
        onChange={setUnits}
        options={[
          { value: 'metric', label: 'Metric' },
          { value: 'us', label: 'US' },
        ]}
        hint="Yours alone: everybody in a garden reads their own."
      />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2 pt-2">
        <Button type="submit" busy={busy && 'Making it'}>
          {keeping && draft ? 'Make the garden and keep the drawing' : 'Make the garden'}
        </Button>
        <TextLink href="/gardens">Not now</TextLink>
      </div>
      <p aria-live="polite" className="text-14 font-semibold text-ember-ink">
        {problem}
      </p>
    </form>
  );
}
