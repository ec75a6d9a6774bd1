'use client';

import { useCallback } from 'react';
import { PageFrame } from '@/app/_components/page-frame';
import { RowState, RowTrouble } from '@/app/_components/row-state';
import { useUnits } from '@/app/_components/units-context';
import { formatQuantity, type UnitSystem } from '@/lib/format/quantity';
import type { Garden } from '@/lib/gardens/garden.schema';
import { useSavedRow } from '@/lib/http/use-saved-row';
import { useUpdateRoom } from '@/lib/rooms/room.hooks';
import type { Room } from '@/lib/rooms/room.schema';
import type { ReferenceTariff } from '@/lib/tariffs/default-tariff';
import { AirTemperature } from './air-temperature';
import { CircuitsPart } from './circuits-part';
import { HumidityPart } from './humidity-part';
import { PlacePart } from './place-part';
import { TariffPart } from './tariff-part';

interface RoomViewProps {
  garden: Garden;
  room: Room;
  readOnly: boolean;
  reference: ReferenceTariff;
}

export interface RoomPartProps {
  room: Room;
  change: (patch: Partial<Room>) => void;
  readOnly: boolean;
}

const countDefaults = ({ climate, power }: Room) =>
  [
    climate.relHumidityPct,
    climate.slabTempC,
    power.tariff ?? undefined,
    climate.airTempC.kind === 'monthly' ? climate.airTempC.dailySwingK : 0,
  ].filter((each) => each === undefined).length +
  power.circuits.filter((circuit) => circuit.otherLoadsW === undefined).length;

function headline({ name, climate }: Room, units: UnitSystem): string {
  const series = climate.airTempC;
  const degrees = (value: number) => formatQuantity(value, 'temperature', units).text;
  if (series.kind === 'constant') return `${name} stays at ${degrees(series.value)} all year.`;
  const low = series.values.reduce((least, value) => Math.min(least, value), Infinity);
  const high = series.values.reduce((most, value) => Math.max(most, value), -Infinity);
  return `${name} keeps between ${formatQuantity(low, 'temperature', units).figure} and ${degrees(high)}.`;
}

/** A room: what its air does over the year, where it lies, what its circuits bear and what a kWh costs. */
export function RoomView({ garden, room: initial, readOnly, reference }: RoomViewProps) {
  const units = useUnits();
  const { mutateAsync } = useUpdateRoom(garden.gardenId);
  const save = useCallback(
    ({ name, place, climate, power, residualCurrentDevice }: Partial<Room>, version: number) =>
      mutateAsync({
        roomId: initial.roomId,
        version,
        ...(name && { name }),
        ...(place && { place }),
        ...(climate && { climate }),
        ...(power && { power }),
        ...(residualCurrentDevice && { residualCurrentDevice }),
      }),
    [mutateAsync, initial.roomId],
  );
  const saved = useSavedRow(initial, save);
  const { row: room, change } = saved;
  const defaults = countDefaults(room);
  const parts: RoomPartProps = { room, change, readOnly };
  return (
    <PageFrame
      garden={garden}
      current="garden"
      crumbs={[{ words: room.name }]}
      right={<RowState saved={saved} readOnly={readOnly} />}
      headline={headline(room, units)}
      lead={
        readOnly
          ? 'Your role reads this room; a planner or an owner changes it.'
          : defaults > 0
            ? `${defaults} ${defaults === 1 ? 'figure is a default' : 'figures are defaults'}, with a dashed line below: confirm or change them.`
            : 'Every figure here is your own. A thermometer that keeps its lowest and highest makes the coldest night surer still.'
      }
    >
      <RowTrouble saved={saved} />
      <AirTemperature {...parts} />
      <HumidityPart {...parts} />
      <div className="grid grid-cols-1 gap-x-16 gap-y-10 border-t border-line pt-8 mt-8 lg:grid-cols-[340px_minmax(0,1fr)]">
        <PlacePart {...parts} />
        <CircuitsPart {...parts} />
      </div>
      <TariffPart {...parts} currency={garden.currency} reference={reference} />
    </PageFrame>
  );
}
