'use client';

import { setCirculation, setExhaust } from '@/lib/scenarios/edit-climate';
import { CheckField } from '../check-field';
import { QuantityField } from '../quantity-field';
import { InspectorFrame, Verb } from './inspector';
import type { SectionContext } from './section-context';
import { DefaultField } from './tier-fields';

export function FanFields({ context }: { context: SectionContext }) {
  const { doc, edit, words, evaluation } = context;
  const exhaust = doc.climate.exhaust;
  const circulation = doc.climate.circulation;
  const locked = edit.readOnly !== null;
  const advised = evaluation?.heat.recommendedExhaustM3H;
  const patch = (change: Parameters<typeof setExhaust>[1], label: string) =>
    edit.apply((plan) => setExhaust(plan, change), label);
  return (
    <InspectorFrame
      context={context}
      title="Fans"
      facts={
        advised
          ? `The hot day and the moisture ask for ${words.say(advised, 'airflow')}.`
          : advised === null
            ? 'No fan carries this: the room is as warm, or as moist, as the tent may be.'
            : undefined
      }
      hint="It turns only as fast as moisture and warmth ask, and never slower than its least."
      verbs={
        <>
          {exhaust ? (
            <Verb danger onClick={() => patch(null, 'exhaust out')}>
              Take the exhaust out
            </Verb>
          ) : (
            <Verb onClick={() => patch({}, 'exhaust in')}>Put in an exhaust fan</Verb>
          )}
          {circulation ? (
            <Verb danger onClick={() => edit.apply((plan) => setCirculation(plan, null), 'circulation out')}>
              No stirring fan
            </Verb>
          ) : (
            <Verb onClick={() => edit.apply((plan) => setCirculation(plan, 10), 'circulation in')}>
              Add a stirring fan
            </Verb>
          )}
        </>
      }
    >
      {exhaust && (
        <>
          <QuantityField
            label="Exhaust at its most"
            kind="airflow"
            value={exhaust.maxAirflowM3H}
            min={exhaust.minAirflowM3H ?? 0}
            max={20000}
            disabled={locked}
            onCommit={(maxAirflowM3H) => patch({ maxAirflowM3H }, 'exhaust most')}
          />
          <DefaultField
            label="and at its least"
            kind="airflow"
            value={exhaust.minAirflowM3H}
            defaultKey="climate.exhaust.minAirflowM3H"
            min={0}
            max={exhaust.maxAirflowM3H}
            disabled={locked}
            onCommit={(minAirflowM3H) => patch({ minAirflowM3H }, 'exhaust least')}
          />
          <QuantityField
            label="It takes"
            kind="power"
            value={exhaust.inputPowerW}
            min={0}
            max={2000}
            disabled={locked}
            onCommit={(inputPowerW) => patch({ inputPowerW }, 'exhaust power')}
          />
          <CheckField
            label="I have it already"
            checked={exhaust.owned === true}
            disabled={locked}
            onChange={(owned) => patch({ owned }, 'exhaust owned')}
          />
        </>
      )}
      {circulation && (
        <QuantityField
          label="Stirring fan, all day"
          kind="power"
          value={circulation.inputPowerW}
          min={0}
          max={2000}
          disabled={locked}
          onCommit={(watts) => edit.apply((plan) => setCirculation(plan, watts), 'circulation')}
        />
      )}
    </InspectorFrame>
  );
}
