'use client';

/** Right of the tent: what grows and what drinks, each sentence beside its thing. */
import { possessive } from '@/lib/format/possessive';
import { Explainable } from '../explain';
import { Num } from '../num';
import type { NoteBlock } from './annotation-column';
import { heatWidthPx } from './heat-arrow';
import type { SectionContext } from './section-context';
import { applyWayOut } from '@/lib/scenarios/ways-out';
import { isSelected } from './plan-edit';
import type { TierModel } from './section-model';
import { verdictFigure, verdictWords, type TierVerdict } from './tier-verdict';

const link = 'cursor-pointer border-b-2 border-lamp-ink py-0.5 text-left font-semibold text-lamp-ink';
const dotted = 'cursor-pointer border-b border-dotted border-ink-soft text-left text-ink';

export function tierNotes(context: SectionContext): NoteBlock[] {
  const { model, verdicts, selection, worst } = context;
  const many = model.tiers.length > 3 || model.frame.pxPerM < 200;
  const blocks: NoteBlock[] = [];
  for (const tier of model.tiers) {
    const verdict = verdicts.get(tier.tier.id);
    const selected = isSelected(selection, 'tier', tier.tier.id);
    const isWorst = worst === tier.tier.id;
    blocks.push({
      id: `tier-${tier.tier.id}`,
      node: <TierNote context={context} tier={tier} verdict={verdict} short={many && !isWorst} />,
      estimatePx: many && !isWorst ? 44 : 116,
      wantedTopPx: tier.leafY - 44,
      toPx: [tier.shelf.x1 - 10, (tier.leafY + tier.shelf.y0) / 2],
      selected,
    });
    if (!many && tier.strip?.form === 'full' && verdict && verdict.maxDli > 0)
      blocks.push({
        id: `strip-${tier.tier.id}`,
        node: <StripNote tier={tier} verdict={verdict} />,
        estimatePx: 34,
        wantedTopPx: tier.strip.curve.top + 2,
        toPx: verdict.low === null ? null : [model.tent.x1 + 16, tier.strip.curve.top + 10],
        plainEnd: true,
      });
  }
  return blocks;
}

interface TierNoteProps {
  context: SectionContext;
  tier: TierModel;
  verdict: TierVerdict | undefined;
  short?: boolean;
  /** On a phone the letter stands before the words and the name goes below. */
  compact?: boolean;
}

const TONES = { inside: 'text-moss', below: 'text-lamp-ink', above: 'text-lamp-ink', none: 'text-ink' } as const;

export function TierNote({ context, tier, verdict, short, compact }: TierNoteProps) {
  const { words, worst, select, verdictsBefore, ways, waysTier, edit } = context;
  const id = tier.tier.id;
  const isWorst = worst === id;
  const sites = tier.tier.sites;
  const named = context.slots.cropNames?.[id];
  const offered = waysTier === id && !edit.held ? ways : [];
  return (
    <div>
      <p className="text-12 text-ink-soft">
        <button type="button" className={dotted} onClick={() => select({ kind: 'tier', id })}>
          {words.tier(id)}
        </button>
        {verdict?.crop
          ? `: ${verdict.crop}, ${verdict.stage}`
          : named
            ? `: ${named}; no light is known for it yet`
            : ': '}
        {!verdict?.crop && !named && (
          <button type="button" className={dotted} onClick={() => select({ kind: 'tier', id })}>
            choose what grows here
          </button>
        )}
        {sites && !compact ? `, ${sites.rows * sites.columns} sites` : ''}
      </p>
      {verdict && (
        <p className={isWorst ? 'text-22' : 'text-17'}>
          <Explainable path={`tiers.${id}.dli`}>
            <span className={`font-semibold ${TONES[verdict.verdict]}`}>
              <Num text={verdictFigure(verdict)} />
            </span>
          </Explainable>
          {verdictWords(verdict)}
          {offered.length > 0 ? ':' : '.'}
        </p>
      )}
      {verdict && <Before now={verdict} before={verdictsBefore?.get(id)} held={edit.held} />}
      {offered.map((way) => (
        <p key={words.way(way)} className="text-14 text-ink-soft">
          <button
            type="button"
            className={link}
            disabled={edit.readOnly !== null}
            onClick={() => edit.apply((plan) => applyWayOut(plan, way), `way ${words.way(way)}`)}
          >
            {words.way(way)}
          </button>{' '}
          {words.wayPrice(way)}
        </p>
      ))}
      {verdict && verdict.maxDli === 0 && <p className="text-12 text-ink-soft">No lamp reaches it yet.</p>}
      {verdict && verdict.maxDli > 0 && !short && (
        <p className="text-12 text-ink-soft">
          From {verdict.minDli.toFixed(1)} in its dimmest spot to {verdict.maxDli.toFixed(1)} in its brightest; evenness{' '}
          <Explainable path={`tiers.${id}.evenness`}>
            <Num text={verdict.evenness.toFixed(2)} />
          </Explainable>
          , lowest over mean. <Stray verdict={verdict} id={id} />
        </p>
      )}
    </div>
  );
}

