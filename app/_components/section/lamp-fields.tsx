'use client';

import { useState } from 'react';
import {
  duplicateLamp,
  freshId,
  mirrorLamp,
  removeLamps,
  setLampAboveLeaves,
  setLampAcross,
  setLampFixture,
  setLampOutput,
  setLampSchedule,
  setLampSwing,
  setLampTier,
} from '@/lib/scenarios/edit-plan';
import { lampAcrossRange, lampRange } from '@/lib/scenarios/lamp-range';
import { swingDeg, TILT_LIMIT_DEG } from '@/lib/scenarios/lamp-pose';
import { CheckField } from '../check-field';
import { QuantityField } from '../quantity-field';
import { SelectField } from '../select-field';
import { ClockField } from './clock-field';
import { InspectorFrame, More, Pair, Verb } from './inspector';
import { groupOf, type LampGroup } from './lamp-groups';
import type { PlanChange } from './plan-edit';
import type { SectionContext } from './section-context';

const offAt = (onAt: string, hours: number): string => {
  const [h = 0, m = 0] = onAt.split(':').map(Number);
  const minutes = Math.round(h * 60 + m + hours * 60) % 1440;
  return `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`;
};

interface LampFieldsProps {
  context: SectionContext;
  lampId: string;
}

export function LampFields({ context, lampId }: LampFieldsProps) {
  const { model, edit, words, doc } = context;
  const group = groupOf(model.groups, lampId);
  const shown = model.lamps.find(({ lamp }) => lamp.id === lampId);
  if (!group || !shown) return null;
  const ids = group.lamps.map((lamp) => lamp.id);
  const change = (label: string) => (next: PlanChange) => edit.apply(next, `${label} ${lampId}`);
  const size =
    group.fixture.shape === 'rect' && group.fixture.lengthM
      ? `, ${words.say(group.fixture.lengthM, 'length')} long`
      : '';
  const hint = edit.held
    ? 'Let go to keep it. Esc puts it back.'
    : context.impossible
      ? `Every figure on the page still stands for ${words.say(group.aboveLeavesM, 'length')}.`
      : 'Drag the lamp or type. Arrow keys move it 1 cm, with Shift 10 cm; [ and ] swing it 1°.';
  return (
    <InspectorFrame
      context={context}
      title={group.lamps.length > 1 ? words.group(group) : words.lamp(shown)}
      facts={`${group.lamps.length > 1 ? 'each ' : ''}${words.say(group.fixture.inputPowerW, 'power')}, ${words.say(group.fixture.ppfUmolS, 'ppf', 0)}${size}`}
      hint={hint}
      verbs={<LampVerbs context={context} lampId={lampId} ids={ids} />}
    >
      <PlaceFields context={context} group={group} lampId={lampId} />
      <QuantityField
        label="Output"
        kind="fraction"
        value={group.lamps[0]!.dimFrac ?? 1}
        min={0}
        max={1}
        disabled={edit.readOnly !== null}
        derived={words.say(group.fixture.inputPowerW * (group.lamps[0]!.dimFrac ?? 1) * group.lamps.length, 'power')}
        onCommit={(dim) => change('output')((plan) => setLampOutput(plan, ids, dim))}
      />
      <Pair>
        <ClockField
          label="On at"
          value={group.onAt}
          disabled={edit.readOnly !== null}
          onCommit={(onAt) => change('on')((plan) => setLampSchedule(plan, ids, { onAt }))}
        />
        <QuantityField
          label="For, and off at"
          kind="hours"
          value={group.hours}
          min={0}
          max={24}
          disabled={edit.readOnly !== null}
          derived={offAt(group.onAt, group.hours)}
          onCommit={(hours) => change('hours')((plan) => setLampSchedule(plan, ids, { hours }))}
        />
      </Pair>
      {(context.fixtures.length > 1 || doc.tiers.length > 1) && (
        <More words="Another lamp, or another tier">
          {context.fixtures.length > 1 && (
            <SelectField
              label="Which lamp"
              value={group.fixture.id}
              disabled={edit.readOnly !== null}
              options={context.fixtures.map((fixture) => ({ value: fixture.id, label: fixture.name ?? 'Lamp' }))}
              onChange={(fixture) => change('fixture')((plan) => setLampFixture(plan, ids, fixture))}
            />
          )}
          {doc.tiers.length > 1 && (
            <SelectField
              label="Lights"
              value={group.tier?.id ?? ''}
              disabled={edit.readOnly !== null}
              options={doc.tiers.map((tier) => ({ value: tier.id, label: words.tier(tier.id) }))}
              onChange={(tier) => change('tier')((plan) => setLampTier(plan, ids, tier))}
            />
          )}
        </More>
      )}
      <TogetherField context={context} group={group} lampId={lampId} />
    </InspectorFrame>
  );
}

