'use client';

import { setHeater } from '@/lib/scenarios/edit-climate';
import { Choice } from '../choice';
import { CheckField } from '../check-field';
import { QuantityField } from '../quantity-field';
import { FieldCautions } from './field-cautions';
import { InspectorFrame, Pair, Verb } from './inspector';
import type { SectionContext } from './section-context';

const UNKNOWN_CLEARANCE_M = 1;

export function HeaterFields({ context }: { context: SectionContext }) {
  const { doc, edit, words, evaluation, select } = context;
  const heater = doc.climate.heater;
  const locked = edit.readOnly !== null;
  if (!heater)
    return (
      <InspectorFrame
        context={context}
        title="No heater"
        verbs={<Verb onClick={() => edit.apply((plan) => setHeater(plan, {}), 'heater in')}>Put in a heater</Verb>}
      >
        <p className="text-12 text-ink-soft">The tent floats with its lamps and the room.</p>
      </InspectorFrame>
    );
  const patch = (change: Parameters<typeof setHeater>[1], label: string) =>
    edit.apply((plan) => setHeater(plan, change), label);
  const cautions = (evaluation?.cautions ?? []).filter((each) => each.code.startsWith('heater'));
  const known = heater.clearanceM !== null && heater.clearanceM !== undefined;
  const advised = evaluation?.heat.recommendedHeaterW ?? 0;
  return (
    <InspectorFrame
      context={context}
      title="Heater"
      facts={advised > 0 ? `The cold asks for ${words.say(advised, 'power')}, with a quarter in hand.` : undefined}
      foot={<FieldCautions cautions={cautions} />}
      hint="Its arrow is as wide as its watts on average in the told month."
      verbs={
        <Verb
          danger
          onClick={() => {
            edit.apply((plan) => setHeater(plan, null), 'heater out');
            select(null);
          }}
        >
          Take it out
        </Verb>
      }
    >
      <QuantityField
        label="Rated power, on its label"
        kind="power"
        value={heater.ratedPowerW}
        min={0}
        max={20000}
        disabled={locked}
        onCommit={(ratedPowerW) => patch({ ratedPowerW }, 'heater power')}
      />
      <Choice
        label="What its label says of distance"
        value={known ? 'known' : 'unknown'}
        disabled={locked}
        options={[
          { value: 'known', label: 'It says' },
          { value: 'unknown', label: 'I don’t know' },
        ]}
        onChange={(which) =>
          patch({ clearanceM: which === 'known' ? UNKNOWN_CLEARANCE_M : null }, 'heater clearance known')
        }
      />
      {known ? (
        <QuantityField
          label="To keep clear on all sides"
          kind="length"
          value={heater.clearanceM!}
          min={0}
          max={5}
          disabled={locked}
          onCommit={(clearanceM) => patch({ clearanceM }, 'heater clearance')}
        />
      ) : (
        <p className="text-12 text-ink-soft">
          Counted as {words.say(UNKNOWN_CLEARANCE_M, 'tallLength')}: the worse case, for safety.
        </p>
      )}
      <PlaceFields context={context} />
      <CheckField
        label="I have it already"
        checked={heater.owned === true}
        disabled={locked}
        onChange={(owned) => patch({ owned }, 'heater owned')}
      />
    </InspectorFrame>
  );
}

/** In the room it blows in by the low port; in the tent its place is measured from the left wall and the front. */
function PlaceFields({ context }: { context: SectionContext }) {
  const { doc, edit } = context;
  const { tent } = doc;
  const place = doc.climate.heater?.placeM;
  const locked = edit.readOnly !== null;
  const set = (placeM: readonly [number, number, number] | undefined) =>
    edit.apply((plan) => setHeater(plan, { placeM }), 'heater place');
  return (
    <>
      <Choice
        label="Where it stands"
        value={place ? 'inside' : 'outside'}
        disabled={locked}
        options={[
          { value: 'outside', label: 'In the room' },
          { value: 'inside', label: 'In the tent' },
        ]}
        onChange={(where) => set(where === 'inside' ? [tent.widthM / 2, tent.depthM / 2, 0.1] : undefined)}
      />
      {place && (
        <Pair>
          <QuantityField
            label="From the left wall"
            kind="length"
            value={place[0]}
            min={0}
            max={tent.widthM}
            disabled={locked}
            onCommit={(x) => set([x, place[1], place[2]])}
          />
          <QuantityField
            label="From the front"
            kind="length"
            value={place[1]}
            min={0}
            max={tent.depthM}
            disabled={locked}
            onCommit={(y) => set([place[0], y, place[2]])}
          />
        </Pair>
      )}
    </>
  );
}
