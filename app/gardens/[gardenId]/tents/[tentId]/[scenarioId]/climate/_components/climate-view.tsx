'use client';

import { Sentence } from '@/app/_components/sentence';
import { Explainable } from '@/app/_components/explain';
import { TableBehind } from '@/app/_components/table-behind';
import { useUnits } from '@/app/_components/units-context';
import type { Evaluation, HeatState, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { formatQuantity } from '@/lib/format/quantity';
import type { Workbench } from '@/lib/scenarios/scenario.schema';
import { TentPanelPage } from '../../_panels/tent-page';
import { MONTHS_SHORT } from '../../_panels/month-names';
import { balanceRows } from './balance-rows';
import { climateHeadline, climateLead } from './climate-words';
import { Sizing } from './sizing';
import { WattBalance } from './watt-balance';

interface ClimateViewProps {
  workbench: Workbench;
  document: ScenarioDocument;
  evaluation: Evaluation;
}

export function ClimateView({ workbench, document, evaluation }: ClimateViewProps) {
  const units = useUnits();
  const facts = { document, evaluation, units };
  return (
    <TentPanelPage
      workbench={workbench}
      document={document}
      evaluation={evaluation}
      page="climate"
      headline={climateHeadline(facts)}
      lead={climateLead(facts)}
    >
      <section className="pt-10">
        <h2 className="sr-only">Watts out and in</h2>
        <WattBalance rows={balanceRows(facts)} />
        <p className="max-w-[56rem] pt-4 text-12 text-ink-soft lg:pl-55">
          Upper bar, what leaves; lower bar, what comes in; watts on one scale. Estimates: the fabric within a fifth,
          the plants’ water within two fifths.{' '}
          <Explainable path="heat.coldDark.heater">How the night is reckoned</Explainable>
        </p>
        <div className="pt-2 lg:pl-55">
          <WattTable evaluation={evaluation} />
        </div>
      </section>
      <div className="pt-10">
        <Sizing document={document} evaluation={evaluation} />
      </div>
      <section className="pt-12">
        <h2 className="text-22">The year in the tent</h2>
        <p className="pt-1 text-12 text-ink-soft">
          <Sentence text={evaluation.warnings.join(' ')} />
        </p>
        <YearTable evaluation={evaluation} />
      </section>
    </TentPanelPage>
  );
}

const STATES = [
  ['coldDark', 'Coldest night, lamps off'],
  ['coldDawn', 'Coldest morning, fewest lamps'],
  ['coldLight', 'Coldest day, all lamps'],
] as const;

const PARTS: [keyof HeatState, string][] = [
  ['fabricW', 'Fabric'],
  ['floorW', 'Floor'],
  ['leakageW', 'Leakage'],
  ['exhaustW', 'Exhaust'],
  ['latentW', 'Moisture'],
  ['lampsW', 'Lamps'],
  ['circulationW', 'Fan inside'],
  ['pumpW', 'Pump'],
  ['heaterW', 'Heater'],
];

function WattTable({ evaluation }: { evaluation: Evaluation }) {
  const units = useUnits();
  const watt = (value: number) => formatQuantity(value, 'power', units).figure;
  const { hotLight } = evaluation.heat;
  const hot: Partial<Record<keyof HeatState, number>> = {
    fabricW: hotLight.fabricW,
    floorW: hotLight.floorW,
    leakageW: hotLight.airW,
    latentW: hotLight.latentW,
    lampsW: hotLight.lampsW,
    circulationW: hotLight.circulationW,
    pumpW: hotLight.pumpW,
    exhaustW: hotLight.excessW,
  };
  return (
    <TableBehind
      caption="Watts, as a table"
      opener="As a table"
      fileName="watts.csv"
      columns={[
        { key: 'part', label: 'Part' },
        ...STATES.map(([key, label]) => ({ key, label, unit: 'W', align: 'right' as const })),
        { key: 'hot', label: 'Hottest day', unit: 'W', align: 'right' as const },
      ]}
      rows={PARTS.map(([part, label]) => ({
        part: label,
        ...Object.fromEntries(STATES.map(([key]) => [key, watt(evaluation.heat[key][part])])),
        hot: hot[part] === undefined ? '' : watt(hot[part]!),
      }))}
    />
  );
}

function YearTable({ evaluation }: { evaluation: Evaluation }) {
  const units = useUnits();
  const temp = (value: number) => formatQuantity(value, 'temperature', units).figure;
  const unit = formatQuantity(0, 'temperature', units).unit;
  const degreeHours = (value: number) => formatQuantity(value, 'temperatureDifference', units, { digits: 0 });
  const water = (value: number) => formatQuantity(value, 'volume', units, { digits: 0 });
  const plain = (value: number) => value.toFixed(0);
  const span = (low: string, high: string) => (low === high ? low : `${low} to ${high}`);
  return (
    <div
      className="relative overflow-x-auto pt-4"
      tabIndex={0}
      role="region"
      aria-label="The year in the tent, by month"
    >
      <table className="w-full min-w-[44rem] text-14">
        <caption className="sr-only">Temperature, humidity and water by month</caption>
        <thead>
          <tr className="border-b border-ink text-left text-12">
            <th scope="col" className="sticky left-0 bg-paper py-1 pr-4 font-normal">
              Month
            </th>
            {[
              `Coldest, ${unit}`,
              `Mean, ${unit}`,
              `Warmest, ${unit}`,
              'Humidity, %',
              `Too cold, h·${degreeHours(0).unit}`,
              `Too warm, h·${degreeHours(0).unit}`,
              'Wall wet, h',
              `Water, ${water(0).unit}`,
            ].map((head) => (
              <th key={head} scope="col" className="py-1 pl-4 text-right font-normal">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {evaluation.year.months.map((month) => (
            <tr key={month.month} className="border-b border-line">
              <th scope="row" className="sticky left-0 bg-paper py-1 pr-4 text-left font-normal">
                {MONTHS_SHORT[month.month - 1]}
              </th>
              {[
                temp(month.airTempC.min),
                temp(month.airTempC.mean),
                temp(month.airTempC.max),
                span(plain(month.relHumidityPct.min), plain(month.relHumidityPct.max)),
                degreeHours(month.unmetHeatKh).figure,
                degreeHours(month.overheatKh).figure,
                plain(month.condensationH),
                water(month.waterL).figure,
              ].map((cell, at) => (
                <td key={at} className="py-1 pl-4 text-right">
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      <p className="pt-2 text-12 text-ink-soft">
        Too cold, too warm: each hour times the degrees by which it misses what is to be kept. Water: what the plants
        and trays give off.
      </p>
    </div>
  );
}
