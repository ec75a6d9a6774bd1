'use client';

/** Under the floor slab: what the tent draws from the house. */
import { useId } from 'react';
import { formatMoney, formatPrice } from '@/lib/format/money';
import { figureText } from '@/lib/format/figure';
import { Explainable } from '../explain';
import { Num } from '../num';
import type { SectionContext } from './section-context';
import { MONTHS } from './month-names';
import { YearLedger } from './year-ledger';

export interface Bill {
  month: number;
  because: 'coldest' | 'dearest';
  kwh: number;
  heaterKwh: number;
  lampsKwh: number;
  restKwh: number;
  cost: number;
  yearKwh: number;
  yearCost: number;
}

export function billOf(context: SectionContext): Bill | null {
  const { evaluation, told } = context;
  const month = evaluation?.year.months.find((each) => each.month === told?.month);
  if (!evaluation || !told || !month) return null;
  const { light, heater, total } = month.energyKwh;
  return {
    ...told,
    kwh: total,
    heaterKwh: heater,
    lampsKwh: light,
    restKwh: total - light - heater,
    cost: month.cost,
    yearKwh: evaluation.year.energyKwh.total,
    yearCost: evaluation.year.cost,
  };
}

export function priceWords({ doc, currency }: SectionContext): string {
  const { tariff } = doc.power;
  if (tariff.kind === 'flat') return `at ${formatPrice(tariff.pricePerKwh, currency)} a kWh`;
  return tariff.kind === 'timeOfUse' ? 'by the hour’s price' : 'by the month’s steps';
}

/** The month's kWh and money, and the year's. */
export function BillWords({ context, short }: { context: SectionContext; short?: boolean }) {
  const bill = billOf(context);
  if (!bill) return <p className="text-17 text-ink-soft">The bill is being reckoned.</p>;
  const { edit, currency } = context;
  const empty = context.doc.placements.length === 0 && !context.doc.climate.heater;
  if (empty)
    return (
      <p className="text-17 text-ink-soft">
        <span className="text-30 font-semibold">0</span> kWh a month, until something is plugged in
      </p>
    );
  return (
    <div className="border-l-[3px] border-slate pl-3" aria-busy={context.yearPending || undefined}>
      <p className="text-17 text-ink-soft">
        <Explainable path={`year.months.${bill.month}.energy`}>
          <span className="text-30 font-semibold text-ink">
            <Num text={bill.kwh.toFixed(0)} />
          </span>
        </Explainable>{' '}
        kWh in {MONTHS[bill.month - 1]}
        {short ? (
          ''
        ) : (
          <span className="text-ink">, {edit.held ? 'before this move' : `the ${bill.because} month`}</span>
        )}
      </p>
      <p className="text-14 text-ink-soft">
        <Explainable path={`year.months.${bill.month}.cost`}>
          <span className="font-semibold text-slate">{formatMoney(bill.cost, currency)}</span>
        </Explainable>{' '}
        {priceWords(context)}; {figureText(bill.yearKwh, 0)} kWh over the year
      </p>
      {!short && (
        <p className="text-12 text-ink-soft">
          An estimate. The year costs{' '}
          <Explainable path="year.cost">
            <span>{formatMoney(bill.yearCost, currency)}</span>
          </Explainable>
          .
        </p>
      )}
    </div>
  );
}

export function LedgerWords({
  context,
  widthPx,
  heightPx,
}: {
  context: SectionContext;
  widthPx: number;
  heightPx: number;
}) {
  const { evaluation, told, doc } = context;
  const id = useId().replaceAll(':', '');
  const empty = doc.placements.length === 0 && !doc.climate.heater;
  return (
    <YearLedger
      months={evaluation?.year.months ?? []}
      widthPx={widthPx}
      heightPx={heightPx}
      toldMonth={told?.month ?? 1}
      id={`ledger${id}`}
      empty={empty}
    />
  );
}

export function LedgerKey({ context, row }: { context: SectionContext; row?: boolean }) {
  const bill = billOf(context);
  if (!bill) return null;
  if (bill.kwh <= 0)
    return <p className="text-12 text-ink-soft">Twelve months of light and heat, once there is a lamp.</p>;
  const lines = [
    { fill: 'bg-ember', name: 'heater, hatched', kwh: bill.heaterKwh },
    { fill: 'bg-lamp-fill', name: 'lamps', kwh: bill.lampsKwh },
    { fill: 'bg-slate', name: 'fans, pump', kwh: bill.restKwh },
  ];
  return (
    <ul className={`text-12 text-ink-soft ${row ? 'flex flex-wrap gap-x-5' : ''}`}>
      {lines.map(({ fill, name, kwh }) => (
        <li key={name} className="flex items-center gap-1.5 leading-5">
          <span className={`inline-block h-2 w-2 flex-none ${fill}`} aria-hidden="true" />
          {name} <span className="font-semibold text-ink">{kwh.toFixed(0)}</span> kWh
        </li>
      ))}
    </ul>
  );
}
