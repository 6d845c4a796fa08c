import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { getMy, openMy } from '../../shared/api/quotes';
import { request } from './client';

export const myKey = ['my'] as const;

/** The homeowner's page of the link that this browser opened. */
export const useMy = (enabled: boolean) => useQuery({ queryKey: myKey, queryFn: ({ signal }) => request(getMy, { signal }), enabled, retry: false });

/** Opens the page by the token of a mailed link. */
export function useOpenMy() {
  const client = useQueryClient();
  return useMutation({ mutationFn: (token: string) => request(openMy, { body: { token } }), onSuccess: (page) => client.setQueryData(myKey, page) });
}
