'use client';

import { useRouter } from 'next/navigation';
import type { Route } from 'next';
import { type ReactNode } from 'react';
import { CostLedger } from '@/app/_components/chart/cost-ledger';
import { CheckField } from '@/app/_components/check-field';
import { Choice } from '@/app/_components/choice';
import { Figure } from '@/app/_components/figure';
import { TextLink } from '@/app/_components/link';
import { PageFrame } from '@/app/_components/page-frame';
import type { ComparisonColumn } from '@/lib/comparison/comparison';
import type { Comparison } from '@/lib/comparison/comparison.service';
import { MOST_COMPARED } from '@/lib/comparison/comparison.schema';
import { figureText } from '@/lib/format/figure';
import { formatMoney, minorPerMajor } from '@/lib/format/money';
import type { Garden } from '@/lib/gardens/garden.schema';
import type { TentChoices } from '@/lib/scenarios/choices.service';
import { CostAgainstLight } from './cost-against-light';
import { cautionWords, difference, headline, lightWords, moneyDifference, paybackWords } from './compare-words';
import { LightRange } from './light-range';

interface CompareViewProps {
  garden: Garden;
  choices: TentChoices[];
  comparison: Comparison;
}

export function CompareView({ garden, choices, comparison }: CompareViewProps) {
  const router = useRouter();
  const { columns } = comparison;
  const base = columns.find((column) => column.scenarioId === comparison.base) ?? columns[0]!;
  const address = (ids: readonly string[], baseId: string) =>
    `/gardens/${garden.gardenId}/compare?ids=${ids.join(',')}&base=${baseId}`;
  const ids = columns.map((column) => column.scenarioId);
  const go = (next: readonly string[], baseId: string) =>
    router.replace(address(next, next.includes(baseId) ? baseId : next[0]!) as Route, { scroll: false });
  const toggle = (id: string) => {
    const next = ids.includes(id) ? ids.filter((each) => each !== id) : [...ids, id].slice(0, MOST_COMPARED);
    if (next.length > 0) go(next, base.scenarioId);
  };
  return (
    <PageFrame
      garden={garden}
      current="compare"
      crumbs={[{ words: 'compare' }]}
      headline={headline(columns, base)}
      lead={columns.length === 1 && <TryAnother gardenId={garden.gardenId} column={base} />}
    >
      <div className="relative overflow-x-auto pt-8">
        <CompareTable columns={columns} base={base} gardenId={garden.gardenId} />
      </div>
      <CostAgainstLight columns={columns} />
      <section className="grid grid-cols-1 gap-8 border-t border-line pt-6 mt-10 md:grid-cols-2">
        <div>
          <h2 className="pb-2 text-17">Which to compare</h2>
          {choices.map((tent) => (
            <fieldset key={tent.tentId} className="pb-3">
              <legend className="text-12 text-ink-soft">{tent.name}</legend>
              {tent.scenarios.map((scenario) => (
                <CheckField
                  key={scenario.scenarioId}
                  label={scenario.name}
                  checked={ids.includes(scenario.scenarioId)}
                  onChange={() => toggle(scenario.scenarioId)}
                />
              ))}
            </fieldset>
          ))}
        </div>
        <div>
          <Choice
            label="Measured against, the baseline"
            layout="column"
            value={base.scenarioId}
            options={columns.map((column) => ({ value: column.scenarioId, label: column.name }))}
            onChange={(next) => go(ids, next)}
          />
          <p className="pt-4 text-14">
            <a
              className="link-does"
              href={`/api/v1/gardens/${garden.gardenId}/comparison/csv?ids=${ids.join(',')}&base=${base.scenarioId}`}
              download
            >
              Save as CSV
            </a>
          </p>
        </div>
      </section>
      <p className="pt-6 text-12 text-ink-soft">
        Estimates: reflected light within a fifth, money within some 15 %. Differences between scenarios are surer than
        the figures themselves.
      </p>
    </PageFrame>
  );
}

function TryAnother({ gardenId, column }: { gardenId: string; column: ComparisonColumn }) {
  return (
    <TextLink href={`/gardens/${gardenId}/tents/${column.tentId}/${column.scenarioId}`}>
      Open its section and press “Try another”
    </TextLink>
  );
}

