import { useLocalSearchParams } from 'expo-router';
import { View } from 'react-native';
import { isProblem } from '../api/client';
import { useLead } from '../api/use-leads';
import { space } from '../theme/tokens';
import { Bar, Skeleton } from '../ui/skeleton';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { DeskPage } from './desk-page';
import { filtersInAddress, readFilters } from './lead-filters';
import { LeadColumns } from './lead-columns';
import { LeadHead } from './lead-head';
import { LeadNotices } from './lead-notices';
import { LoadFailure } from './load-failure';
import { SignedIn } from './signed-in';
import { useNow } from './use-now';

/** One lead: everything the desk knows of it. */
export const LeadScreen = () => <SignedIn>{({ csrfToken }) => <OneLead csrfToken={csrfToken} />}</SignedIn>;

function OneLead({ csrfToken }: { readonly csrfToken: string }) {
  const params = useLocalSearchParams<{ id: string }>();
  const lead = useLead(params.id);
  const nowMs = useNow();
  const backHref = `/desk/leads${filtersInAddress(readFilters(params))}`;
  if (!lead.data) {
    return (
      <DeskPage title="Lead">
        <Missing error={lead.error} backHref={backHref} onRetry={() => void lead.refetch()} />
      </DeskPage>
    );
  }
  return (
    <DeskPage title={`${lead.data.jobNumber} ${lead.data.name}`}>
      <LeadHead lead={lead.data} backHref={backHref} nowMs={nowMs} />
      <LeadNotices lead={lead.data} />
      <LeadColumns lead={lead.data} nowMs={nowMs} csrfToken={csrfToken} reloading={lead.isFetching} onReload={() => void lead.refetch()} />
    </DeskPage>
  );
}

function Missing({ error, backHref, onRetry }: { readonly error: unknown; readonly backHref: string; readonly onRetry: () => void }) {
  if (isProblem(error, 404, 422)) return <NoLead backHref={backHref} />;
  return error ? <LoadFailure error={error} level={1} onRetry={onRetry} /> : <LoadingLead />;
}

const NoLead = ({ backHref }: { readonly backHref: string }) => (
  <View style={{ gap: space[2] }}>
    <Text variant="deskTitle" level={1}>There is no such lead</Text>
    <Text color="ink2">It may have been removed, or a part of the address is missing.</Text>
    <Link label="Back to leads" href={backHref} />
  </View>
);

const LoadingLead = () => (
  <Skeleton label="Loading the lead">
    <Bar width="50%" height={40} />
    <Bar height={220} />
    <Bar height={320} />
  </Skeleton>
);
