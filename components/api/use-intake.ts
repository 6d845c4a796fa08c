import { useQuery, type QueryClient } from '@tanstack/react-query';
import { getIntake, startIntake, type Intake } from '../../shared/api/intakes';
import { request } from './client';

export const intakeKey = ['intake'] as const;

/**
 * The intake this browser holds; the first call of a page starts one when there is none, later ones only read it, so that
 * a second tab's answers arrive on focus and a lost hold is noticed instead of being replaced by an empty intake.
 */
export const useIntake = () =>
  useQuery({
    queryKey: intakeKey,
    queryFn: ({ signal, client }) => (client.getQueryData(intakeKey) ? request(getIntake, { signal }) : request(startIntake, { signal })),
    structuralSharing: (known, came) => newer(known as Intake | undefined, came as Intake),
    staleTime: 2_000,
    refetchOnWindowFocus: 'always',
    retry: false,
  });

/** Answers may arrive out of order: the newer of what is known and what came. */
const newer = (known: Intake | undefined, came: Intake): Intake => (known && known.version > came.version ? known : came);

/** Takes over an intake that came with another call's answer. */
export const keepNewer = (client: QueryClient, intake: Intake): void => {
  client.setQueryData<Intake>(intakeKey, intake);
};
