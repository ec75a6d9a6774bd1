'use client';

import { setFlood, setPump, setWater } from '@/lib/scenarios/edit-climate';
import { planDefault } from '@/lib/scenarios/plan-defaults';
import { QuantityField } from '../quantity-field';
import { FieldCautions } from './field-cautions';
import { InspectorFrame, Verb } from './inspector';
import type { SectionContext } from './section-context';
import { DefaultField } from './tier-fields';

export function WaterFields({ context }: { context: SectionContext }) {
  const { doc, edit, evaluation } = context;
  const water = doc.water;
  const pump = water?.pump;
  const flood = water?.flood;
  const locked = edit.readOnly !== null;
  const cautions = (evaluation?.cautions ?? []).filter((each) =>
    /water|pump|flood|socket|rcd|residual/i.test(each.code),
  );
  const every = flood?.everyMinutes ?? planDefault('water.flood.everyMinutes').value;
  return (
    <InspectorFrame
      context={context}
      title="Water"
      foot={<FieldCautions cautions={cautions} />}
      hint="The pump floods the trays on its timer, lamps on or off."
      verbs={
        pump ? (
          <Verb danger onClick={() => edit.apply((plan) => setPump(plan, null), 'pump out')}>
            No pump
          </Verb>
        ) : (
          <Verb onClick={() => edit.apply((plan) => setPump(plan, 20), 'pump in')}>Put in a pump</Verb>
        )
      }
    >
      <DefaultField
        label="Reservoir"
        kind="volume"
        value={water?.reservoirL}
        defaultKey="water.reservoirL"
        min={0}
        max={10000}
        disabled={locked}
        onCommit={(reservoirL) => edit.apply((plan) => setWater(plan, { reservoirL }), 'reservoir')}
      />
      <DefaultField
        label="Covered by a lid"
        kind="fraction"
        value={water?.coveredFrac}
        defaultKey="water.coveredFrac"
        min={0}
        max={1}
        disabled={locked}
        onCommit={(coveredFrac) => edit.apply((plan) => setWater(plan, { coveredFrac }), 'lid')}
      />
      {pump && (
        <>
          <QuantityField
            label="Pump takes"
            kind="power"
            value={pump.inputPowerW}
            min={0}
            max={2000}
            disabled={locked}
            onCommit={(watts) => edit.apply((plan) => setPump(plan, watts), 'pump')}
          />
          <DefaultField
            label="A flood lasts"
            kind="minutes"
            value={flood?.minutes}
            defaultKey="water.flood.minutes"
            min={0}
            max={every}
            disabled={locked}
            onCommit={(minutes) => edit.apply((plan) => setFlood(plan, { minutes }), 'flood')}
          />
          <DefaultField
            label="and comes every"
            kind="minutes"
            value={flood?.everyMinutes}
            defaultKey="water.flood.everyMinutes"
            min={1}
            max={10080}
            disabled={locked}
            derived={`${Number((1440 / every).toFixed(1))} a day`}
            onCommit={(everyMinutes) => edit.apply((plan) => setFlood(plan, { everyMinutes }), 'flood every')}
          />
        </>
      )}
    </InspectorFrame>
  );
}
