import type { CropFigure, CropStage } from '@/lib/crops/crop.schema';
import { targetKey } from '@/lib/crops/crop.schema';
import type { GardenTarget } from '@/lib/targets/target.schema';
import type { ShownStanding } from '@/app/_components/standing-mark';

export interface CropRow {
  key: string;
  crop: string;
  stage: string;
  band: { low: number | null; high: number | null; aim: number | null };
  hours: string;
  day: CropFigure | null;
  night: CropFigure | null;
  standing: ShownStanding;
  sources: CropFigure[];
  own: GardenTarget | null;
  reference: CropStage | null;
}

const aimOf = ({ low, target, high }: CropFigure) =>
  target ?? (low !== null && high !== null ? (low + high) / 2 : (low ?? high));

function hoursText(figure: CropFigure | undefined): string {
  if (!figure) return '–';
  const { low, target, high } = figure;
  if (low !== null && high !== null) return low === high ? `${low}` : `${low} to ${high}`;
  if (low !== null) return `${low} or more`;
  if (high !== null) return target !== null && target !== high ? `${target}, at most ${high}` : `at most ${high}`;
  return target === null ? '–' : `${target}`;
}

/** Two sources that were read and whose bands leave a gap between them: neither is wrong, they do not meet. */
export function gapBetween(figures: readonly CropFigure[]): { low: number; high: number } | null {
  const read = figures.filter((figure) => figure.standing !== 'recalled');
  const ends = read.map((figure) => {
    const values = [figure.low, figure.target, figure.high].filter((value): value is number => value !== null);
    return { low: Math.min(...values), high: Math.max(...values) };
  });
  for (const a of ends) for (const b of ends) if (a.high < b.low) return { low: a.high, high: b.low };
  return null;
}

function ownRow(own: GardenTarget): CropRow {
  const { figures } = own;
  return {
    key: targetKey(own),
    crop: own.crop,
    stage: own.stage,
    band: {
      low: figures.dliLowMolM2D ?? 0.8 * figures.dliTargetMolM2D,
      high: figures.dliHighMolM2D ?? 1.2 * figures.dliTargetMolM2D,
      aim: figures.dliTargetMolM2D,
    },
    hours:
      figures.photoperiodMinH !== undefined && figures.photoperiodMaxH !== undefined
        ? `${figures.photoperiodMinH} to ${figures.photoperiodMaxH}`
        : '–',
    day: null,
    night: null,
    standing: 'own',
    sources: [],
    own,
    reference: null,
  };
}

/** A row for each crop and stage that somebody says a daily light of, the garden's own first where it has one. */
export function cropRows(crops: readonly CropStage[], targets: readonly GardenTarget[]): CropRow[] {
  const owned = new Map(targets.map((target) => [targetKey(target), target]));
  const rows = crops.flatMap((stage): CropRow[] => {
    const sources = stage.figures['dli'] ?? [];
    const first = sources[0];
    if (!first) return [];
    const own = owned.get(targetKey(stage)) ?? null;
    owned.delete(targetKey(stage));
    return [
      {
        ...(own
          ? ownRow(own)
          : {
              key: targetKey(stage),
              crop: stage.crop,
              stage: stage.stage,
              band: { low: first.low, high: first.high, aim: aimOf(first) },
              own: null,
              standing: first.standing,
            }),
        hours: hoursText(stage.figures['photoperiod']?.[0]),
        day: stage.figures['t_day']?.[0] ?? null,
        night: stage.figures['t_night']?.[0] ?? null,
        sources,
        reference: stage,
      },
    ];
  });
  return [...rows, ...[...owned.values()].map(ownRow)].sort(
    (a, b) => a.crop.localeCompare(b.crop) || a.stage.localeCompare(b.stage),
  );
}

/** "lettuce", "mol > 15" or "mol < 8". */
export function matches(row: CropRow, search: string): boolean {
  const text = search.trim().toLowerCase();
  if (text === '') return true;
  const compare = /^mol\s*([<>])\s*(\d+(?:[.,]\d+)?)$/.exec(text);
  if (compare) {
    const wanted = Number(compare[2]!.replace(',', '.'));
    const aim = row.band.aim ?? 0;
    return compare[1] === '>' ? aim > wanted : aim < wanted;
  }
  return `${row.crop} ${row.stage} ${row.reference?.botanicalName ?? ''}`.toLowerCase().includes(text);
}
