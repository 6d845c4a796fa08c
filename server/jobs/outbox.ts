import { QueryTypes, type Transaction } from 'sequelize';
import type { Db } from '../models/db';

/** What is done after a change is committed. Payloads carry ids only, never personal data. */
export interface Tasks {
  'send-mail': { readonly mailId: string };
  'refund-deposit': { readonly depositId: string };
}
export type TaskKind = keyof Tasks;
export const taskKinds = ['send-mail', 'refund-deposit'] as const satisfies readonly TaskKind[];

export interface OutboxRow { readonly id: string; readonly dedupeKey: string; readonly kind: TaskKind; readonly payload: Tasks[TaskKind] }

/** Writes a task down in the transaction of the change that asks for it; the same key again changes nothing. */
export async function addTask<K extends TaskKind>(
  { sequelize }: Db, transaction: Transaction, kind: K, dedupeKey: string, payload: Tasks[K],
): Promise<void> {
  await sequelize.query(
    'INSERT INTO outbox (dedupe_key, kind, payload) VALUES ($dedupeKey, $kind, $payload) ON CONFLICT (dedupe_key) DO NOTHING',
    { transaction, bind: { dedupeKey, kind, payload: JSON.stringify(payload) } },
  );
}

const AT_A_TIME = 50;

/**
 * Hands tasks that nobody took yet to `take`, oldest first, and marks them taken. Two processes never hold the same row; one that
 * breaks off leaves the row for the next, so `take` may see a task twice.
 * @returns how many were taken
 */
export const dispatchOutbox = ({ sequelize }: Db, take: (row: OutboxRow) => Promise<void>): Promise<number> =>
  sequelize.transaction(async (transaction) => {
    const rows = await sequelize.query<OutboxRow>(
      'SELECT id, dedupe_key AS "dedupeKey", kind, payload FROM outbox WHERE dispatched_at IS NULL ORDER BY id LIMIT $limit FOR UPDATE SKIP LOCKED',
      { type: QueryTypes.SELECT, transaction, bind: { limit: AT_A_TIME } },
    );
    for (const row of rows) await take(row);
    if (rows.length > 0) {
      await sequelize.query('UPDATE outbox SET dispatched_at = now() WHERE id = ANY($ids::bigint[])', { transaction, bind: { ids: rows.map(({ id }) => id) } });
    }
    return rows.length;
  });
