import { StyleSheet, View } from 'react-native';
import type { LeadRow } from '../../shared/api/desk';
import { countInWords } from '../../shared/units';
import type { useLeads } from '../api/use-leads';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/use-breakpoint';
import { Button } from '../ui/button';
import { Card } from '../ui/card';
import { EmptyState } from '../ui/empty-state';
import { Bar, Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';
import { filtersInAddress, type AddressFilters } from './lead-filters';
import { LeadCards } from './lead-cards';
import { LeadTable } from './lead-table';
import { LoadFailure } from './load-failure';
import { useNow } from './use-now';

export interface LeadResultsProps {
  readonly leads: ReturnType<typeof useLeads>;
  readonly filters: AddressFilters;
  readonly search: string;
  readonly onSort: (sort: string) => void;
  readonly onClear: () => void;
}

/** What fits the filters: rows, how many of them are shown, more of them; or why there are none. */
export function LeadResults({ leads, filters, search, onSort, onClear }: LeadResultsProps) {
  const phone = useBreakpoint() === 'phone';
  const nowMs = useNow();
  if (!leads.data && leads.error) return <Card><LoadFailure error={leads.error} onRetry={() => void leads.refetch()} /></Card>;
  if (!leads.data) return <LoadingRows />;
  const rows = leads.data.pages.flatMap((page) => page.leads);
  const total = leads.data.pages.at(-1)?.total ?? rows.length;
  const hrefOf = (lead: LeadRow) => `/desk/leads/${lead.id}${filtersInAddress(filters)}`;
  const again = () => void (leads.isFetchNextPageError ? leads.fetchNextPage() : leads.refetch());
  const narrowed = filters.stage !== undefined || search !== '';
  return (
    <View style={{ gap: space[3] }} aria-busy={leads.isPlaceholderData}>
      {rows.length > 0 ? (
        <View style={leads.isPlaceholderData && { opacity: 0.6 }}>
          {phone ? (
            <LeadCards leads={rows} nowMs={nowMs} hrefOf={hrefOf} />
          ) : (
            <LeadTable leads={rows} sort={filters.sort} onSort={onSort} nowMs={nowMs} hrefOf={hrefOf} />
          )}
        </View>
      ) : (
        <Card>
          {narrowed ? (
            <EmptyState
              title="No lead fits this" note="Look at every stage, or search for less."
              action={<Button label="Show all leads" kind="quiet" size="desk" onPress={onClear} />}
            />
          ) : (
            <EmptyState title="No leads yet" note="The first paid deposit or asked-for visit appears here." />
          )}
        </Card>
      )}
      <View style={styles.foot}>
        <Text role="status" variant="note" weight={700} color="ink2">{shownWords(rows.length, total)}</Text>
        {leads.hasNextPage ? (
          <Button label="Show more" busyLabel="Loading" kind="quiet" size="desk" busy={leads.isFetchingNextPage} onPress={() => void leads.fetchNextPage()} />
        ) : null}
      </View>
      {leads.error ? <Card><LoadFailure error={leads.error} onRetry={again} /></Card> : null}
    </View>
  );
}

const shownWords = (shown: number, total: number): string =>
  shown === 0 ? 'No leads shown' : shown < total ? `${shown} of ${total} shown` : countInWords(total, 'lead', 'leads');

const LoadingRows = () => (
  <Card>
    <Skeleton label="Loading leads">{Array.from({ length: 8 }, (_, row) => <Bar key={row} height={36} />)}</Skeleton>
  </Card>
);

const styles = StyleSheet.create({
  foot: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', justifyContent: 'space-between', gap: space[3], minHeight: 44 },
});
