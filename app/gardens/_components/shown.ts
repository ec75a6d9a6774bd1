import type { GardenOverview, TentOverview } from '@/lib/scenarios/overview.service';
import { monthMean } from '@/lib/scenarios/coldest-month';
import type { Room } from '@/lib/rooms/room.schema';
import { defaults } from '@/lib/evaluation/evaluate-scenario';
import { tentWords, type TentWords } from './tent-words';

export interface TentShown {
  overview: TentOverview;
  words: TentWords;
}

export interface RoomOverview {
  room: Room;
  airTempC: number;
  relHumidityPct: number;
  monthName: string;
  tents: TentShown[];
}

export interface GardenShown {
  garden: GardenOverview['garden'];
  rooms: RoomOverview[];
  /** What the plans of this month come to. */
  month: { name: string; energyKwh: number; cost: number } | null;
}

/** What the pages of gardens draw, reckoned once on the server; `month` is 1 to 12. */
export function showGarden({ garden, rooms }: GardenOverview, month: number): GardenShown {
  const monthName = new Date(Date.UTC(2026, month - 1, 1)).toLocaleDateString('en', { month: 'long', timeZone: 'UTC' });
  const humidity = (room: Room) =>
    room.climate.relHumidityPct ?? { kind: 'constant' as const, value: Number(defaults['room.relHumidityPct']!.value) };
  const tents = rooms.flatMap((each) => each.tents);
  const bills = tents.flatMap(({ evaluation }) => evaluation.year.months.filter((each) => each.month === month));
  return {
    garden,
    rooms: rooms.map(({ room, tents: own }) => ({
      room,
      monthName,
      airTempC: monthMean(room.climate.airTempC, month),
      relHumidityPct: monthMean(humidity(room), month),
      tents: own.map((overview) => ({
        overview,
        words: tentWords(overview.document, overview.evaluation, overview.tent.name),
      })),
    })),
    month:
      bills.length > 0
        ? {
            name: monthName,
            energyKwh: bills.reduce((sum, bill) => sum + bill.energyKwh.total, 0),
            cost: bills.reduce((sum, bill) => sum + bill.cost, 0),
          }
        : null,
  };
}
