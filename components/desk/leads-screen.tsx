import { StyleSheet, View } from 'react-native';
import { leadSorts, leadStages, leadStageWords, type LeadStage } from '../../shared/api/desk';
import { useLeads } from '../api/use-leads';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/use-breakpoint';
import { FilterBar } from '../ui/filter-bar';
import { Select } from '../ui/select';
import { Text } from '../ui/text';
import { DeskPage } from './desk-page';
import { sortWords, useAddressFilters } from './lead-filters';
import { LeadResults } from './lead-results';
import { SearchBox } from './search-box';
import { useLeadSearch } from './search-context';
import { SignedIn } from './signed-in';

const ALL = 'all';
const sorts = Object.entries(sortWords).map(([value, label]) => ({ value, label }));

/** The leads: by stage, searched, sorted, page by page. */
export const LeadsScreen = () => <SignedIn>{() => <Leads />}</SignedIn>;

function Leads() {
  const { search, setSearch } = useLeadSearch();
  const { stage, sort, set } = useAddressFilters();
  const leads = useLeads({ stage, search, sort });
  const phone = useBreakpoint() === 'phone';
  const counts = leads.data?.pages.at(-1)?.counts;
  const countOf = (id: LeadStage) => counts?.find((entry) => entry.stage === id)?.count;
  const all = counts?.reduce((sum, { count }) => sum + count, 0);
  const views = [
    { value: ALL, label: 'All', ...(all === undefined ? {} : { count: all }) },
    ...leadStages.map((id) => ({ value: id, label: leadStageWords[id], ...(counts ? { count: countOf(id) ?? 0 } : {}) })),
  ];
  const pickStage = (value: string) => set({ stage: leadStages.find((id) => id === value) });
  const pickSort = (value: string) => set({ sort: leadSorts.find((id) => id === value) ?? 'due' });
  const clear = () => {
    setSearch('');
    set({ stage: undefined });
  };
  const sorting = <Select id="lead-sort" label="Sort leads by" hideLabel size="desk" choices={sorts} value={sort} onChange={pickSort} />;
  return (
    <DeskPage title="Leads">
      <View style={styles.head}>
        <Text variant="deskTitle" level={1} style={{ flexGrow: 1 }}>Leads</Text>
        <View style={[styles.search, phone && styles.whole]}><SearchBox value={search} onSearch={setSearch} /></View>
        {phone ? null : <View style={styles.sort}>{sorting}</View>}
      </View>
      {phone ? (
        <View style={styles.pair}>
          <View style={styles.half}>
            <Select id="lead-stage" label="Stage" hideLabel size="desk" value={stage ?? ALL} onChange={pickStage}
              choices={views.map((view) => ({ value: view.value, label: view.count === undefined ? view.label : `${view.label} ${view.count}` }))} />
          </View>
          <View style={styles.half}>{sorting}</View>
        </View>
      ) : (
        <FilterBar label="Stage" views={views} value={stage ?? ALL} onChange={pickStage} />
      )}
      <LeadResults leads={leads} filters={{ stage, sort }} search={search} onSort={pickSort} onClear={clear} />
    </DeskPage>
  );
}

const styles = StyleSheet.create({
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] },
  search: { flexDirection: 'row', flexGrow: 1, flexShrink: 1, flexBasis: 270, maxWidth: 360 },
  whole: { maxWidth: '100%', flexBasis: '100%' },
  sort: { width: 168 },
  pair: { flexDirection: 'row', gap: space[2] },
  half: { flex: 1, minWidth: 0 },
});
