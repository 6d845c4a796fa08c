import { View } from 'react-native';
import type { LeadRow } from '../../shared/api/desk';
import { dollars } from '../../shared/money';
import type { LeadSort } from '../api/use-leads';
import { useBreakpoint } from '../theme/use-breakpoint';
import { DataTable, type Column, type DataTableProps } from '../ui/data-table';
import { Text } from '../ui/text';
import { DueCell, JobBox, RangeCell, TwoLines } from './lead-cells';
import { StageTag } from './stage-tag';

/** Sorts that belong to a column of the table. */
const SORTED: Partial<Record<LeadSort, NonNullable<DataTableProps<LeadRow>['sort']>>> = {
  due: { key: 'due', direction: 'ascending' }, name: { key: 'name', direction: 'ascending' }, price: { key: 'price', direction: 'descending' },
};

export interface LeadTableProps {
  readonly leads: readonly LeadRow[];
  readonly sort: LeadSort;
  readonly onSort: (sort: string) => void;
  readonly nowMs: number;
  readonly hrefOf: (lead: LeadRow) => string;
}

/** Leads as rows: job, homeowner, work, range with the firm price marked, stage, time. Narrow windows leave out what repeats. */
export function LeadTable({ leads, sort, onSort, nowMs, hrefOf }: LeadTableProps) {
  const wide = useBreakpoint() === 'wide';
  const sorted = SORTED[sort];
  const assigned = wide && leads.some((lead) => lead.assignee !== null);
  const columns: Column<LeadRow>[] = [
    { key: 'job', title: 'Job', cell: (lead) => <JobBox jobNumber={lead.jobNumber} /> },
    { key: 'name', title: 'Homeowner', sortable: true, cell: (lead) => <TwoLines strong first={lead.name} second={lead.town} /> },
    ...(wide ? [
      { key: 'work', title: 'Work', cell: (lead: LeadRow) => <TwoLines first={lead.work} second={lead.workNote} /> },
      { key: 'price', title: 'Range shown, firm price marked', sortable: true, cell: (lead: LeadRow) => <RangeCell lead={lead} tape /> },
    ] : [
      { key: 'price', title: 'Work, range shown', sortable: true, cell: (lead: LeadRow) => <WorkAndRange lead={lead} /> },
    ]),
    ...(wide ? [{ key: 'firm', title: 'Firm', align: 'right' as const, cell: (lead: LeadRow) => <Firm lead={lead} /> }] : []),
    { key: 'stage', title: 'Stage', cell: (lead) => <StageTag stage={lead.stage} /> },
    { key: 'due', title: 'Time', sortable: true, cell: (lead) => <DueCell lead={lead} nowMs={nowMs} /> },
    ...(assigned ? [{ key: 'with', title: 'With', cell: (lead: LeadRow) => <TwoLines first={lead.assignee?.split(' ')[0] ?? '–'} /> }] : []),
  ];
  return (
    <DataTable
      caption="Leads" columns={columns} rows={leads} rowKey={(lead) => lead.id} rowHref={hrefOf} rowLabel={(lead) => `${lead.jobNumber}, ${lead.name}`}
      {...(sorted ? { sort: sorted } : {})} onSort={onSort}
    />
  );
}

const WorkAndRange = ({ lead }: { readonly lead: LeadRow }) => (
  <View>
    <TwoLines first={lead.work} />
    <RangeCell lead={lead} tape={false} />
  </View>
);

function Firm({ lead: { firmCents } }: { readonly lead: LeadRow }) {
  const none = firmCents === null;
  return <Text weight={none ? 500 : 800} color={none ? 'ink2' : 'ink'} style={{ fontSize: 15, lineHeight: 21 }}>{none ? '–' : dollars(firmCents)}</Text>;
}
