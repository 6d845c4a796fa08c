import { useLocalSearchParams, useRouter } from 'expo-router';
import { leadSorts, leadStages, type LeadStage } from '../../shared/api/desk';
import type { LeadSort } from '../api/use-leads';

export const sortWords: Readonly<Record<LeadSort, string>> = { due: 'Time left', newest: 'Newest first', oldest: 'Oldest first', name: 'Name', price: 'Highest price' };

export interface AddressFilters {
  readonly stage: LeadStage | undefined;
  readonly sort: LeadSort;
}

/** Stage and sort of an address; what it does not know counts as not given. */
export const readFilters = (params: Readonly<Record<string, string | string[] | undefined>>): AddressFilters => ({
  stage: leadStages.find((stage) => stage === params['stage']),
  sort: leadSorts.find((sort) => sort === params['sort']) ?? 'due',
});

/** "?stage=booked&sort=name"; empty when nothing differs from an open list. */
export function filtersInAddress({ stage, sort }: AddressFilters): string {
  const query = [stage ? `stage=${stage}` : '', sort === 'due' ? '' : `sort=${sort}`].filter(Boolean).join('&');
  return query && `?${query}`;
}

/** The list's filters, kept in the address, so that Back, reload and a copied link show the same. */
export function useAddressFilters() {
  const filters = readFilters(useLocalSearchParams());
  const router = useRouter();
  const set = (change: Partial<AddressFilters>) => {
    const next = { ...filters, ...change };
    router.setParams({ stage: next.stage, sort: next.sort === 'due' ? undefined : next.sort });
  };
  return { ...filters, set };
}
