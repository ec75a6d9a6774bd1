'use client';

import { Sentence } from '@/app/_components/sentence';
import { CostLedger } from '@/app/_components/chart/cost-ledger';
import { useWidth } from '@/app/_components/chart/use-width';
import { CautionNote } from '@/app/_components/caution-note';
import { Explainable } from '@/app/_components/explain';
import { TextLink } from '@/app/_components/link';
import { TableBehind } from '@/app/_components/table-behind';
import { heaterNeedW, type Device, type Evaluation, type ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { figureText } from '@/lib/format/figure';
import { formatMoney, formatPrice } from '@/lib/format/money';
import type { Workbench } from '@/lib/scenarios/scenario.schema';
import { MONTH_NAMES, MONTHS_SHORT } from '../../_panels/month-names';
import { TentPanelPage } from '../../_panels/tent-page';
import { CircuitPart } from './circuit-part';

interface PowerViewProps {
  workbench: Workbench;
  document: ScenarioDocument;
  evaluation: Evaluation;
}

const ROWS: [string, Device[]][] = [
  ['Lamps', ['light']],
  ['Heater', ['heater']],
  ['Fans', ['exhaust', 'circulation']],
  ['Pump', ['pump']],
];

const sumOf = (of: Record<Device, number>, devices: Device[]) => devices.reduce((sum, device) => sum + of[device], 0);

function headline({ year }: Evaluation, currency: string): string {
  if (year.energyKwh.total < 0.5) return 'Nothing is plugged in yet, so nothing is paid.';
  const share = year.cost > 0 ? year.costByDevice.heater / year.cost : 0;
  const dearest = year.months.reduce((most, month) => (month.cost > most.cost ? month : most));
  const heater = share > 0.05 ? `The heater takes ${Math.round(share * 100)} % of it` : 'Nearly all of it is the lamps';
  return `A year in this tent costs ${formatMoney(year.cost, currency)}. ${heater}; ${MONTH_NAMES[dearest.month - 1]} is dearest.`;
}

export function PowerView({ workbench, document, evaluation }: PowerViewProps) {
  const { currency } = document.power.tariff;
  const { year } = evaluation;
  const cautions = evaluation.cautions.filter((caution) => /^(circuit|water|heater|plan)\./.test(caution.code));
  const net = year.netLightEnergyKwh;
  const missingW = heaterNeedW(evaluation.heat) - (document.climate.heater?.ratedPowerW ?? 0);
  const lead =
    missingW > 0.5
      ? `Not in it: the ${figureText(missingW, 0)} W of heat that are missing in the coldest hours. A tent that is held warm costs more.`
      : year.energyKwh.light > 1 && net < 0.9 * year.energyKwh.light
        ? `Of the lamps’ ${figureText(year.energyKwh.light, 0)} kWh, ${figureText(year.energyKwh.light - net, 0)} replace heat that the heater would give: dimming them saves less than it seems.`
        : 'Time-of-use prices and another start of the lamps are worth a comparison.';
  return (
    <TentPanelPage
      workbench={workbench}
      document={document}
      evaluation={evaluation}
      page="power"
      headline={headline(evaluation, currency)}
      lead={lead}
    >
      <Ledger evaluation={evaluation} currency={currency} />
      <p className="pt-3 text-12 text-ink-soft">
        An estimate; no meter reading yet.{' '}
        {workbench.room.power.tariff === null && (
          <>
            The price is a default,{' '}
            {document.power.tariff.kind === 'flat' ? formatPrice(document.power.tariff.pricePerKwh, currency) : ''} a
            kWh: {workbench.referenceTariff.source}.{' '}
            <TextLink href={`/gardens/${workbench.garden.gardenId}/rooms/${workbench.room.roomId}`}>
              Type yours
            </TextLink>{' '}
          </>
        )}
        <Explainable path="year.cost">How the year is reckoned</Explainable>. CO₂: {figureText(year.co2Kg, 0)} kg a
        year. Highest draw: {figureText(year.peakPowerW, 0)} W.
      </p>
      <div className="grid grid-cols-1 gap-x-28 gap-y-10 border-t border-line pt-2 mt-10 lg:grid-cols-[minmax(0,636fr)_minmax(0,540fr)]">
        <div>
          <h2 className="pt-6 text-22">Circuits</h2>
          {evaluation.circuits.length === 0 && (
            <p className="pt-2 text-14">
              No circuit is given.{' '}
              <TextLink href={`/gardens/${workbench.garden.gardenId}/rooms/${workbench.room.roomId}`}>
                Add the breaker this hangs on
              </TextLink>
            </p>
          )}
          {evaluation.circuits.map((circuit) => (
            <CircuitPart key={circuit.id} workbench={workbench} document={document} circuit={circuit} />
          ))}
        </div>
        <div>
          <h2 className="pt-6 text-22">Before you plug in</h2>
          <div className="flex flex-col gap-3 pt-3">
            {cautions.map((caution) => (
              <CautionNote
                key={caution.code + caution.where}
                severity={caution.severity}
                text={<Sentence text={caution.text} />}
                source={caution.source}
              />
            ))}
          </div>
        </div>
      </div>
    </TentPanelPage>
  );
}

function Ledger({ evaluation, currency }: { evaluation: Evaluation; currency: string }) {
  const { months, cost, costByDevice, energyKwh } = evaluation.year;
  const [ref, widthPx] = useWidth<HTMLDivElement>(912);
  const money = (value: number) => figureText(value, value >= 100 ? 0 : 2);
  return (
    <section className="pt-10">
      <h2 className="sr-only">Cost by month</h2>
      <div className="lg:grid lg:grid-cols-[196px_minmax(0,1fr)] lg:gap-x-6">
        <p className="pb-3 text-12 text-ink-soft">
          <span className="block text-14 font-semibold text-ink">Money a month</span>
          in {currency}, by device: <span className="text-lamp-ink">lamps plain</span>,{' '}
          <span className="text-ember-ink">heater hatched</span>, fans and pump on top
        </p>
        <div ref={ref} className="min-w-0 overflow-hidden">
          <CostLedger months={months} currency={currency} widthPx={widthPx} heightPx={220} figures />
        </div>
      </div>
      <div className="pt-4">
        <TableBehind
          caption={`Money by month and device, ${currency}`}
          opener="As a table"
          fileName="power.csv"
          columns={[
            { key: 'row', label: 'Device' },
            ...MONTHS_SHORT.map((label, at) => ({ key: `m${at}`, label, align: 'right' as const })),
            { key: 'year', label: 'the year', align: 'right' as const },
          ]}
          rows={[
            ...ROWS.map(([row, devices]) => ({
              row: `${row}, ${currency}`,
              ...Object.fromEntries(months.map((month, at) => [`m${at}`, money(sumOf(month.costByDevice, devices))])),
              year: money(sumOf(costByDevice, devices)),
            })),
            {
              row: 'Energy, kWh',
              ...Object.fromEntries(months.map((month, at) => [`m${at}`, figureText(month.energyKwh.total, 0)])),
              year: figureText(energyKwh.total, 0),
            },
          ]}
          total={{
            row: `All, ${currency}`,
            ...Object.fromEntries(months.map((month, at) => [`m${at}`, money(month.cost)])),
            year: money(cost),
          }}
        />
      </div>
    </section>
  );
}
