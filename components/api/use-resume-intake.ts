import { useMutation, useQueryClient } from '@tanstack/react-query';
import { resumeIntake } from '../../shared/api/intakes';
import { request } from './client';
import { intakeKey } from './use-intake';

/** Opens an intake by its mailed link and makes it the one this browser holds. */
export function useResumeIntake() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (token: string) => request(resumeIntake, { body: { token } }),
    onSuccess: (intake) => client.setQueryData(intakeKey, intake),
  });
}
