import { keepPreviousData, useInfiniteQuery, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { getLead, listLeads, moveLead, type Lead, type leadSorts, type LeadStage } from '../../shared/api/desk';
import { request } from './client';

export type LeadSort = (typeof leadSorts)[number];
export interface LeadFilters {
  /** undefined: all stages. */
  readonly stage: LeadStage | undefined;
  readonly search: string;
  readonly sort: LeadSort;
}

export const leadsKey = ['desk', 'leads'] as const;
export const leadKey = (id: string) => ['desk', 'lead', id] as const;

/** Leads page by page; while a new search is on its way the last result stays. */
export const useLeads = ({ stage, search, sort }: LeadFilters) =>
  useInfiniteQuery({
    queryKey: [...leadsKey, { stage, search, sort }],
    queryFn: ({ signal, pageParam: cursor }) => request(listLeads, { signal, query: { stage, search: search || undefined, sort, cursor } }),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: (page) => page.nextCursor ?? undefined,
    placeholderData: keepPreviousData,
  });

/** How many leads stand at each stage, whatever the list is narrowed to. */
export const useLeadCounts = () =>
  useQuery({
    queryKey: [...leadsKey, 'counts'],
    queryFn: async ({ signal }) => (await request(listLeads, { signal, query: { limit: 1 } })).counts,
    staleTime: 30_000,
  });

export const useLead = (id: string) =>
  useQuery({ queryKey: leadKey(id), queryFn: ({ signal }) => request(getLead, { signal, params: { id } }) });

export interface Move {
  readonly stage: LeadStage;
  readonly note: string;
  /** What this page has seen; the server refuses with 412 when somebody was faster. */
  readonly version: number;
}

/** Moves a lead to another stage. */
export function useMoveLead(id: string, csrfToken: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ stage, note, version }: Move) =>
      request(moveLead, {
        params: { id }, body: { stage, ...(note.trim() ? { note: note.trim() } : {}) }, headers: { 'If-Match': `"${version}"`, 'X-CSRF-Token': csrfToken },
      }),
    onSuccess: (lead) => {
      client.setQueryData<Lead>(leadKey(id), lead);
      return client.invalidateQueries({ queryKey: leadsKey });
    },
  });
}
