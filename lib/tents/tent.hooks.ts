'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { apiGet, apiSend } from '../http/api-client';
import type { Tent, TentChange, TentInput } from './tent.schema';

const tentsPath = (gardenId: string) => `/api/v1/gardens/${gardenId}/tents`;
export const tentsKey = (gardenId: string) => ['gardens', gardenId, 'tents'] as const;

export function useTents(gardenId: string, initialData?: Tent[]) {
  return useQuery({
    queryKey: tentsKey(gardenId),
    queryFn: () => apiGet<Tent[]>(tentsPath(gardenId)),
    ...(initialData && { initialData }),
  });
}

/** After a change everything that leans on it is read again. */
function useSettled(gardenId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: ['gardens', gardenId] });
}

export function useCreateTent(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: (input: TentInput) => apiSend<Tent>('POST', tentsPath(gardenId), input),
    onSuccess,
  });
}

export function useUpdateTent(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: ({ tentId, ...change }: TentChange & { tentId: string }) =>
      apiSend<Tent>('PATCH', `${tentsPath(gardenId)}/${tentId}`, change),
    onSuccess,
  });
}

export function useDeleteTent(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: (tentId: string) => apiSend<void>('DELETE', `${tentsPath(gardenId)}/${tentId}`),
    onSuccess,
  });
}
