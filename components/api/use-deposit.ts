import { useMutation, useQuery } from '@tanstack/react-query';
import type { Contact } from '../../shared/api/intakes';
import { getDeposit, startDeposit } from '../../shared/api/quotes';
import { request } from './client';

export const depositKey = ['deposit'] as const;

/** Makes the payment page for the deposit of one option. `key` stays the same while the same attempt is repeated. */
export const useStartDeposit = () =>
  useMutation({
    mutationFn: ({ key, ...body }: { quoteId: string; optionId: string; contact: Contact; key: string }) =>
      request(startDeposit, { body, idempotencyKey: key }),
  });

/** Where the deposit stands; asks again every `everyMs` while it is pending. */
export const useDeposit = (everyMs: number | false) =>
  useQuery({
    queryKey: depositKey,
    queryFn: ({ signal }) => request(getDeposit, { signal }),
    refetchInterval: (query) => (query.state.data === undefined || query.state.data.state === 'pending' ? everyMs : false),
  });
