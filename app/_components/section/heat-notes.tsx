'use client';

/** Left of the tent: what burns and what blows, and the inspector of the one thing that is chosen. */
import { heaterNeedW, worstColdState } from '@/lib/evaluation/evaluate-scenario';
import { Sentence } from '../sentence';
import { Explainable } from '../explain';
import { Num } from '../num';
import type { NoteBlock } from './annotation-column';
import { Inspector } from './inspector';
import { isSelected } from './plan-edit';
import type { SectionContext } from './section-context';
import { DAYS_IN_MONTH } from '@/lib/scenarios/coldest-month';
import { textWidthPx } from '../chart/label-stair';
import { MONTHS } from './month-names';

const dotted = 'cursor-pointer border-b border-dotted border-ink-soft text-left text-ink';

export function lampNotes(context: SectionContext, columnX: number): NoteBlock[] {
  const { model, selection, words, select } = context;
  const chosenLamp = selection?.kind === 'lamp' ? selection.id : null;
  const inspecting = selection !== null;
  return model.groups.flatMap((group): NoteBlock[] => {
    const lamps = model.lamps.filter((lamp) => lamp.group === group);
    const chosen = chosenLamp !== null && group.lamps.some((lamp) => lamp.id === chosenLamp);
    const shown = lamps.find(({ lamp }) => lamp.id === chosenLamp) ?? lamps[0];
    if (!shown) return [];
    const name = words.group(group);
    const to: readonly [number, number] = [shown.outline.leftPx + 2, shown.outline.holdPx[1]];
    if (chosen)
      return [
        {
          id: `lamp-${group.id}`,
          node: <Inspector context={context} />,
          estimatePx: 400,
          wantedTopPx: Math.min(to[1] - 9, 250),
          toPx: to,
          selected: true,
          leaderFromPx: columnX + Math.min(330, textWidthPx(name, 14) + 16),
        },
      ];
    return [
      {
        id: `lamp-${group.id}`,
        node: (
          <div>
            <p className="text-14">
              <button
                type="button"
                className={`${dotted} font-semibold`}
                onClick={() => select({ kind: 'lamp', id: shown.lamp.id })}
              >
                {name}
              </button>
            </p>
            {!inspecting && <p className="text-12 text-ink-soft">{words.groupFacts(group)}</p>}
          </div>
        ),
        estimatePx: inspecting ? 21 : 38,
        wantedTopPx: to[1] - 9,
        toPx: to,
      },
    ];
  });
}

/** The inspector of anything but a lamp stands level with its thing. */
export function otherInspector(context: SectionContext): NoteBlock[] {
  const { selection, model, doc } = context;
  if (!selection || selection.kind === 'lamp') return [];
  // A heater's fields stand beside the heater, where there is one.
  if (selection.kind === 'heater' && doc.climate.heater) return [];
  const tier = selection.kind === 'tier' ? model.tiers.find((each) => each.tier.id === selection.id) : undefined;
  return [
    {
      id: 'inspector',
      node: <Inspector context={context} />,
      estimatePx: 360,
      wantedTopPx: tier ? Math.min(tier.shelf.y0 - 60, 260) : 200,
      toPx: tier ? [tier.shelf.x0 + 6, (tier.shelf.y0 + tier.shelf.y1) / 2] : null,
      selected: true,
    },
  ];
}

export function heaterNote(context: SectionContext): NoteBlock[] {
  const { model, selection, doc } = context;
  const { heater, tent } = model;
  if (!doc.climate.heater) return [];
  const chosen = isSelected(selection, 'heater');
  return [
    {
      id: 'heater',
      node: chosen ? <Inspector context={context} /> : <HeaterWords context={context} short={selection !== null} />,
      // With its caution, which it loses while something else is chosen.
      estimatePx: chosen ? 330 : selection ? 74 : 150,
      wantedTopPx: tent.y1 - 128,
      toPx: heater ? [heater.box.x0 + 1, heater.box.y0 + 14] : null,
      selected: chosen,
    },
  ];
}

export function HeaterWords({ context, short }: { context: SectionContext; short?: boolean }) {
  const { doc, evaluation, told, words, select } = context;
  const heater = doc.climate.heater;
  if (!heater) return null;
  const month = evaluation?.year.months.find((each) => each.month === told?.month);
  const hours = (DAYS_IN_MONTH[(told?.month ?? 1) - 1] ?? 30) * 24;
  const caution = evaluation?.cautions.find((each) => each.code.startsWith('heater'));
  return (
    <div>
      <p className="text-14">
        <button type="button" className={`${dotted} font-semibold`} onClick={() => select({ kind: 'heater' })}>
          Heater
        </button>{' '}
        <span className="text-ink-soft">
          {words.say(heater.ratedPowerW, 'power')}
          {evaluation && (
            <>
              ; the coldest hour asks for{' '}
              <Explainable path={worstHeatPath(context)}>
                <Num text={words.say(worstHeatW(context), 'power')} />
              </Explainable>
            </>
          )}
        </span>
      </p>
      {month && told && month.energyKwh.total > 0 && (
        <p className="text-12 text-ink-soft">
          {MONTHS[told.month - 1]}: {words.say((month.energyKwh.heater * 1000) / hours, 'power')} on average,{' '}
          {month.energyKwh.heater.toFixed(0)} kWh of the month’s {month.energyKwh.total.toFixed(0)}.
        </p>
      )}
      {caution && !short && (
        <p className="mt-1 max-w-[24rem] text-12">
          <span className="font-semibold text-ember-ink">Caution.</span> <Sentence text={caution.text} />
        </p>
      )}
    </div>
  );
}

const worstHeatW = ({ evaluation }: SectionContext) => (evaluation ? heaterNeedW(evaluation.heat) : 0);
const worstHeatPath = ({ evaluation }: SectionContext) =>
  `heat.${evaluation ? worstColdState(evaluation.heat) : 'coldDark'}.heater`;
