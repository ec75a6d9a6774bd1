'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { Role } from '../db/database';
import { apiGet, apiSend } from '../http/api-client';
import type { Garden, GardenChange, GardenInput, JoinCode, Member } from './garden.schema';

const path = (gardenId: string, part = '') => `/api/v1/gardens/${gardenId}${part}`;

function useSettled() {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: ['gardens'] });
}

export function useCreateGarden() {
  return useMutation({
    mutationFn: (input: GardenInput) => apiSend<Garden>('POST', '/api/v1/gardens', input),
    onSuccess: useSettled(),
  });
}

export function useUpdateGarden(gardenId: string) {
  return useMutation({
    mutationFn: (change: GardenChange) => apiSend<Garden>('PATCH', path(gardenId), change),
    onSuccess: useSettled(),
  });
}

export function useDeleteGarden(gardenId: string) {
  return useMutation({ mutationFn: () => apiSend<void>('DELETE', path(gardenId)), onSuccess: useSettled() });
}

export function useJoinGarden() {
  return useMutation({
    mutationFn: (code: string) => apiSend<{ gardenId: string; role: Role }>('POST', '/api/v1/gardens/join', { code }),
    onSuccess: useSettled(),
  });
}

export function useMembers(gardenId: string, initialData: Member[]) {
  return useQuery({
    queryKey: ['gardens', gardenId, 'members'],
    queryFn: () => apiGet<Member[]>(path(gardenId, '/members')),
    initialData,
  });
}

export function useUpdateMember(gardenId: string) {
  return useMutation({
    mutationFn: ({ accountId, role }: { accountId: string; role: Role }) =>
      apiSend<Member[]>('PATCH', path(gardenId, `/members/${accountId}`), { role }),
    onSuccess: useSettled(),
  });
}

export function useRemoveMember(gardenId: string) {
  return useMutation({
    mutationFn: (accountId: string) => apiSend<void>('DELETE', path(gardenId, `/members/${accountId}`)),
    onSuccess: useSettled(),
  });
}

export function useJoinCodes(gardenId: string, initialData: JoinCode[]) {
  return useQuery({
    queryKey: ['gardens', gardenId, 'join-codes'],
    queryFn: () => apiGet<JoinCode[]>(path(gardenId, '/join-codes')),
    initialData,
  });
}

export function useCreateJoinCode(gardenId: string) {
  return useMutation({
    mutationFn: (role: JoinCode['role']) =>
      apiSend<JoinCode & { code: string }>('POST', path(gardenId, '/join-codes'), { role }),
    onSuccess: useSettled(),
  });
}

export function useDeleteJoinCode(gardenId: string) {
  return useMutation({
    mutationFn: (joinCodeId: string) => apiSend<void>('DELETE', path(gardenId, `/join-codes/${joinCodeId}`)),
    onSuccess: useSettled(),
  });
}
