'use client';

import { Fragment, useState, type KeyboardEvent } from 'react';
import { Button } from '@/app/_components/button';
import { Choice } from '@/app/_components/choice';
import { PageFrame } from '@/app/_components/page-frame';
import { StandingMark, type ShownStanding } from '@/app/_components/standing-mark';
import { TableBehind } from '@/app/_components/table-behind';
import { TextField } from '@/app/_components/text-field';
import { useUnits } from '@/app/_components/units-context';
import { useWidth } from '@/app/_components/chart/use-width';
import type { CropFigure, CropStage } from '@/lib/crops/crop.schema';
import { formatQuantity, type UnitSystem } from '@/lib/format/quantity';
import type { Garden } from '@/lib/gardens/garden.schema';
import { useGardenTargets } from '@/lib/targets/target.hooks';
import type { GardenTarget } from '@/lib/targets/target.schema';
import { AddCrop } from './add-crop';
import { Band } from './band';
import { cropRows, matches, type CropRow } from './crop-rows';
import { OpenCrop } from './open-crop';

interface CropsViewProps {
  garden: Garden;
  crops: CropStage[];
  targets: GardenTarget[];
  grown: string[];
  mayEdit: boolean;
}

const MOST_MOL = 40;
const KEY: ShownStanding[] = ['read', 'secondary', 'computed', 'judgement', 'recalled', 'own'];

const degrees = (figure: CropFigure | null, units: UnitSystem) => {
  if (!figure) return '–';
  const one = (value: number) => formatQuantity(value, 'temperature', units, { digits: 0 }).figure;
  const { low, target, high } = figure;
  if (low !== null && high !== null) return `${one(low)} to ${one(high)}`;
  const only = target ?? low ?? high;
  return only === null ? '–' : one(only);
};

