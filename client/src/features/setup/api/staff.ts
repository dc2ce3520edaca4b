import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { request } from '../../../api/request';
import type { GridState } from '../../../components/grid/grid-address';
import { gridQuery } from '../../../components/grid/grid-address';
import type { ListAnswer } from '../../../components/grid/use-server-grid';
import type { StaffRole } from '../../../lib/area';

export interface StaffMember {
  id: number;
  name: string;
  email: string;
  role: StaffRole;
  status: 'invited' | 'unconfirmed' | 'active' | 'disabled';
  version: number;
}

const staffKey = ['staff'] as const;

export const staffQuery = (state: GridState) =>
  queryOptions({
    queryKey: [...staffKey, state] as const,
    queryFn: ({ signal }) => request<ListAnswer<StaffMember>>('GET', '/api/staff', { query: gridQuery(state), signal }),
  });

export interface Invitation {
  name: string;
  email: string;
  role: StaffRole;
}

export function useInvite(): UseMutationResult<StaffMember, Error, { body: Invitation; idempotencyKey: string }> {
  return useMutation({
    mutationFn: (call) => request<StaffMember>('POST', '/api/invitations', call),
    meta: { touches: [staffKey], showsRefusal: true },
  });
}

export function useInviteAgain(): UseMutationResult<void, Error, number> {
  return useMutation({ mutationFn: (id) => request<void>('POST', `/api/staff/${id}/invitations`) });
}

export interface StaffEdit {
  id: number;
  version: number;
  role?: StaffRole;
  status?: 'active' | 'disabled';
}

export function useEditStaff(): UseMutationResult<StaffMember, Error, StaffEdit> {
  return useMutation({
    mutationFn: ({ id, ...body }) => request<StaffMember>('PATCH', `/api/staff/${id}`, { body }),
    meta: { touches: [staffKey, ['session']], showsRefusal: true },
  });
}

export function useEndStaffSessions(): UseMutationResult<void, Error, number> {
  return useMutation({
    mutationFn: (id) => request<void>('DELETE', `/api/staff/${id}/sessions`),
    meta: { showsRefusal: true },
  });
}
