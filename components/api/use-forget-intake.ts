import { useMutation, useQueryClient } from '@tanstack/react-query';
import { forgetIntake } from '../../shared/api/intakes';
import { request } from './client';
import { intakeKey } from './use-intake';

/** Ends this browser's hold on the intake; who has the mailed link still opens it. */
export function useForgetIntake() {
  const client = useQueryClient();
  return useMutation({ mutationFn: () => request(forgetIntake), onSuccess: () => client.removeQueries({ queryKey: intakeKey }) });
}
