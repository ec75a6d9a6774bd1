'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { apiGet, apiSend } from '../http/api-client';
import type { Scenario, ScenarioChange, ScenarioCopy, Workbench } from './scenario.schema';

const scenarioPath = (gardenId: string, scenarioId: string) => `/api/v1/gardens/${gardenId}/scenarios/${scenarioId}`;
export const workbenchKey = (gardenId: string, scenarioId: string) =>
  ['gardens', gardenId, 'scenarios', scenarioId] as const;

export function useWorkbench(gardenId: string, scenarioId: string, initialData?: Workbench) {
  return useQuery({
    queryKey: workbenchKey(gardenId, scenarioId),
    queryFn: () => apiGet<Workbench>(scenarioPath(gardenId, scenarioId)),
    ...(initialData && { initialData }),
  });
}

/** Saves without reading anything again: the editor holds what is newest. */
export function saveScenario(gardenId: string, scenarioId: string, change: ScenarioChange): Promise<Scenario> {
  return apiSend<Scenario>('PATCH', scenarioPath(gardenId, scenarioId), change);
}

export function useUpdateScenario(gardenId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ scenarioId, ...change }: ScenarioChange & { scenarioId: string }) =>
      saveScenario(gardenId, scenarioId, change),
    onSuccess: () => client.invalidateQueries({ queryKey: ['gardens', gardenId] }),
  });
}

export function useCopyScenario(gardenId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ fromId, ...copy }: ScenarioCopy & { fromId: string }) =>
      apiSend<Scenario>('POST', `${scenarioPath(gardenId, fromId)}/copy`, copy),
    onSuccess: () => client.invalidateQueries({ queryKey: ['gardens', gardenId] }),
  });
}

export function useDeleteScenario(gardenId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (scenarioId: string) => apiSend<void>('DELETE', scenarioPath(gardenId, scenarioId)),
    onSuccess: () => client.invalidateQueries({ queryKey: ['gardens', gardenId] }),
  });
}
