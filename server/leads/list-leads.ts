import { QueryTypes, type Sequelize } from 'sequelize';
import type { z } from '../../shared/zod';
import { leadStages, type LeadList, type LeadStage, type leadListQuerySchema } from '../../shared/api/desk';
import { readCursor, writeCursor } from './cursor';
import { presentLeadRow, rowColumns, type LeadRecord } from './present';

type ListQuery = z.output<typeof leadListQuerySchema>;

/** Column, its type for the cursor, and direction of each way to sort; each has an index with the id as its last part. */
const sorts = {
  due: { column: 'sort_due_at', type: 'timestamptz', direction: 'ASC' },
  newest: { column: 'created_at', type: 'timestamptz', direction: 'DESC' },
  oldest: { column: 'created_at', type: 'timestamptz', direction: 'ASC' },
  name: { column: 'sort_name', type: 'text', direction: 'ASC' },
  price: { column: 'sort_cents', type: 'integer', direction: 'DESC' },
} as const satisfies Record<ListQuery['sort'], { column: string; type: string; direction: 'ASC' | 'DESC' }>;

/** Each word must be somewhere in name, street, town, phone, e-mail or job number. */
const searchWords = (search: string | undefined): string[] =>
  (search ?? '').toLowerCase().split(/\s+/).filter(Boolean).map((word) => `%${word.replaceAll(/[\\%_]/g, '\\$&')}%`);

/** One page of leads, the count of all that fit, and how many stand at each stage under the same search. */
export async function listLeads(sequelize: Sequelize, query: ListQuery): Promise<LeadList> {
  const { column, type, direction } = sorts[query.sort];
  const words = searchWords(query.search);
  const bind: unknown[] = words.length > 0 ? [words] : [];
  const searched = words.length > 0 ? ['leads.search LIKE ALL ($1::text[])'] : [];
  const place = (value: unknown) => `$${bind.push(value)}`;

  const counts = await sequelize.query<{ stage: LeadStage; count: number }>(
    `SELECT stage, count(*)::int AS count FROM leads ${where(searched)} GROUP BY stage`, { type: QueryTypes.SELECT, bind: [...bind] },
  );

  const conditions = [...searched];
  if (query.stage) conditions.push(`leads.stage = ${place(query.stage)}`);
  if (query.cursor) {
    const [value, id] = readCursor(query.cursor);
    conditions.push(`(leads.${column}, leads.id) ${direction === 'ASC' ? '>' : '<'} (${place(value)}::${type}, ${place(id)}::uuid)`);
  }
  const rows = await sequelize.query<LeadRecord & { place: string }>(
    `SELECT ${rowColumns}, leads.${column}::text AS place FROM leads LEFT JOIN staff ON staff.id = leads.assignee_id LEFT JOIN deposits ON deposits.id = leads.deposit_id
     ${where(conditions)} ORDER BY leads.${column} ${direction}, leads.id ${direction} LIMIT ${place(query.limit + 1)}`,
    { type: QueryTypes.SELECT, bind },
  );

  const page = rows.slice(0, query.limit);
  const last = rows.length > query.limit ? page.at(-1) : undefined;
  const byStage = new Map(counts.map(({ stage, count }) => [stage, count]));
  return {
    leads: page.map(presentLeadRow),
    nextCursor: last ? writeCursor([last.place, last.id]) : null,
    total: query.stage ? (byStage.get(query.stage) ?? 0) : counts.reduce((sum, { count }) => sum + count, 0),
    counts: leadStages.map((stage) => ({ stage, count: byStage.get(stage) ?? 0 })),
  };
}

const where = (conditions: readonly string[]): string => (conditions.length > 0 ? `WHERE ${conditions.join(' AND ')}` : '');
