export interface Row {
  what: string;
  target: string;
  measured: string;
  /** null: nothing to judge, only told. */
  reached: boolean | null;
}

const marks = { true: 'reached', false: 'MISSED', null: '' } as const;

/** Prints rows as a table for a terminal. */
export function printTable(title: string, rows: readonly Row[]): void {
  const cells = [['what', 'measured', 'target', ''], ...rows.map((row) => [row.what, row.measured, row.target, marks[`${row.reached}`]])];
  const widths = [0, 1, 2, 3].map((column) => Math.max(...cells.map((line) => line[column]?.length ?? 0)));
  console.log(`\n${title}`);
  for (const line of cells) console.log(line.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join('  ').trimEnd());
}

/** The value that a share of the values lies at or under, 0.5 being the median. */
export function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  const value = sorted[Math.min(sorted.length - 1, Math.max(0, Math.ceil(share * sorted.length) - 1))];
  if (value === undefined) throw new Error('No values were measured.');
  return value;
}

export const kilobytes = (bytes: number): string => `${(bytes / 1024).toFixed(1)} KB`;
