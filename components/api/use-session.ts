import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useStore } from 'zustand';

import { requestReset, resetPassword, signIn, signOut } from '@/shared/contracts/auth';
import { may, type Permission } from '@/shared/roles/roles';
import { call } from './client';
import { dropSession, session, takeSession } from './session';

/** Who is signed in on this page. */
export const useSession = () => useStore(session);

/** Whether the person signed in may do this; false while nobody is. */
export function useMay(permission: Permission): boolean {
  const { me } = useSession();
  return me !== null && may(me.role, permission);
}

export function useSignIn() {
  return useMutation({
    mutationFn: (body: { email: string; password: string }) => call(signIn, { body }),
    onSuccess: (answer) => takeSession(answer.accessToken, answer.me),
  });
}

/** Signs out on the server where there is signal, and on this device in any case. */
export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => call(signOut).catch(() => undefined),
    onSettled: () => {
      dropSession();
      client.clear();
    },
  });
}

export function useRequestReset() {
  return useMutation({ mutationFn: (email: string) => call(requestReset, { body: { email } }) });
}

export function useResetPassword() {
  return useMutation({
    mutationFn: (body: { token: string; password: string }) => call(resetPassword, { body }),
  });
}
