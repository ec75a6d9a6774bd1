'use client';

import { freshId } from '@/lib/scenarios/edit-plan';
import { duplicateTier, removeTier, setTier, slideTier, tierRange } from '@/lib/scenarios/edit-rack';
import { planDefault } from '@/lib/scenarios/plan-defaults';
import { QuantityField } from '../quantity-field';
import { TextField } from '../text-field';
import { useState } from 'react';
import { InspectorFrame, More, Pair, Verb } from './inspector';
import type { SectionContext } from './section-context';

interface TierFieldsProps {
  context: SectionContext;
  tierId: string;
}

export function TierFields({ context, tierId }: TierFieldsProps) {
  const { doc, edit, words, slots, select } = context;
  const [asking, setAsking] = useState(false);
  const tier = doc.tiers.find((each) => each.id === tierId);
  if (!tier) return null;
  const locked = edit.readOnly !== null;
  const range = tierRange(doc, tierId, doc.tent);
  const patch = (change: Partial<typeof tier>, label: string) =>
    edit.apply((plan) => setTier(plan, tierId, change), `${label} ${tierId}`);
  const lamps = doc.placements.filter((lamp) => lamp.tier === tierId).length;
  return (
    <InspectorFrame
      context={context}
      title={words.tier(tierId)}
      facts={`${words.say(tier.x1M - tier.x0M, 'length')} by ${words.say(tier.y1M - tier.y0M, 'length')}`}
      hint="Drag the shelf or type. Arrow keys slide it 1 cm, with Shift 10 cm. Lamps stay where they hang."
      verbs={
        asking ? (
          <RemoveTier context={context} tierId={tierId} lamps={lamps} cancel={() => setAsking(false)} />
        ) : (
          <>
            <Verb
              onClick={() => {
                const id = freshId('tier', doc.tiers);
                edit.apply((plan) => duplicateTier(plan, tierId, doc.tent).plan, `duplicate ${tierId}`);
                select({ kind: 'tier', id });
              }}
            >
              Put in another like it
            </Verb>
            <Verb danger onClick={() => setAsking(true)}>
              Take it out
            </Verb>
          </>
        )
      }
    >
      {slots.cropField?.(tierId)}
      <QuantityField
        label="Shelf above the floor"
        kind="length"
        value={tier.topHeightM}
        min={range.lowM}
        max={range.highM}
        disabled={locked}
        onCommit={(to) => edit.apply((plan) => slideTier(plan, tierId, to), `slide ${tierId}`)}
      />
      <DefaultField
        label="Leaves above the shelf"
        kind="length"
        value={tier.canopyHeightM}
        defaultKey="tier.canopyHeightM"
        min={0}
        max={1.5}
        disabled={locked}
        onCommit={(canopyHeightM) => patch({ canopyHeightM }, 'canopy')}
      />
      <SitesFields tier={tier} disabled={locked} onCommit={(sites) => patch({ sites }, 'sites')} />
      <More words="Leaf area, name">
        <DefaultField
          label="Leaf area for each area of tray"
          kind="ratio"
          value={tier.leafAreaIndex}
          defaultKey="tier.leafAreaIndex"
          min={0}
          max={12}
          disabled={locked}
          onCommit={(leafAreaIndex) => patch({ leafAreaIndex }, 'leaf area')}
        />
        <NameField
          key={tier.name ?? ''}
          name={tier.name ?? ''}
          placeName={words.tier(tierId)}
          disabled={locked}
          onCommit={(name) => patch({ name: name || undefined }, 'name')}
        />
      </More>
    </InspectorFrame>
  );
}

function NameField({
  name,
  placeName,
  disabled,
  onCommit,
}: {
  name: string;
  placeName: string;
  disabled: boolean;
  onCommit: (name: string) => void;
}) {
  const [typed, setTyped] = useState(name);
  return (
    <TextField
      label="Name"
      value={typed}
      hint={name ? undefined : `Called “${placeName}” until it has a name.`}
      disabled={disabled}
      onChange={(text: string) => setTyped(text.slice(0, 80))}
      onBlur={() => typed.trim() !== name && onCommit(typed.trim())}
    />
  );
}

function SitesFields({
  tier,
  disabled,
  onCommit,
}: {
  tier: { sites?: { rows: number; columns: number } | undefined };
  disabled: boolean;
  onCommit: (sites: { rows: number; columns: number }) => void;
}) {
  const sites = tier.sites ?? { rows: 4, columns: 6 };
  const whole = (value: number) => Math.max(1, Math.min(100, Math.round(value)));
  return (
    <Pair>
      <QuantityField
        label="Sites across"
        kind="count"
        value={sites.columns}
        min={1}
        max={100}
        disabled={disabled}
        onCommit={(columns) => onCommit({ ...sites, columns: whole(columns) })}
      />
      <QuantityField
        label="Sites deep"
        kind="count"
        value={sites.rows}
        min={1}
        max={100}
        disabled={disabled}
        derived={`${sites.rows * sites.columns} in all`}
        onCommit={(rows) => onCommit({ ...sites, rows: whole(rows) })}
      />
    </Pair>
  );
}

interface DefaultFieldProps {
  label: string;
  kind: React.ComponentProps<typeof QuantityField>['kind'];
  value: number | undefined;
  defaultKey: Parameters<typeof planDefault>[0];
  min?: number;
  max?: number;
  disabled: boolean;
  derived?: string;
  onCommit: (value: number) => void;
}

/** A figure that the plan may leave out: shown as a default, with why, until somebody confirms or types it. */
export function DefaultField({ defaultKey, value, onCommit, ...rest }: DefaultFieldProps) {
  const known = planDefault(defaultKey);
  return (
    <QuantityField
      {...rest}
      value={value ?? known.value}
      isDefault={value === undefined}
      defaultReason={known.why}
      onConfirmDefault={() => onCommit(known.value)}
      onCommit={onCommit}
    />
  );
}

function RemoveTier({ context, tierId, lamps, cancel }: TierFieldsProps & { lamps: number; cancel: () => void }) {
  const { edit, select } = context;
  const take = (what: 'remove' | 'keep') => {
    edit.apply((plan) => removeTier(plan, tierId, what), `remove ${tierId}`);
    select(null);
  };
  return (
    <div className="flex flex-col gap-1">
      <p className="text-12 text-ink-soft">Undo brings it back.</p>
      <div className="flex flex-wrap gap-x-4 gap-y-1">
        <Verb danger onClick={() => take('remove')}>
          {lamps > 0 ? `Take out the shelf and its ${lamps === 1 ? 'lamp' : `${lamps} lamps`}` : 'Take out the shelf'}
        </Verb>
        {lamps > 0 && (
          <Verb danger onClick={() => take('keep')}>
            The shelf alone
          </Verb>
        )}
        <Verb onClick={cancel}>Leave it in</Verb>
      </div>
    </div>
  );
}
