import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';

import { changeRole, invite, listCrew, listInvitations, removeMember, revokeInvitation } from '@/shared/contracts/crew';
import type { Role } from '@/shared/roles/roles';
import { call } from './client';

const crewKey = ['crew'] as const;

/** The people of the shop. */
export function useCrew() {
  return useQuery({ queryKey: crewKey, queryFn: ({ signal }) => call(listCrew, { signal }) });
}

/** Invitations nobody has accepted yet; for owners. */
export function useInvitations(wanted: boolean) {
  return useQuery({
    queryKey: [...crewKey, 'invitations'],
    queryFn: ({ signal }) => call(listInvitations, { signal }),
    enabled: wanted,
  });
}

function useCrewChange<Input, Output>(change: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({ mutationFn: change, onSuccess: () => client.invalidateQueries({ queryKey: crewKey }) });
}

export const useChangeRole = () =>
  useCrewChange(({ personId, role }: { readonly personId: string; readonly role: Role }) =>
    call(changeRole, { params: { personId }, body: { role } }),
  );

export const useRemoveMember = () => useCrewChange((personId: string) => call(removeMember, { params: { personId } }));

/** `key` stays the same over retries, so that one press sends one mail. */
export const useInvite = () =>
  useCrewChange(({ key, ...body }: { readonly key: string; readonly email: string; readonly role: Role }) =>
    call(invite, { body, idempotencyKey: key }),
  );

export const useRevokeInvitation = () =>
  useCrewChange((invitationId: string) => call(revokeInvitation, { params: { invitationId } }));
