'use client';

/** What the scenario's rows add to the section: crops, lamps of the garden, circuits' names, the tent's body, clashes. */
import { useMemo } from 'react';
import { TextLink } from '@/app/_components/link';
import { shortCrop } from '@/app/_components/section/tier-verdict';
import type { SectionSlots } from '@/app/_components/section/section-context';
import { targetKey, type ResolvedTarget, type TargetRef } from '@/lib/crops/crop.schema';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import type { Plan } from '@/lib/scenarios/plan.schema';
import type { Workbench } from '@/lib/scenarios/scenario.schema';
import { setAtPath } from '@/lib/scenarios/merge-plans';
import type { PlanEditor } from '@/lib/scenarios/use-plan-editor';
import type { Tent } from '@/lib/tents/tent.schema';
import { ClashPanel } from './clash-panel';
import { CropField } from './crop-field';

interface SlotInput {
  workbench: Workbench;
  editor: PlanEditor<Plan>;
  documentOf: (plan: Plan) => ScenarioDocument;
  targets: readonly ResolvedTarget[];
  setTent: (patch: Partial<Tent['body']>) => void;
}

function withTarget(plan: Plan, tierId: string, targetRef: TargetRef | null): Plan {
  return { ...plan, tiers: plan.tiers.map((tier) => (tier.id === tierId ? { ...tier, targetRef } : tier)) };
}

export function useSlots({ workbench, editor, documentOf, targets, setTent }: SlotInput): SectionSlots {
  const { gardenId } = workbench.garden;
  const { fixtures, room, can } = workbench;
  const { settled, apply, clash } = editor;
  const allFixtures = useMemo(
    (): ScenarioDocument['fixtures'] =>
      fixtures.map(({ fixtureId, name, photons, spec: { rating: _rating, ...spec } }) => ({
        ...spec,
        id: fixtureId,
        name,
        ppfUmolS: photons.ppfUmolS,
      })),
    [fixtures],
  );
  const theirs = useMemo(() => {
    if (!clash) return undefined;
    const plan = clash.conflicts.reduce((from, conflict) => setAtPath(from, conflict.path, conflict.theirs), settled);
    return documentOf(plan);
  }, [clash, settled, documentOf]);
  return useMemo((): SectionSlots => {
    const cropField = (tierId: string) => {
      const chosen = settled.tiers.find((tier) => tier.id === tierId)?.targetRef ?? null;
      return (
        <CropField
          gardenId={gardenId}
          chosen={chosen}
          target={chosen ? targets.find((target) => targetKey(target) === targetKey(chosen)) : undefined}
          disabled={!can['scenario.update']}
          onChoose={(ref) => apply(withTarget(settled, tierId, ref), `crop ${tierId}`)}
        />
      );
    };
    return {
      cropField,
      cropNames: Object.fromEntries(
        settled.tiers.flatMap(({ id, targetRef }) =>
          targetRef ? [[id, `${shortCrop(targetRef.crop)}, ${targetRef.stage}`]] : [],
        ),
      ),
      fixtures: allFixtures,
      fixturesLink: (
        <TextLink href={`/gardens/${gardenId}/fixtures`} look="opens">
          {can['fixture.create'] ? 'Add a lamp to the garden' : 'The garden’s lamps'}
        </TextLink>
      ),
      // The row's type and the document's differ only in what is readonly.
      setTent: can['tent.update'] ? (patch) => setTent(patch as Partial<Tent['body']>) : undefined,
      circuitNames: Object.fromEntries(room.power.circuits.map((circuit) => [circuit.id, circuit.name])),
      theirs,
      clash: clash ? (
        <ClashPanel workbench={workbench} editor={editor} theirs={theirs!} documentOf={documentOf} />
      ) : null,
    };
  }, [
    settled,
    gardenId,
    targets,
    can,
    apply,
    allFixtures,
    setTent,
    room,
    theirs,
    clash,
    workbench,
    editor,
    documentOf,
  ]);
}