function PlaceFields({ context, group, lampId }: LampFieldsProps & { group: LampGroup }) {
  const { edit, words, doc, model, impossible, setImpossible } = context;
  const { frame } = model;
  const [problem, setProblem] = useState<string | null>(null);
  const lamp = group.lamps.find((each) => each.id === lampId)!;
  const ids = group.lamps.map((each) => each.id);
  const range = lampRange(doc, ids);
  const across = lampAcrossRange(doc, lampId, frame.view);
  const lead = { lead: lampId, ids, view: frame.view, middleM: frame.acrossM / 2 };
  const swing = swingDeg(lamp, frame.view);
  // Positive in the field is towards the middle of the tent.
  const sign = lamp.positionM[frame.view === 'front' ? 0 : 1] > frame.acrossM / 2 + 0.01 ? -1 : 1;
  const commitHeight = (aboveM: number) => {
    const nearest = words.say(range.lowM, 'length');
    if (aboveM < range.lowM - 1e-6 || aboveM > range.highM + 1e-6) {
      const inside = aboveM < 0 ? `That is ${words.say(-aboveM, 'length')} inside the leaves. ` : '';
      setProblem(
        aboveM < range.lowM
          ? `${inside}Type ${nearest} or more, or lower the shelf first.`
          : `The lamp meets what is above it. Type ${words.say(range.highM, 'length')} or less.`,
      );
      setImpossible({ lampId, aboveLeavesM: aboveM });
      return;
    }
    setProblem(null);
    setImpossible(null);
    edit.apply((plan) => setLampAboveLeaves(plan, ids, aboveM), `height ${lampId}`);
  };
  return (
    <>
      <QuantityField
        label={group.tier ? 'Above the leaves' : 'Above the floor'}
        kind="length"
        value={group.aboveLeavesM}
        disabled={edit.readOnly !== null}
        error={impossible?.lampId === lampId ? (problem ?? undefined) : undefined}
        onCommit={commitHeight}
      />
      <QuantityField
        label={frame.view === 'front' ? 'From the left wall' : 'From the front'}
        kind="length"
        value={lamp.positionM[frame.view === 'front' ? 0 : 1]}
        min={across.lowM}
        max={across.highM}
        disabled={edit.readOnly !== null}
        onCommit={(to) => edit.apply((plan) => setLampAcross(plan, lead, to), `across ${lampId}`)}
      />
      <QuantityField
        label="Tilt, towards the middle"
        kind="angle"
        value={Math.round(swing * sign * 10) / 10}
        min={-TILT_LIMIT_DEG}
        max={TILT_LIMIT_DEG}
        disabled={edit.readOnly !== null}
        onCommit={(deg) => edit.apply((plan) => setLampSwing(plan, lead, deg * sign), `swing ${lampId}`)}
      />
    </>
  );
}

function TogetherField({ context, group, lampId }: LampFieldsProps & { group: LampGroup }) {
  const { parted, setParted, doc, edit } = context;
  const apart = parted.has(lampId);
  const lamp = group.lamps.find((each) => each.id === lampId)!;
  const peers = doc.placements.filter((each) => each.tier === lamp.tier && each.fixture === lamp.fixture);
  if (peers.length < 2 || (group.lamps.length < 2 && !apart)) return null;
  const label = apart || !group.mirrored ? 'The lamps of this tier move together' : 'The other one mirrors this one';
  return (
    <CheckField
      label={label}
      checked={!apart}
      disabled={edit.readOnly !== null}
      onChange={(together) =>
        setParted(
          peers.map((each) => each.id),
          !together,
        )
      }
    />
  );
}

function LampVerbs({ context, lampId, ids }: LampFieldsProps & { ids: string[] }) {
  const { edit, doc, select } = context;
  const middleM = doc.tent.widthM / 2;
  const nextId = freshId('lamp', doc.placements);
  const lamp = doc.placements.find((each) => each.id === lampId);
  const off = lamp && Math.abs(lamp.positionM[0] - middleM) > 0.02;
  return (
    <>
      <Verb
        onClick={() => {
          edit.apply((plan) => duplicateLamp(plan, lampId, { acrossM: 0.2, middleM }).plan, `duplicate ${lampId}`);
          select({ kind: 'lamp', id: nextId });
        }}
      >
        Hang another like it
      </Verb>
      {off && ids.length === 1 && (
        <Verb
          onClick={() => {
            edit.apply((plan) => mirrorLamp(plan, lampId, middleM).plan, `mirror ${lampId}`);
            select({ kind: 'lamp', id: lampId });
          }}
        >
          Mirror it
        </Verb>
      )}
      <Verb
        danger
        onClick={() => {
          edit.apply((plan) => removeLamps(plan, ids), `remove ${lampId}`);
          select(null);
        }}
      >
        {ids.length === 1 ? 'Take it down' : ids.length === 2 ? 'Take both down' : `Take all ${ids.length} down`}
      </Verb>
    </>
  );
}
