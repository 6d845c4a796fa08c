import { useMutation } from '@tanstack/react-query';
import { askForArea } from '../../shared/api/company';
import { request } from './client';

/** Keeps the address of someone outside the area who asks to be told. */
export const useAskForArea = () =>
  useMutation({
    mutationFn: ({ key, ...body }: { zip: string; email: string; key: string }) => request(askForArea, { body, idempotencyKey: key }),
  });
