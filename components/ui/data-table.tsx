import type { Href } from 'expo-router';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { DataCards } from './data-cards';

export interface Column<Row> {
  readonly key: string;
  readonly title: string;
  readonly align?: 'left' | 'right';
  /** Shown as a button in the head; `aria-sort` says the rest. */
  readonly sortable?: boolean;
  /** px; else as wide as it needs. */
  readonly width?: number;
  readonly cell: (row: Row) => ReactNode;
  /** Cards on a phone leave this column out. */
  readonly wideOnly?: boolean;
}

export interface DataTableProps<Row> {
  /** What the table is; spoken, not seen. */
  readonly caption: string;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
  /** Where the row's first cell leads. */
  readonly rowHref?: (row: Row) => Href;
  readonly rowLabel?: (row: Row) => string;
  readonly sort?: { readonly key: string; readonly direction: 'ascending' | 'descending' };
  readonly onSort?: (key: string) => void;
  readonly selectedKey?: string | null;
}

/** Rows and columns; each row becomes a card on phones. */
export function DataTable<Row>(props: DataTableProps<Row>) {
  return (
    <View aria-label={props.caption}>
      <DataCards {...props} />
    </View>
  );
}
