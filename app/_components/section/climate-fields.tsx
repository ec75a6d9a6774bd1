'use client';

import { setSetPoints } from '@/lib/scenarios/edit-climate';
import { QuantityField } from '../quantity-field';
import { InspectorFrame } from './inspector';
import type { SectionContext } from './section-context';
import { DefaultField } from './tier-fields';

export function ClimateFields({ context }: { context: SectionContext }) {
  const { doc, edit } = context;
  const { dayTempC, nightTempC, maxTempC, maxRelHumidityPct } = doc.climate;
  const locked = edit.readOnly !== null;
  const patch = (change: Parameters<typeof setSetPoints>[1], label: string) =>
    edit.apply((plan) => setSetPoints(plan, change), label);
  return (
    <InspectorFrame
      context={context}
      title="What the tent is held at"
      hint="Day is while any lamp’s timer is on; night is the rest."
    >
      <QuantityField
        label="By day at least"
        kind="temperature"
        value={dayTempC}
        min={-40}
        max={maxTempC}
        disabled={locked}
        onCommit={(value) => patch({ dayTempC: value }, 'day')}
      />
      <QuantityField
        label="By night at least"
        kind="temperature"
        value={nightTempC}
        min={-40}
        max={maxTempC}
        disabled={locked}
        onCommit={(value) => patch({ nightTempC: value }, 'night')}
      />
      <QuantityField
        label="At most"
        kind="temperature"
        value={maxTempC}
        min={Math.max(dayTempC, nightTempC)}
        max={80}
        disabled={locked}
        onCommit={(value) => patch({ maxTempC: value }, 'most')}
      />
      <DefaultField
        label="Humidity at most"
        kind="relHumidity"
        value={maxRelHumidityPct}
        defaultKey="climate.maxRelHumidityPct"
        min={0}
        max={100}
        disabled={locked}
        onCommit={(value) => patch({ maxRelHumidityPct: value }, 'humidity')}
      />
    </InspectorFrame>
  );
}