function CompareTable({
  columns,
  base,
  gardenId,
}: {
  columns: readonly ComparisonColumn[];
  base: ComparisonColumn;
  gardenId: string;
}) {
  const most =
    Math.max(
      1,
      ...columns.flatMap((column) => column.tiers.flatMap((tier) => [tier.dliMolM2D.max, tier.highMolM2D ?? 0])),
    ) * 1.05;
  const mostMoney = Math.max(1e-9, ...columns.flatMap((column) => column.months.map((month) => month.cost)));
  const { currency } = base;
  const signed = (column: ComparisonColumn, text: string) => (column === base ? null : text);
  const upFront = (column: ComparisonColumn) => column.upFrontMinor / minorPerMajor(column.currency);
  return (
    <table
      className="border-separate border-spacing-x-4 border-spacing-y-0 text-14 -mx-4"
      style={{ minWidth: `${11 + columns.length * 15}rem` }}
    >
      <caption className="sr-only">Scenarios side by side, differences from {base.name}</caption>
      <thead>
        <tr className="text-left align-bottom">
          <td className="w-45 min-w-45" />
          {columns.map((column) => (
            <th
              key={column.scenarioId}
              scope="col"
              className={`w-60 border-t py-2 font-normal ${column === base ? 'border-t-ink' : 'border-t-line'}`}
            >
              <TextLink
                href={`/gardens/${gardenId}/tents/${column.tentId}/${column.scenarioId}`}
                look="opens"
                className="text-17 font-semibold"
              >
                {column.name}
              </TextLink>
              <span className="block text-12 text-ink-soft">
                {column === base ? `baseline, ${column.tentName}` : column.tentName}
              </span>
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        <Row label="Light" note="mol a day: mean, range, the crop’s band" columns={columns}>
          {(column) => {
            const words = lightWords(column);
            return (
              <>
                {column.tiers.map((tier, at) => (
                  <span key={at} className="flex items-center justify-between gap-2 py-0.5">
                    <span className="w-14 shrink-0 truncate text-12 text-ink-soft">{tier.name}</span>
                    <LightRange tier={tier} most={most} />
                    <span className="w-10 text-right font-semibold">{figureText(tier.dliMolM2D.mean, 1)}</span>
                    <span className="w-10 text-right text-12 text-ink-soft">
                      {signed(
                        column,
                        base.tiers[at] ? difference(tier.dliMolM2D.mean, base.tiers[at].dliMolM2D.mean, 1, '') : '',
                      )}
                    </span>
                  </span>
                ))}
                <span className={`block pt-1 text-12 ${words.good ? 'text-moss' : 'text-ember-ink'}`}>
                  {words.text}
                </span>
              </>
            );
          }}
        </Row>
        <Row label="Evenness" note="of the least even tier" columns={columns}>
          {(column) => (
            <Pair
              value={column.evenness === null ? '–' : figureText(column.evenness, 2)}
              by={signed(
                column,
                column.evenness !== null && base.evenness !== null
                  ? difference(column.evenness, base.evenness, 2, '')
                  : '',
              )}
            />
          )}
        </Row>
        <Row label="Heat" note="needed in the coldest hours" columns={columns}>
          {(column) => (
            <>
              <Pair
                value={<Figure value={column.heaterNeedW} kind="power" bold />}
                by={signed(column, difference(column.heaterNeedW, base.heaterNeedW, 0, 'W'))}
              />
              <span
                className={`block text-12 ${column.heaterRatedW + 0.5 >= column.heaterNeedW ? 'text-moss' : 'text-ember-ink'}`}
              >
                {column.heaterRatedW + 0.5 >= column.heaterNeedW
                  ? column.heaterNeedW > 0
                    ? `the ${figureText(column.heaterRatedW, 0)} W heater holds it`
                    : 'no heater needed'
                  : `${figureText(column.heaterNeedW - column.heaterRatedW, 0)} W short`}
              </span>
            </>
          )}
        </Row>
        <Row label="Money up front" columns={columns}>
          {(column) => (
            <Pair
              value={formatMoney(upFront(column), column.currency)}
              by={signed(column, moneyDifference(upFront(column), upFront(base), currency))}
            />
          )}
        </Row>
        <Row label="Money a month" note="mean of the year" columns={columns}>
          {(column) => (
            <Pair
              value={formatMoney(column.costPerMonth, column.currency)}
              by={signed(column, moneyDifference(column.costPerMonth, base.costPerMonth, currency))}
            />
          )}
        </Row>
        <Row label="Payback" note="against the baseline" columns={columns}>
          {(column) => {
            const { text, note } = paybackWords(column, base);
            return <Pair value={text} by={note ?? null} />;
          }}
        </Row>
        <Row
          label="Year ledger"
          note={`${currency} a month by device, one scale; a short line is the baseline’s month`}
          columns={columns}
        >
          {(column) => (
            <>
              <CostLedger
                months={column.months}
                currency={column.currency}
                widthPx={232}
                heightPx={120}
                most={mostMoney}
                base={column === base ? undefined : base.months}
              />
              <Pair
                value={`${formatMoney(column.costPerYear, column.currency)} a year`}
                by={signed(column, moneyDifference(column.costPerYear, base.costPerYear, currency))}
              />
            </>
          )}
        </Row>
        <Row
          label="Cautions"
          note="dangers must be put right; warnings stand on each one’s power page"
          columns={columns}
        >
          {(column) => <Pair value={cautionWords(column)} by={null} />}
        </Row>
      </tbody>
    </table>
  );
}

interface RowProps {
  label: string;
  note?: string;
  columns: readonly ComparisonColumn[];
  children: (column: ComparisonColumn) => ReactNode;
}

function Row({ label, note, columns, children }: RowProps) {
  return (
    <tr className="align-top">
      <th scope="row" className="sticky left-0 z-10 border-t border-line bg-paper py-2.5 text-left font-normal">
        {label}
        {note && <span className="block max-w-40 text-12 text-ink-soft">{note}</span>}
      </th>
      {columns.map((column) => (
        <td key={column.scenarioId} className="border-t border-line py-2.5">
          {children(column)}
        </td>
      ))}
    </tr>
  );
}

function Pair({ value, by }: { value: ReactNode; by: string | null }) {
  return (
    <span className="flex items-baseline justify-between gap-2">
      <span className="text-17 font-semibold">{value}</span>
      {by && <span className="text-right text-12 text-ink-soft">{by}</span>}
    </span>
  );
}
