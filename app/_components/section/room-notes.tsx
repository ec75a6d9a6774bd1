'use client';

/** What stands beside the tent in the room: its air, what may be added, the circuits, the key of the drawing. */
import { useState } from 'react';
import { putInWater, setExhaust, setHeater } from '@/lib/scenarios/edit-climate';
import { addLamp, freshId } from '@/lib/scenarios/edit-plan';
import { addTier } from '@/lib/scenarios/edit-rack';
import { placeForLamp } from '@/lib/scenarios/lamp-range';
import { monthMean } from '@/lib/scenarios/coldest-month';
import { Explainable } from '../explain';
import { Num } from '../num';
import { Verb } from './inspector';
import type { PlanChange } from './plan-edit';
import type { SectionContext } from './section-context';
import { MONTHS } from './month-names';

/** The smallest that is common, m³/h. */
const LEAST_FAN_M3H = 100;

const dotted = 'cursor-pointer border-b border-dotted border-ink-soft text-left';

export function AirNote({ context }: { context: SectionContext }) {
  const { doc, told, words, select } = context;
  const month = told?.month ?? 1;
  const humidity = doc.room.relHumidityPct;
  const { dayTempC, nightTempC } = doc.climate;
  return (
    <div className="flex gap-2">
      <svg width="12" height="38" viewBox="0 0 12 38" aria-hidden="true" className="mt-0.5 flex-none">
        <path d="M4 26V4a2 2 0 0 1 4 0v22" fill="none" stroke="var(--ink)" strokeWidth="1.2" />
        <path d="M6 30V16" stroke="var(--frost)" strokeWidth="2.4" />
        <circle cx="6" cy="31" r="5" fill="var(--frost)" stroke="var(--ink)" strokeWidth="1.2" />
      </svg>
      <div>
        <p className="text-12 text-ink-soft">Room air, {MONTHS[month - 1]}</p>
        <p className="text-17 text-ink-soft">
          <span className="font-semibold text-ink">
            {words.say(monthMean(doc.room.airTempC, month), 'temperature')}
          </span>
          {humidity && <span className="ml-3">{words.say(monthMean(humidity, month), 'relHumidity')}</span>}
        </p>
        <p className="text-12">
          <button type="button" className={dotted} onClick={() => select({ kind: 'climate' })}>
            Held at {words.neat(dayTempC, 'temperature')} by day, {words.neat(nightTempC, 'temperature')} by night
          </button>
        </p>
      </div>
    </div>
  );
}

