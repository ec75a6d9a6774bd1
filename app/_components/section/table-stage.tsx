'use client';

/** The table behind the drawing: the same things in the same order, and the light at ten points across. */
import { useMemo } from 'react';
import { aboveLeavesM, leafHeightM, servedTier, swingDeg, tierBottomM } from '@/lib/scenarios/lamp-pose';
import { TableBehind } from '../table-behind';
import { Inspector } from './inspector';
import type { SectionContext } from './section-context';
import { sectionFrame } from './section-frame';
import { stripProfile } from './light-strip';
import type { StageProps } from './section-stage';
import { useSection } from './use-section';
import { ViewChoice } from './view-choice';
import { BillWords } from './section-foot';
import { CautionsList } from './cautions-list';

const ROOM = { maxWidthPx: 420, maxHeightPx: 620, centrePx: 720, floorPx: 722 };

interface Row extends Record<string, string> {
  id: string;
  thing: string;
  what: string;
  across: string;
  up: string;
  distance: string;
  state: string;
  and: string;
}

function lampRows({ doc, model, words }: SectionContext): Row[] {
  return model.lamps.map((lamp) => {
    const { group, lamp: placed } = lamp;
    const tier = servedTier(placed, doc.tiers);
    const tilt = Math.round(swingDeg(placed, 'front'));
    return {
      id: placed.id,
      thing: words.lamp(lamp),
      what: 'lamp',
      across: words.say(placed.positionM[0], 'length'),
      up: words.say(placed.positionM[2], 'length'),
      distance: `${words.say(aboveLeavesM(placed, tier), 'length')} above the ${tier ? 'leaves' : 'floor'}`,
      state: `${words.say(group.fixture.inputPowerW, 'power')} at ${words.say(placed.dimFrac ?? 1, 'fraction')}, ${group.onAt} for ${Number(group.hours.toFixed(1))} h`,
      and: tilt === 0 ? 'level' : `swung ${Math.abs(tilt)}° to the ${tilt > 0 ? 'right' : 'left'}`,
    };
  });
}

function tierRows({ doc, model, words, verdicts }: SectionContext): Row[] {
  return model.tiers.map(({ tier }) => {
    const verdict = verdicts.get(tier.id);
    return {
      id: tier.id,
      thing: words.tier(tier.id),
      what: `shelf${tier.sites ? `, ${tier.sites.rows * tier.sites.columns} sites` : ''}`,
      across: `${words.say(tier.x0M, 'length')} to ${words.say(tier.x1M, 'length')}`,
      up: words.say(tier.topHeightM, 'length'),
      distance: `leaves at ${words.say(leafHeightM(tier), 'length')}; ${words.say(tier.topHeightM - tierBottomM(tier), 'length')} thick`,
      state: verdict ? `${verdict.dli.toFixed(1)} mol a day, evenness ${verdict.evenness.toFixed(2)}` : '',
      and:
        verdict && verdict.low !== null && verdict.high !== null
          ? `${verdict.verdict} ${Number(verdict.low.toFixed(1))} to ${Number(verdict.high.toFixed(1))} (${doc.tiers.find((each) => each.id === tier.id)?.target?.crop})`
          : 'no crop chosen',
    };
  });
}

function deviceRows({ doc, evaluation, words }: SectionContext): Row[] {
  const { heater, exhaust } = doc.climate;
  const rows: Row[] = [];
  if (heater)
    rows.push({
      id: 'heater',
      thing: 'Heater',
      what: 'heat',
      across: heater.placeM ? words.say(heater.placeM[0], 'length') : 'not said',
      up: heater.placeM ? words.say(heater.placeM[2], 'length') : 'not said',
      distance:
        heater.clearanceM == null ? 'clearance unknown: 1 m' : `keep ${words.say(heater.clearanceM, 'length')} clear`,
      state: words.say(heater.ratedPowerW, 'power'),
      and: evaluation ? `the cold asks for ${words.say(evaluation.heat.recommendedHeaterW, 'power')}` : '',
    });
  if (exhaust)
    rows.push({
      id: 'fan',
      thing: 'Exhaust fan',
      what: 'air out',
      across: '',
      up: '',
      distance: '',
      state: `${words.say(exhaust.maxAirflowM3H, 'airflow')} at most, ${words.say(exhaust.inputPowerW, 'power')}`,
      and: evaluation ? (evaluation.heat.wallDewMarginK >= 0 ? 'the wall stays dry' : 'the wall sweats') : '',
    });
  if (doc.water)
    rows.push({
      id: 'water',
      thing: 'Reservoir and pump',
      what: 'water',
      across: '',
      up: words.say(0, 'length'),
      distance: '',
      state: doc.water.reservoirL === undefined ? 'size not said' : words.say(doc.water.reservoirL, 'volume', 0),
      and: doc.water.flood
        ? `${doc.water.flood.minutes} min every ${Number((doc.water.flood.everyMinutes / 60).toFixed(1))} h`
        : '',
    });
  return rows;
}

