'use client';

import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { targetKey, type CropStage, type ResolvedTarget } from '@/lib/crops/crop.schema';
import { resolveTarget } from '@/lib/crops/reference-target';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { toScenarioDocument } from '@/lib/evaluation/scenario-document';
import { apiGet } from '@/lib/http/api-client';
import type { Plan } from '@/lib/scenarios/plan.schema';
import type { Workbench } from '@/lib/scenarios/scenario.schema';
import { useGardenTargets } from '@/lib/targets/target.hooks';
import type { Tent } from '@/lib/tents/tent.schema';

/** The crop reference is the same for everybody and changes only with a new release. */
export function useCropReference(): CropStage[] | undefined {
  return useQuery({ queryKey: ['crops'], queryFn: () => apiGet<CropStage[]>('/api/v1/crops'), staleTime: Infinity })
    .data;
}

/** Targets of the plan's crops: those that came with the page, and for crops chosen since, the garden's own or the reference. */
export function useTargets(workbench: Workbench, plan: Plan): ResolvedTarget[] {
  const crops = useCropReference();
  const own = useGardenTargets(workbench.garden.gardenId).data;
  const refs = plan.tiers.map((tier) => tier.targetRef).filter((ref) => ref !== null && ref !== undefined);
  const names = [...new Set(refs.map(targetKey))].sort().join('\n');
  return useMemo(() => {
    const known = new Map(workbench.targets.map((target) => [targetKey(target), target]));
    const wanted = new Map(refs.map((ref) => [targetKey(ref), ref]));
    return names
      .split('\n')
      .filter(Boolean)
      .flatMap((name) => {
        const ref = wanted.get(name);
        const target = known.get(name) ?? (ref && crops && own ? resolveTarget(ref, own, crops) : null);
        return target ? [target] : [];
      });
    // `names` stands for `refs`: dragging a lamp must not make the targets anew.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [names, workbench.targets, crops, own]);
}

type Parts = Pick<Workbench, 'room' | 'fixtures' | 'referenceTariff' | 'otherLoads'>;

export function useDocuments(
  workbench: Workbench,
  targets: readonly ResolvedTarget[],
  tent: Pick<Tent, 'body'>,
): (plan: Plan) => ScenarioDocument {
  const { room, fixtures, referenceTariff, otherLoads } = workbench;
  const name = workbench.scenario.name;
  return useMemo(() => {
    const parts: Parts = { room, fixtures, referenceTariff, otherLoads };
    return (plan) => toScenarioDocument({ ...parts, name, plan, tent, targets });
  }, [room, fixtures, referenceTariff, otherLoads, name, tent, targets]);
}
