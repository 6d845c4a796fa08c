import { useQuery } from '@tanstack/react-query';
import type { Company } from '../../shared/api/company';
import { send } from './client';

export const companyKey = ['company'] as const;

/** The contractor, the towns and the opening range. It does not load the endpoint's schemas, because the landing page uses it. */
export const useCompany = () =>
  useQuery({ queryKey: companyKey, queryFn: ({ signal }) => send<Company>({ method: 'get', path: '/company' }, { signal }), staleTime: 10 * 60_000 });
