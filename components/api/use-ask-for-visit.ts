import { useMutation, useQueryClient } from '@tanstack/react-query';
import { askForVisit, type Contact } from '../../shared/api/intakes';
import { request } from './client';
import { keepNewer } from './use-intake';

/** Hands the intake to the estimator without a price. `key` stays the same while the same attempt is repeated. */
export function useAskForVisit() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ contact, key }: { contact: Contact; key: string }) => request(askForVisit, { body: contact, idempotencyKey: key }),
    onSuccess: (intake) => keepNewer(client, intake),
  });
}