export function CropsView({ garden, crops, targets: initial, grown, mayEdit }: CropsViewProps) {
  const units = useUnits();
  const { data: targets = initial } = useGardenTargets(garden.gardenId, initial);
  const all = cropRows(crops, targets);
  const ours = all.filter((row) => grown.includes(row.key) || row.own);
  const [which, setWhich] = useState<'ours' | 'all'>(ours.length > 0 ? 'ours' : 'all');
  const [search, setSearch] = useState('');
  const [open, setOpen] = useState<string | null>(null);
  const [adding, setAdding] = useState(false);
  const [ref, widthPx] = useWidth<HTMLDivElement>(1200);
  const bandPx = Math.max(140, Math.min(380, widthPx * 0.3));
  const rows = (which === 'ours' ? ours : all).filter((row) => matches(row, search));
  const unsure = ours.filter((row) => row.standing === 'recalled' || row.standing === 'judgement');
  const onKeyDown = (event: KeyboardEvent<HTMLButtonElement>) => {
    if (event.key === 'Escape') setOpen(null);
    const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    if (!step) return;
    event.preventDefault();
    const buttons = [...(ref.current?.querySelectorAll<HTMLButtonElement>('button[data-crop]') ?? [])];
    buttons[buttons.indexOf(event.currentTarget) + step]?.focus();
  };
  return (
    <PageFrame
      garden={garden}
      current="crops"
      crumbs={[{ words: 'crops' }]}
      headline="What a crop wants in a day. Where books differ, you see both."
      lead={
        unsure.length > 0
          ? `${unsure.length} of your ${ours.length} ${unsure.length === 1 ? 'rests' : 'rest'} on memory or judgement: ${unsure.map((row) => row.crop).join(', ')}.`
          : `${crops.length} crops and stages, each figure with its source.`
      }
    >
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4 pt-6">
        <Choice
          label="Which crops"
          hideLabel
          value={which}
          options={[
            { value: 'ours', label: `Grown here, ${ours.length}` },
            { value: 'all', label: `All ${all.length}` },
          ]}
          onChange={setWhich}
        />
        <TextField
          label="Search"
          value={search}
          onChange={setSearch}
          placeholder="a crop, or mol > 15"
          className="w-72"
        />
        <ul className="flex flex-wrap gap-x-4 gap-y-1 text-12" aria-label="What the marks mean">
          {KEY.map((standing) => (
            <li key={standing}>
              <StandingMark standing={standing} />
            </li>
          ))}
        </ul>
      </div>
      <div ref={ref} className="relative overflow-x-auto pt-4">
        <table className="w-full text-14" style={{ minWidth: 640 }}>
          <caption className="sr-only">Daily light, hours and temperatures by crop and stage</caption>
          <thead>
            <tr className="border-b border-ink text-left text-12">
              <th scope="col" className="py-1.5 pr-4 font-normal">
                Crop, stage
              </th>
              <th scope="col" className="pr-4 font-normal" style={{ width: bandPx + 40 }}>
                Light in a day, 0 to {MOST_MOL} mol
              </th>
              <th scope="col" className="pr-4 font-normal">
                Light, h
              </th>
              <th scope="col" className="pr-4 font-normal">
                Day, {formatQuantity(0, 'temperature', units).unit}
              </th>
              <th scope="col" className="pr-4 font-normal">
                Night
              </th>
              <th scope="col" className="font-normal">
                How it is known
              </th>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <Fragment key={row.key}>
                <tr className="border-b border-line">
                  <th scope="row" className="py-1 pr-4 text-left font-normal">
                    <button
                      type="button"
                      data-crop
                      className="link-opens min-h-8 text-left touch-44"
                      aria-expanded={open === row.key}
                      onClick={() => setOpen(open === row.key ? null : row.key)}
                      onKeyDown={onKeyDown}
                    >
                      <span className="font-semibold">{row.crop}</span>{' '}
                      <span className="text-ink-soft">{row.stage}</span>
                    </button>
                  </th>
                  <td className="pr-4 pl-6">
                    <Band
                      {...row.band}
                      most={MOST_MOL}
                      widthPx={bandPx}
                      tone={row.own ? 'lamp' : 'moss'}
                      dashed={row.standing === 'recalled'}
                    />
                  </td>
                  <td className="pr-4">{row.hours}</td>
                  <td className="pr-4 text-ember-ink">{degrees(row.day, units)}</td>
                  <td className="pr-4 text-frost">{degrees(row.night, units)}</td>
                  <td>
                    <StandingMark standing={row.standing} />
                    {row.sources.length > 1 && (
                      <span className="text-12 text-ink-soft">, {row.sources.length} sources</span>
                    )}
                  </td>
                </tr>
                {open === row.key && (
                  <tr className="border-b border-line">
                    <td colSpan={6}>
                      <OpenCrop
                        gardenId={garden.gardenId}
                        row={row}
                        most={MOST_MOL}
                        widthPx={bandPx}
                        mayEdit={mayEdit}
                      />
                    </td>
                  </tr>
                )}
              </Fragment>
            ))}
          </tbody>
        </table>
        {rows.length === 0 && (
          <p className="py-6 text-14">
            {search
              ? `Nothing here matches “${search}”. Try part of a name, or mol > 15.`
              : 'No tier grows anything yet. Choose a crop in a tent’s section.'}
          </p>
        )}
      </div>
      {adding ? <AddCrop gardenId={garden.gardenId} onDone={() => setAdding(false)} /> : null}
      <div className="flex flex-wrap items-center gap-x-8 gap-y-2 pt-4">
        {mayEdit && !adding && (
          <Button look="plain" onClick={() => setAdding(true)}>
            Add a crop of your own
          </Button>
        )}
        <CropsTable rows={rows} units={units} />
      </div>
      <p className="pt-3 text-12 text-ink-soft">Enter opens a row, Esc closes it, up and down keys walk.</p>
    </PageFrame>
  );
}

function CropsTable({ rows, units }: { rows: CropRow[]; units: UnitSystem }) {
  return (
    <TableBehind
      caption="Crops"
      opener="As a table"
      fileName="crops.csv"
      columns={[
        { key: 'crop', label: 'Crop' },
        { key: 'stage', label: 'Stage' },
        { key: 'low', label: 'Least', unit: 'mol', align: 'right' },
        { key: 'aim', label: 'Aim', unit: 'mol', align: 'right' },
        { key: 'high', label: 'Most', unit: 'mol', align: 'right' },
        { key: 'hours', label: 'Light', unit: 'h' },
        { key: 'day', label: 'Day' },
        { key: 'night', label: 'Night' },
        { key: 'standing', label: 'How known' },
      ]}
      rows={rows.map((row) => ({
        crop: row.crop,
        stage: row.stage,
        low: row.band.low ?? '',
        aim: row.band.aim ?? '',
        high: row.band.high ?? '',
        hours: row.hours,
        day: degrees(row.day, units),
        night: degrees(row.night, units),
        standing: row.standing,
      }))}
    />
  );
}
