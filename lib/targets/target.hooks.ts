'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { apiGet, apiSend } from '../http/api-client';
import type { GardenTarget, TargetChange, TargetInput } from './target.schema';

const targetsPath = (gardenId: string) => `/api/v1/gardens/${gardenId}/targets`;
export const targetsKey = (gardenId: string) => ['gardens', gardenId, 'targets'] as const;

export function useGardenTargets(gardenId: string, initialData?: GardenTarget[]) {
  return useQuery({
    queryKey: targetsKey(gardenId),
    queryFn: () => apiGet<GardenTarget[]>(targetsPath(gardenId)),
    ...(initialData && { initialData }),
  });
}

/** After a change everything that leans on it is read again. */
function useSettled(gardenId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: ['gardens', gardenId] });
}

export function useCreateGardenTarget(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: (input: TargetInput) => apiSend<GardenTarget>('POST', targetsPath(gardenId), input),
    onSuccess,
  });
}

export function useUpdateGardenTarget(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: ({ targetId, ...change }: TargetChange & { targetId: string }) =>
      apiSend<GardenTarget>('PATCH', `${targetsPath(gardenId)}/${targetId}`, change),
    onSuccess,
  });
}

export function useDeleteGardenTarget(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: (targetId: string) => apiSend<void>('DELETE', `${targetsPath(gardenId)}/${targetId}`),
    onSuccess,
  });
}
