'use client';

import { QuantityField } from '@/app/_components/quantity-field';
import { defaults } from '@/lib/evaluation/evaluate-scenario';
import type { RoomPartProps } from './room-view';

/** The room's humidity; twelve months stay as they came, the field holds the constant one. */
export function HumidityPart({ room, change, readOnly }: RoomPartProps) {
  const series = room.climate.relHumidityPct;
  const usual = defaults['room.relHumidityPct'];
  const put = (value: number) => change({ climate: { ...room.climate, relHumidityPct: { kind: 'constant', value } } });
  return (
    <section className="grid grid-cols-1 gap-x-6 gap-y-4 border-t border-line pt-6 mt-8 lg:grid-cols-[196px_minmax(0,1fr)]">
      <h2 className="text-14 font-semibold">Humidity</h2>
      <QuantityField
        label="All year"
        kind="relHumidity"
        step={1}
        min={0}
        max={100}
        value={series?.kind === 'constant' ? series.value : usual.value}
        isDefault={series === undefined}
        defaultReason={usual.why}
        onConfirmDefault={() => put(usual.value)}
        disabled={readOnly}
        hint="As a gauge on the wall shows it."
        onCommit={put}
      />
    </section>
  );
}
