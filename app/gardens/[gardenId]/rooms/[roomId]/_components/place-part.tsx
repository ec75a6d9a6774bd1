'use client';

import { useMemo } from 'react';
import { QuantityField } from '@/app/_components/quantity-field';
import { SelectField } from '@/app/_components/select-field';
import { TextField } from '@/app/_components/text-field';
import { useUnits } from '@/app/_components/units-context';
import { defaults } from '@/lib/evaluation/evaluate-scenario';
import { coordinateWords } from '@/lib/format/parse-coordinate';
import { formatQuantity } from '@/lib/format/quantity';
import type { RoomPartProps } from './room-view';
import { useState } from 'react';

export function PlacePart({ room, change, readOnly }: RoomPartProps) {
  const units = useUnits();
  const { place, climate } = room;
  const [name, setName] = useState(room.name);
  const zones = useMemo(
    () => [...new Set([place.timeZone, ...Intl.supportedValuesOf('timeZone'), 'UTC'])].sort(),
    [place.timeZone],
  );
  const put = (patch: Partial<typeof place>) => change({ place: { ...place, ...patch } });
  const slab = climate.slabTempC;
  const usual = defaults['room.slabTempC'];
  return (
    <section className="flex flex-col gap-3">
      <h2 className="text-22">Place</h2>
      <TextField
        label="Name"
        value={name}
        maxLength={80}
        disabled={readOnly}
        error={name.trim() === '' ? 'Type a name.' : undefined}
        onChange={setName}
        onBlur={() => name.trim() !== '' && name !== room.name && change({ name: name.trim() })}
      />
      <QuantityField
        label="Latitude"
        kind="latitude"
        unit={`° ${coordinateWords(place.latitudeDeg, 'latitude')}`}
        value={place.latitudeDeg}
        min={-90}
        max={90}
        disabled={readOnly}
        hint="N 52° 24′ 36″ works too"
        onCommit={(latitudeDeg) => put({ latitudeDeg })}
      />
      <QuantityField
        label="Longitude"
        kind="longitude"
        unit={`° ${coordinateWords(place.longitudeDeg, 'longitude')}`}
        value={place.longitudeDeg}
        min={-180}
        max={180}
        disabled={readOnly}
        onCommit={(longitudeDeg) => put({ longitudeDeg })}
      />
      <QuantityField
        label="Altitude"
        kind="altitude"
        value={place.altitudeM}
        min={-430}
        max={6000}
        disabled={readOnly}
        derived={formatQuantity(place.altitudeM, 'altitude', units === 'us' ? 'metric' : 'us').text}
        hint="Thin air carries less heat: high up, a fan must move more of it."
        onCommit={(altitudeM) => put({ altitudeM })}
      />
      <SelectField
        label="Time zone"
        value={place.timeZone}
        options={zones.map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }))}
        disabled={readOnly}
        onChange={(timeZone) => put({ timeZone })}
      />
      <QuantityField
        label="Floor under the tents, from the air"
        kind="temperatureDifference"
        step={0.1}
        min={-30}
        max={30}
        value={slab?.kind === 'offset' ? slab.value : usual.value}
        isDefault={slab === undefined}
        defaultReason={usual.why}
        onConfirmDefault={() => change({ climate: { ...climate, slabTempC: { kind: 'offset', value: usual.value } } })}
        disabled={readOnly || slab?.kind === 'constant'}
        onCommit={(value) => change({ climate: { ...climate, slabTempC: { kind: 'offset', value } } })}
      />
    </section>
  );
}
