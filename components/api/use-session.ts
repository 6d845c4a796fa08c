import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { getSession, signIn, signOut, type Session } from '../../shared/api/desk';
import { request } from './client';

export const sessionKey = ['desk', 'session'] as const;

/** Who is signed in at the desk. It fails with 401 when nobody is. */
export const useSession = () =>
  useQuery({
    queryKey: sessionKey, queryFn: ({ signal }) => request(getSession, { signal }), staleTime: 60_000, refetchOnWindowFocus: 'always',
  });

/** Signs in. What an earlier person at this desk has seen is forgotten first. */
export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { readonly email: string; readonly password: string }) => request(signIn, { body }),
    onSuccess: (session) => {
      client.removeQueries({ queryKey: ['desk'] });
      client.setQueryData<Session>(sessionKey, session);
    },
  });
}

/** Ends the session here and on the server. */
export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (csrfToken: string) => request(signOut, { headers: { 'X-CSRF-Token': csrfToken } }),
    onSuccess: () => client.removeQueries({ queryKey: ['desk'] }),
  });
}