/** The mean over the depth at ten places across, between cell centres in a straight line. */
export function tenAcross(mean: readonly number[]): number[] {
  return Array.from({ length: 10 }, (_, i) => {
    const at = ((i + 0.5) / 10) * mean.length - 0.5;
    const low = Math.max(0, Math.min(mean.length - 1, Math.floor(at)));
    const high = Math.min(mean.length - 1, low + 1);
    const share = Math.min(1, Math.max(0, at - low));
    return mean[low]! + (mean[high]! - mean[low]!) * share;
  });
}

export function TableStage({ input, state, chooseView, widthPx }: StageProps & { widthPx: number }) {
  const { widthM, depthM, heightM } = input.doc.tent;
  const frame = useMemo(() => sectionFrame({ widthM, depthM, heightM }, 'front', ROOM), [widthM, depthM, heightM]);
  const { context } = useSection(input, state, frame);
  const { doc, words, evaluation, verdicts, selection, select } = context;
  const upOf = (row: Row) =>
    doc.placements.find((lamp) => lamp.id === row.id)?.positionM[2] ??
    doc.tiers.find((tier) => tier.id === row.id)?.topHeightM ??
    -1;
  const rows = [
    ...[...lampRows(context), ...tierRows(context)].sort((a, b) => upOf(b) - upOf(a)),
    ...deviceRows(context),
  ];
  const choose = (row: Row) => {
    if (doc.placements.some((lamp) => lamp.id === row.id)) select({ kind: 'lamp', id: row.id });
    else if (doc.tiers.some((tier) => tier.id === row.id)) select({ kind: 'tier', id: row.id });
    else select({ kind: row.id as 'heater' | 'fan' | 'water' });
  };
  const fieldRows = context.model.tiers.flatMap(({ tier }) => {
    const result = evaluation?.tiers.find((each) => each.id === tier.id);
    if (!result) return [];
    const ten = tenAcross(stripProfile(result.grid, 'front').mean);
    const verdict = verdicts.get(tier.id);
    const seconds = (verdict?.hours ?? 0) * 0.0036;
    return [
      {
        id: tier.id,
        tier: `${words.tier(tier.id)}, leaves at ${words.say(leafHeightM(tier), 'length')}`,
        ...Object.fromEntries(ten.map((value, i) => [`p${i}`, value.toFixed(0)])),
        mean: result.ppfdUmolM2S.mean.toFixed(0),
        wanted:
          verdict?.low != null && verdict.high != null && seconds > 0
            ? `${(verdict.low / seconds).toFixed(0)} to ${(verdict.high / seconds).toFixed(0)}`
            : '',
      } as Record<string, string>,
    ];
  });
  const at = (i: number) => words.say(((i + 0.5) / 10) * tierWidth(doc) + (doc.tiers[0]?.x0M ?? 0), 'length');
  return (
    <div className={widthPx < 700 ? 'p-4' : 'mx-auto max-w-[1440px] px-11 py-6'}>
      <div className="flex flex-wrap items-start justify-between gap-4">
        <div>
          <h2 className="text-22">
            {doc.name}, <span className="text-ink-soft">the front section as words</span>
          </h2>
          <p className="text-12 text-ink-soft">
            {words.say(widthM, 'length')} wide, {words.say(depthM, 'length')} deep, {words.say(heightM, 'length')} high,
            inside. Places are measured from the left wall and the floor.
          </p>
        </div>
        <ViewChoice view="table" choose={chooseView} quiet />
      </div>
      <TableBehind
        caption="What hangs and stands in the tent"
        order="top to bottom"
        columns={[
          { key: 'thing', label: 'Thing' },
          { key: 'what', label: 'What it is' },
          { key: 'across', label: 'Across', align: 'right' },
          { key: 'up', label: 'Up', align: 'right' },
          { key: 'distance', label: 'Distance' },
          { key: 'state', label: 'State' },
          { key: 'and', label: 'And' },
        ]}
        rows={rows}
      />
      <div className="mt-3 flex flex-wrap gap-x-4 gap-y-1" role="group" aria-label="Type a thing’s figures">
        {rows.map((row) => (
          <button
            key={row.id}
            type="button"
            className="cursor-pointer border-b border-dotted border-ink-soft py-0.5 text-14"
            onClick={() => choose(row)}
          >
            {row.thing}
          </button>
        ))}
      </div>
      {selection && (
        <div className="mt-4 max-w-md">
          <Inspector context={context} />
        </div>
      )}
      <h2 className="mt-8 text-17">
        Light on a level leaf across the width, <span className="text-ink-soft">µmol/m²/s, mean over the depth</span>
      </h2>
      <TableBehind
        caption="Light at ten points across each tier"
        columns={[
          { key: 'tier', label: 'From the left wall' },
          ...Array.from({ length: 10 }, (_, i) => ({ key: `p${i}`, label: at(i), align: 'right' as const })),
          { key: 'mean', label: 'mean', align: 'right' as const },
          { key: 'wanted', label: 'wanted', align: 'right' as const },
        ]}
        rows={fieldRows}
      />
      <div className="mt-8 grid gap-6 md:grid-cols-2">
        <BillWords context={context} />
        <CautionsList context={context} most={8} />
      </div>
    </div>
  );
}

const tierWidth = (doc: SectionContext['doc']) =>
  doc.tiers[0] ? doc.tiers[0].x1M - doc.tiers[0].x0M : doc.tent.widthM;
