/** What could stand in an empty tent: dashed things in a pale but true field. */
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { addLamp } from '@/lib/scenarios/edit-plan';
import { addTier } from '@/lib/scenarios/edit-rack';
import { placeForLamp } from '@/lib/scenarios/lamp-range';
import { points, px, type SectionFrame } from './section-frame';
import { sectionModel } from './section-model';

const NOBODY: ReadonlySet<string> = new Set();

/** A lamp of no make, as an example only: it is never put into a plan. */
const EXAMPLE_LAMP: ScenarioDocument['fixtures'][number] = {
  id: 'example',
  inputPowerW: 100,
  ppfUmolS: 260,
  shape: 'rect',
  lengthM: 0.5,
  widthM: 0.3,
  distribution: { type: 'lambertian' },
};

export function exampleDocument(doc: ScenarioDocument): ScenarioDocument {
  const { tent } = doc;
  const fixtures = doc.fixtures.length > 0 ? doc.fixtures : [EXAMPLE_LAMP];
  let plan: ScenarioDocument = { ...doc, fixtures, tiers: [], placements: [] };
  plan = addTier(plan, tent, tent.heightM * 0.25).plan;
  plan = addTier(plan, tent, tent.heightM * 0.62).plan;
  for (const tier of plan.tiers)
    plan = addLamp(plan, { fixture: fixtures[0]!.id, tier: tier.id, positionM: placeForLamp(plan, tier.id) }).plan;
  return {
    ...plan,
    water: { reservoirL: 40 },
    climate: { ...doc.climate, exhaust: { maxAirflowM3H: 100, inputPowerW: 10 } },
  };
}

const dashed = { fill: 'none', stroke: 'var(--ink-soft)', strokeWidth: 1.1, strokeDasharray: '5 4' } as const;

export function ExamplePart({ doc, frame }: { doc: ScenarioDocument; frame: SectionFrame }) {
  const model = sectionModel({ doc, evaluation: null, frame, parted: NOBODY });
  const words = (x: number, y: number, text: string, anchor: 'middle' | 'end' | 'start' = 'middle') => (
    <text x={px(x)} y={px(y)} textAnchor={anchor} fontSize={12} fill="var(--ink)">
      {text}
    </text>
  );
  const top = model.lamps[0];
  const water = model.reservoir?.box;
  const middle = (model.tent.x0 + model.tent.x1) / 2;
  return (
    <g aria-hidden="true">
      {model.tiers.map(({ tier, shelf }) => (
        <g key={tier.id}>
          <rect
            x={px(shelf.x0)}
            y={px(shelf.y0)}
            width={px(shelf.x1 - shelf.x0)}
            height={px(shelf.y1 - shelf.y0)}
            {...dashed}
          />
          {words(middle, shelf.y0 - 8, 'a shelf')}
        </g>
      ))}
      {model.lamps.map(({ lamp, outline, hangerPx }) => (
        <g key={lamp.id}>
          <polygon points={points(outline.housing)} {...dashed} />
          <path d={`M${px(outline.holdPx[0])} ${px(hangerPx)}V${px(outline.topPx)}`} {...dashed} />
        </g>
      ))}
      {top && words(top.outline.holdPx[0], top.outline.bottomPx + 18, 'a lamp hangs here')}
      {water && (
        <>
          <rect
            x={px(water.x0)}
            y={px(water.y0)}
            width={px(water.x1 - water.x0)}
            height={px(water.y1 - water.y0)}
            {...dashed}
          />
          {words((water.x0 + water.x1) / 2, (water.y0 + water.y1) / 2 + 4, 'water and pump')}
        </>
      )}
      {model.fan && frame.view === 'front' && (
        <>
          <circle cx={px(model.fan.x)} cy={px(model.fan.y)} r={model.fan.r} {...dashed} />
          {words(model.fan.x + model.fan.r + 8, model.fan.y + 4, 'a fan draws out', 'start')}
        </>
      )}
    </g>
  );
}
