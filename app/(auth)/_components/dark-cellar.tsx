import { demoDocument } from '@/app/_components/demo-document';
import { TentMiniature } from '@/app/_components/tent-miniature';

const PX_PER_M = 148;
const SMALL = { ...demoDocument, tent: { ...demoDocument.tent, widthM: 0.6, heightM: 1.4 } };

/** A bench beside it: one tier, one lamp. */
const seedTent = {
  ...SMALL,
  tiers: SMALL.tiers
    .filter((tier) => tier.id === 'lower')
    .map((tier) => ({
      ...tier,
      x0M: 0.06,
      x1M: 0.54,
      topHeightM: 0.52,
      canopyHeightM: 0.07,
      target: tier.target && { ...tier.target, stage: 'seedling' },
    })),
  placements: SMALL.placements
    .filter((lamp) => lamp.id === 'panel-1')
    .map((lamp) => ({ ...lamp, tier: 'lower', positionM: [0.3, 0.45, 1] as const })),
  fixtures: SMALL.fixtures.map((fixture) => ({ ...fixture, lengthM: 0.25 })),
  water: undefined,
};

/** The cellar before its timers come on: every lamp off, which is all that a page before signing in may show. */
export function DarkCellar() {
  return (
    <div className="w-84">
      <p className="pb-2 text-12 text-ink-soft">
        A cellar before its timers come on.
        <br />
        Not yours: yours shows after the passphrase.
      </p>
      <svg viewBox="0 0 336 270" className="block w-full" aria-hidden="true">
        <TentMiniature doc={demoDocument} pxPerM={PX_PER_M} leftPx={2} floorPx={270} dark />
        <TentMiniature doc={seedTent} pxPerM={PX_PER_M} leftPx={236} floorPx={270} dark />
      </svg>
    </div>
  );
}
