'use client';

/** A tent with nothing in it teaches: its three sizes, one sentence, one button. */
import { addLamp } from '@/lib/scenarios/edit-plan';
import { addTier } from '@/lib/scenarios/edit-rack';
import { putInWater } from '@/lib/scenarios/edit-climate';
import { placeForLamp } from '@/lib/scenarios/lamp-range';
import { Button } from '../button';
import { QuantityField } from '../quantity-field';
import { Pair } from './inspector';
import type { SectionContext } from './section-context';

export function FirstVisit({ context }: { context: SectionContext }) {
  const { doc, edit, slots, fixtures } = context;
  const { tent } = doc;
  const bare = doc.tiers.length === 0;
  const lamp = fixtures[0];
  const locked = edit.readOnly !== null;
  const start = () => {
    edit.apply((plan) => {
      let next = plan;
      if (bare) {
        next = addTier(next, tent, Math.round(tent.heightM * 25) / 100).plan;
        next = addTier(next, tent, Math.round(tent.heightM * 62) / 100).plan;
      }
      if (!next.water) next = putInWater(next);
      if (lamp)
        for (const tier of next.tiers) {
          const rack = { tiers: next.tiers, placements: next.placements, fixtures, tent };
          next = addLamp(next, { fixture: lamp.id, tier: tier.id, positionM: placeForLamp(rack, tier.id) }).plan;
        }
      return next;
    }, 'first things');
  };
  return (
    <section aria-label="A new tent" className="flex max-w-[24rem] flex-col gap-3">
      <h2 className="text-30 font-semibold">{bare ? 'Your tent, cut open.' : 'No lamp hangs here yet.'}</h2>
      <p className="text-17">
        {bare
          ? 'Check its three sizes. Then put in what you have: shelves, lamps, a heater. Light, warmth and the bill follow as you go.'
          : 'Hang one over a shelf, and light, warmth and the bill follow as you move it.'}
      </p>
      {slots.setTent && (
        <Pair>
          {(['widthM', 'depthM', 'heightM'] as const).map((key) => (
            <QuantityField
              key={key}
              label={{ widthM: 'Width', depthM: 'Depth', heightM: 'Height' }[key]}
              kind="tallLength"
              value={tent[key]}
              min={0.3}
              max={6}
              disabled={locked}
              onCommit={(value) => slots.setTent?.({ [key]: value })}
            />
          ))}
        </Pair>
      )}
      {slots.setTent && <p className="text-12 text-ink-soft">6 ft, 72 in and 180 cm work too.</p>}
      {!locked && (
        <div>
          <Button onClick={start}>
            {bare
              ? lamp
                ? 'Put in two shelves, lamps and water'
                : 'Put in two shelves and water'
              : lamp
                ? 'Hang a lamp over each shelf'
                : 'Put in water'}
          </Button>
        </div>
      )}
      {!lamp && <p className="text-14">The garden has no lamps to hang yet. {slots.fixturesLink}</p>}
    </section>
  );
}
