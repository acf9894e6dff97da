import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';
import type { SessionState } from '#shared/contracts/account.ts';

/** A change of session: what was fetched for another person goes. */
function useSessionChange<V>(change: (values: V) => Promise<SessionState>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: (session) => {
      client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== keys.session[0] });
      client.setQueryData(keys.session, session);
    },
  });
}

export const useSignIn = () =>
  useSessionChange((body: { email: string; password: string }) => call('signIn', { body }));

export const useSignOut = () => useSessionChange<void>(() => call('signOut', {}));

export const useChangePassword = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { current: string; next: string }) => call('changePassword', { body }),
    onSuccess: (session) => client.setQueryData(keys.session, session),
  });
};

export const useAcceptWelcome = (token: string) =>
  useSessionChange((body: { password: string }) =>
    call('acceptWelcome', { params: { token }, body }),
  );
