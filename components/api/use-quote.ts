import { useQuery } from '@tanstack/react-query';
import { priceIntake } from '../../shared/api/quotes';
import { request } from './client';

export const quoteKey = (version: number | undefined) => ['quote', version] as const;

/** The frozen price of the answers at `version`: the same answers give the same document back, so asking again is safe. */
export const useQuote = (version: number | undefined) =>
  useQuery({
    queryKey: quoteKey(version),
    queryFn: ({ signal }) => request(priceIntake, { signal }),
    enabled: version !== undefined,
    staleTime: Infinity,
  });