function Stray({ verdict, id }: { verdict: TierVerdict; id: string }) {
  if (verdict.stray === null) return 'It has no dark hours.';
  if (verdict.stray < 0.05) return 'Its dark hours stay dark.';
  return (
    <>
      <Explainable path={`tiers.${id}.stray`}>
        <Num text={verdict.stray.toFixed(1)} />
      </Explainable>{' '}
      µmol/m²/s spill into its dark hours.
    </>
  );
}

function Before({ now, before, held }: { now: TierVerdict; before: TierVerdict | undefined; held: boolean }) {
  if (!held || !before) return null;
  const moved = verdictFigure(before) !== verdictFigure(now);
  const even = before.evenness.toFixed(2) !== now.evenness.toFixed(2);
  if (!moved && !even) return <p className="text-12 text-ink-soft">Unchanged by this move.</p>;
  return (
    <p className="text-14">
      {moved ? `Was ${verdictFigure(before)} before you moved it.` : ''}
      {even ? ` Evenness ${now.evenness.toFixed(2)}, was ${before.evenness.toFixed(2)}.` : ''}
    </p>
  );
}

function StripNote({ tier, verdict }: { tier: TierModel; verdict: TierVerdict }) {
  if (!tier.strip) return null;
  const low = Math.min(...tier.strip.profile.low);
  const high = Math.max(...tier.strip.profile.high);
  const seconds = verdict.hours * 0.0036;
  return (
    <p className="text-12 text-ink-soft">
      The strip: {low.toFixed(0)} at its lowest, {high.toFixed(0)} at its highest
      {verdict.low !== null && verdict.high !== null && seconds > 0
        ? `; the bracket: ${(verdict.low / seconds).toFixed(0)} to ${(verdict.high / seconds).toFixed(0)}, ${possessive(verdict.crop ?? 'its crop')} band in ${Number(verdict.hours.toFixed(1))} h.`
        : '.'}
    </p>
  );
}

export function waterNote(context: SectionContext): NoteBlock[] {
  const { doc, model, evaluation, told, words, select, selection } = context;
  const { reservoir } = model;
  if (!reservoir) return [];
  const month = evaluation?.year.months.find((each) => each.month === told?.month);
  const perDay = month && month.waterL > 0 ? month.waterL / 30.4 : null;
  const flood = doc.water?.flood;
  const node = (
    <div>
      <p className="text-14">
        <button type="button" className={`${dotted} font-semibold`} onClick={() => select({ kind: 'water' })}>
          Reservoir
        </button>{' '}
        <span className="text-ink-soft">
          {words.say(doc.water?.reservoirL ?? 0, 'volume', 0)}
          {perDay !== null ? `, ${words.say(perDay, 'volume', 1)} gone a day` : ''}
        </span>
      </p>
      {doc.water?.pump && (
        <p className="text-12 text-ink-soft">
          Pump {words.say(doc.water.pump.inputPowerW, 'power')}
          {flood ? `: ${flood.minutes} min every ${Number((flood.everyMinutes / 60).toFixed(1))} h` : ''}
        </p>
      )}
    </div>
  );
  return [
    {
      id: 'water',
      node,
      estimatePx: 38,
      wantedTopPx: (reservoir.box.y0 + reservoir.box.y1) / 2 - 26,
      toPx: [reservoir.box.x1 - 8, reservoir.waterY + 14],
      selected: isSelected(selection, 'water'),
    },
  ];
}

/** The fan's words stand level with it, as tall as its arrow is wide. */
export function fanNote(context: SectionContext): NoteBlock[] {
  const { doc, model, evaluation, words, select, selection } = context;
  const { fan, frame } = model;
  const exhaust = doc.climate.exhaust;
  if (!fan || !exhaust) return [];
  const light = evaluation?.heat.coldLight;
  const front = frame.view === 'front';
  const arrowPx = front && light ? Math.min(60, heatWidthPx(light.exhaustW + light.latentW)) + 8 : 0;
  const node = (
    <div className="flex flex-col justify-center" style={{ minHeight: Math.max(38, arrowPx) }}>
      <p className="text-14">
        <button type="button" className={`${dotted} font-semibold`} onClick={() => select({ kind: 'fan' })}>
          Exhaust fan
        </button>{' '}
        <span className="text-ink-soft">
          {words.say(exhaust.inputPowerW, 'power')}
          {light ? `, ${words.say(light.airflowM3H, 'airflow')} on a cold day` : ''}
        </span>
      </p>
      {light && evaluation && (
        <p className="text-12 text-ink-soft">
          carries out {words.say(light.exhaustW + light.latentW, 'power')};{' '}
          <Explainable path="heat.wallDewMargin">
            {evaluation.heat.wallDewMarginK >= 0 ? 'the wall stays dry' : 'the wall sweats'}
          </Explainable>
        </p>
      )}
    </div>
  );
  return [
    {
      id: 'fan',
      node,
      estimatePx: Math.max(38, arrowPx),
      wantedTopPx: front ? fan.y - Math.max(38, arrowPx) / 2 : fan.y - 10,
      toPx: front ? null : [fan.x + fan.r * 0.65, fan.y],
      selected: isSelected(selection, 'fan'),
    },
  ];
}
