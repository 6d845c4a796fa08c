import ArrowDown from 'lucide-react-native/icons/arrow-down';
import ArrowUp from 'lucide-react-native/icons/arrow-up';
import { Link } from 'expo-router';
import type { KeyboardEvent } from 'react';
import { useBreakpoint } from '../theme/use-breakpoint';
import { DataCards } from './data-cards';
import type { Column, DataTableProps } from './data-table';
import { Glyph } from './glyph';

/** A real table; cards on phones. Up and down move between the rows' links, Enter opens. */
export function DataTable<Row>(props: DataTableProps<Row>) {
  const { caption, columns, rows, rowKey, rowHref, rowLabel, sort, onSort, selectedKey } = props;
  const phone = useBreakpoint() === 'phone';
  if (phone) return <DataCards {...props} />;
  return (
    <div className="ui-table-frame">
      <table className="ui-table" onKeyDown={moveByRow}>
        <caption className="ui-unseen">{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => <Head key={column.key} column={column} sort={sort} onSort={onSort} />)}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} aria-current={rowKey(row) === selectedKey ? true : undefined}>
              {columns.map((column, index) => {
                const cell = column.cell(row);
                const className = column.align === 'right' ? 'ui-right' : undefined;
                if (index > 0) return <td key={column.key} className={className}>{cell}</td>;
                return (
                  <th key={column.key} scope="row" className={className}>
                    {rowHref ? <Link href={rowHref(row)} className="ui-row-link" aria-label={rowLabel?.(row)}>{cell}</Link> : cell}
                  </th>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Head<Row>({ column, sort, onSort }: { column: Column<Row>; sort: DataTableProps<Row>['sort']; onSort: DataTableProps<Row>['onSort'] }) {
  const sorted = sort?.key === column.key;
  return (
    <th scope="col" aria-sort={sorted ? sort.direction : undefined} className={column.align === 'right' ? 'ui-right' : undefined} style={column.width ? { width: column.width } : undefined}>
      {column.sortable && onSort ? (
        <button type="button" className="ui-sort" onClick={() => onSort(column.key)}>
          {column.title}
          {sorted ? <Glyph of={sort.direction === 'ascending' ? ArrowUp : ArrowDown} size={16} /> : null}
        </button>
      ) : column.title}
    </th>
  );
}

function moveByRow(event: KeyboardEvent<HTMLTableElement>): void {
  const by = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
  if (by === 0 || !(event.target instanceof HTMLElement) || !event.target.matches('.ui-row-link')) return;
  const links = [...event.currentTarget.querySelectorAll<HTMLElement>('.ui-row-link')];
  const next = links[links.indexOf(event.target) + by];
  if (!next) return;
  event.preventDefault();
  next.focus();
}
