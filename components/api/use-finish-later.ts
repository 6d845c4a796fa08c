import { useMutation } from '@tanstack/react-query';
import { finishLater } from '../../shared/api/intakes';
import { request } from './client';

/** Mails the link that resumes. `key` stays the same while the same attempt is repeated. */
export const useFinishLater = () =>
  useMutation({
    mutationFn: ({ email, key }: { email: string; key: string }) => request(finishLater, { body: { email }, idempotencyKey: key }),
  });
