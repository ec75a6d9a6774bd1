'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { apiGet, apiSend } from '../http/api-client';
import type { Room, RoomChange, RoomInput } from './room.schema';

const roomsPath = (gardenId: string) => `/api/v1/gardens/${gardenId}/rooms`;
export const roomsKey = (gardenId: string) => ['gardens', gardenId, 'rooms'] as const;

export function useRooms(gardenId: string, initialData?: Room[]) {
  return useQuery({
    queryKey: roomsKey(gardenId),
    queryFn: () => apiGet<Room[]>(roomsPath(gardenId)),
    ...(initialData && { initialData }),
  });
}

/** After a change everything that leans on it is read again. */
function useSettled(gardenId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: ['gardens', gardenId] });
}

export function useCreateRoom(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: (input: RoomInput) => apiSend<Room>('POST', roomsPath(gardenId), input),
    onSuccess,
  });
}

export function useUpdateRoom(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: ({ roomId, ...change }: RoomChange & { roomId: string }) =>
      apiSend<Room>('PATCH', `${roomsPath(gardenId)}/${roomId}`, change),
    onSuccess,
  });
}

export function useDeleteRoom(gardenId: string) {
  const onSuccess = useSettled(gardenId);
  return useMutation({
    mutationFn: (roomId: string) => apiSend<void>('DELETE', `${roomsPath(gardenId)}/${roomId}`),
    onSuccess,
  });
}
