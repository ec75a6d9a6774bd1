'use client';

import { Choice } from '@/app/_components/choice';
import { QuantityField } from '@/app/_components/quantity-field';
import type { Tariff } from '@/lib/evaluation/evaluate-scenario';
import { formatMoney } from '@/lib/format/money';
import type { ReferenceTariff } from '@/lib/tariffs/default-tariff';
import type { RoomPartProps } from './room-view';
import { HourlyPrices } from './hourly-prices';
import { PriceSteps } from './price-steps';

interface TariffPartProps extends RoomPartProps {
  currency: string;
  reference: ReferenceTariff;
}

const referencePrice = ({ tariff }: ReferenceTariff) => (tariff.kind === 'flat' ? tariff.pricePerKwh : 0.3);

/** The same bill in another form, as near as it goes. */
function asKind(kind: Tariff['kind'], from: Tariff | null, currency: string, price: number): Tariff {
  const common = {
    currency,
    ...(from && {
      fixedPerMonth: from.fixedPerMonth,
      taxPct: from.taxPct,
      householdBaseKwhPerMonth: from.householdBaseKwhPerMonth,
    }),
  };
  switch (kind) {
    case 'flat':
      return { ...common, kind, pricePerKwh: price };
    case 'timeOfUse':
      return {
        ...common,
        kind,
        periods: [{ price: Math.round(price * 1300) / 1000, weekdays: 'weekday', from: '17:00', to: '21:00' }],
        otherwise: price,
      };
    case 'tiered':
      return { ...common, kind, tiers: [{ upToKwh: 300, price }, { price: Math.round(price * 1200) / 1000 }] };
  }
}

export function TariffPart({ room, change, readOnly, currency, reference }: TariffPartProps) {
  const { power } = room;
  const tariff = power.tariff;
  // What is typed under the garden's currency is in the garden's currency, whatever the room reckoned in before.
  const put = (next: Tariff | null) => change({ power: { ...power, tariff: next && { ...next, currency } } });
  const price =
    tariff?.kind === 'flat'
      ? tariff.pricePerKwh
      : tariff?.kind === 'timeOfUse'
        ? tariff.otherwise
        : (tariff?.tiers[0]?.price ?? referencePrice(reference));
  return (
    <section className="border-t border-line pt-8 mt-10">
      <div className="flex flex-wrap items-end justify-between gap-4">
        <h2 className="text-22">
          Tariff <span className="text-ink-soft">{currency} a kWh</span>
        </h2>
        <Choice
          label="Kind of tariff"
          hideLabel
          disabled={readOnly}
          value={tariff?.kind ?? 'unknown'}
          options={[
            { value: 'flat', label: 'One price' },
            { value: 'timeOfUse', label: 'By the hour' },
            { value: 'tiered', label: 'By how much is used' },
            { value: 'unknown', label: 'I don’t know' },
          ]}
          onChange={(kind) => put(kind === 'unknown' ? null : asKind(kind as Tariff['kind'], tariff, currency, price))}
        />
      </div>
      {tariff === null && (
        <p className="max-w-[46rem] pt-4 text-14">
          {formatMoney(referencePrice(reference), currency, { digits: 3 })} a kWh is taken, and every cost says so.{' '}
          <span className="text-12 text-ink-soft">Default: {reference.source}.</span>
        </p>
      )}
      {tariff?.kind === 'flat' && (
        <div className="pt-4">
          <QuantityField
            label="Price of a kWh"
            kind="ratio"
            unit={currency}
            min={-10}
            max={1000}
            value={tariff.pricePerKwh}
            disabled={readOnly}
            onCommit={(pricePerKwh) => put({ ...tariff, pricePerKwh })}
          />
        </div>
      )}
      {tariff?.kind === 'timeOfUse' && (
        <HourlyPrices tariff={tariff} put={put} readOnly={readOnly} currency={currency} />
      )}
      {tariff?.kind === 'tiered' && <PriceSteps tariff={tariff} put={put} readOnly={readOnly} currency={currency} />}
      {tariff && (
        <div className="flex flex-wrap gap-4 pt-6">
          <QuantityField
            label="Fixed charge a month"
            kind="ratio"
            unit={currency}
            className="w-44"
            min={0}
            max={1e6}
            value={tariff.fixedPerMonth ?? 0}
            isDefault={tariff.fixedPerMonth === undefined}
            disabled={readOnly}
            onCommit={(fixedPerMonth) => put({ ...tariff, fixedPerMonth })}
          />
          <QuantityField
            label="Tax on top"
            kind="percent"
            className="w-36"
            min={0}
            max={100}
            value={tariff.taxPct ?? 0}
            isDefault={tariff.taxPct === undefined}
            defaultReason="0 where your prices hold it"
            disabled={readOnly}
            onCommit={(taxPct) => put({ ...tariff, taxPct })}
          />
          <QuantityField
            label="The household’s own, a month"
            kind="energy"
            className="w-48"
            min={0}
            max={1e6}
            value={tariff.householdBaseKwhPerMonth ?? 0}
            isDefault={tariff.householdBaseKwhPerMonth === undefined}
            defaultReason="With it, steps and fixed charge are counted as they fall"
            disabled={readOnly}
            onCommit={(householdBaseKwhPerMonth) => put({ ...tariff, householdBaseKwhPerMonth })}
          />
        </div>
      )}
    </section>
  );
}