export function AddWords({ context }: { context: SectionContext }) {
  const { doc, edit, select, worst, slots, fixtures } = context;
  const [choosing, setChoosing] = useState(false);
  if (edit.readOnly !== null) return <p className="text-12 text-ink-soft">{edit.readOnly}</p>;
  const dark = context.model.tiers.find(
    ({ tier }) => !context.model.groups.some((group) => group.tier?.id === tier.id),
  );
  const chosen = context.selection?.kind === 'tier' ? context.selection.id : null;
  // The shelf that is chosen, else the highest without a lamp, else the one that misses most.
  const tierId = chosen ?? dark?.tier.id ?? worst ?? doc.tiers[0]?.id ?? null;
  const hang = (fixture: string) => {
    const positionM = placeForLamp(doc, tierId ?? '');
    const id = freshId('lamp', doc.placements);
    edit.apply((plan) => addLamp(plan, { fixture, tier: tierId, positionM }).plan, `add ${id}`);
    select({ kind: 'lamp', id });
    setChoosing(false);
  };
  // Of the size that the plan asks for, where that is known.
  const heat = context.evaluation?.heat;
  const putInHeater: PlanChange = (plan) =>
    setHeater(plan, heat && heat.recommendedHeaterW > 0 ? { ratedPowerW: heat.recommendedHeaterW } : {});
  const putInFan: PlanChange = (plan) =>
    setExhaust(plan, { maxAirflowM3H: Math.max(LEAST_FAN_M3H, Math.ceil(heat?.recommendedExhaustM3H ?? 0)) });
  const putIn = (kind: 'heater' | 'fan' | 'water', change: PlanChange) => {
    edit.apply(change, `${kind} in`);
    select({ kind });
  };
  return (
    <div>
      <div className="flex flex-wrap gap-x-5 gap-y-1">
        <Verb onClick={() => (fixtures.length === 1 ? hang(fixtures[0]!.id) : setChoosing(!choosing))}>
          Hang a lamp
        </Verb>
        <Verb
          onClick={() => {
            const id = freshId('tier', doc.tiers);
            edit.apply((plan) => addTier(plan, doc.tent).plan, `add ${id}`);
            select({ kind: 'tier', id });
          }}
        >
          Put in a shelf
        </Verb>
        {!doc.climate.heater && <Verb onClick={() => putIn('heater', putInHeater)}>A heater</Verb>}
        {!doc.climate.exhaust && <Verb onClick={() => putIn('fan', putInFan)}>A fan</Verb>}
        {!doc.water && <Verb onClick={() => putIn('water', putInWater)}>Water</Verb>}
        <button type="button" className={`${dotted} text-12 text-ink-soft`} onClick={() => select({ kind: 'tent' })}>
          The tent itself
        </button>
      </div>
      {choosing && (
        <ul
          className="relative z-20 mt-1 border-l-[3px] border-lamp bg-paper py-1 pl-3 text-14"
          aria-label="Which lamp"
          onKeyDown={(event) => event.key === 'Escape' && setChoosing(false)}
        >
          {fixtures.map((fixture) => (
            <li key={fixture.id}>
              <button type="button" className={`${dotted} py-0.5`} onClick={() => hang(fixture.id)}>
                {fixture.name ?? 'Lamp'}
              </button>{' '}
              <span className="text-12 text-ink-soft">
                {context.words.say(fixture.inputPowerW, 'power')}, {context.words.say(fixture.ppfUmolS, 'ppf', 0)}
              </span>
            </li>
          ))}
          {fixtures.length === 0 && <li className="text-12 text-ink-soft">This garden has no lamps yet.</li>}
          {slots.fixturesLink && <li className="text-12">{slots.fixturesLink}</li>}
        </ul>
      )}
    </div>
  );
}

/** The circuits: what they carry of what they may carry for hours on end. */
export function CircuitWords({ context, left }: { context: SectionContext; left?: boolean }) {
  const { evaluation, doc } = context;
  const names = context.slots.circuitNames;
  return (
    <ul className={`text-12 text-ink-soft ${left ? '' : 'text-right'}`}>
      {(evaluation?.circuits ?? []).map((circuit) => {
        const known = doc.power.circuits.find((each) => each.id === circuit.id);
        const others = (known?.otherLoadsW ?? 0) / doc.power.supplyV;
        return (
          <li key={circuit.id}>
            <span className="font-semibold text-slate">
              {names?.[circuit.id] ?? 'Circuit'}, {known?.ratingA ?? 0} A
            </span>
            : {others > 0.05 ? `this tent ${Math.max(0, circuit.continuousA - others).toFixed(1)} A, in all ` : ''}
            <Explainable path={`circuits.${circuit.id}.continuous`}>
              <Num text={circuit.continuousA.toFixed(1)} />
            </Explainable>{' '}
            of {circuit.limitA.toFixed(1)} A for hours on end
            {circuit.within ? '' : <span className="font-semibold text-ember-ink">, too much</span>}
          </li>
        );
      })}
    </ul>
  );
}

export function DrawingKey({ bar }: { bar: boolean }) {
  return (
    <div className="text-12 text-ink-soft">
      <p>Light on a level leaf, µmol/m²/s.</p>
      <p>Brackets: what a crop wants in its hours.</p>
      <p className="mt-1 flex items-center gap-2">
        <span className="inline-block h-2.5 w-[26px] flex-none bg-ember" aria-hidden="true" />
        this wide is 100 W: full comes in, open goes out
      </p>
      {bar && <p className="mt-1">The bar under a shelf: light on its leaves from wall to wall.</p>}
    </div>
  );
}
