import { createHash } from 'node:crypto';
import { QueryTypes, type Sequelize } from 'sequelize';
import { problem } from './problem';

export interface Reply { readonly status: number; readonly body: unknown }
interface Kept { readonly request_hash: string; readonly status: number | null; readonly body: string | null }

/** A key whose process died before it answered may be used again after this. */
const TAKEN_OVER_AFTER = '60 seconds';
const KEPT_FOR = '2 days';
/** A second click waits so long for the first one's reply. */
const WAIT_MS = 8_000;
const LOOK_EVERY_MS = 100;

export const requestHash = (body: unknown): string => createHash('sha256').update(JSON.stringify(body ?? null)).digest('hex');

async function claim(sequelize: Sequelize, scope: string, key: string, hash: string): Promise<boolean> {
  await sequelize.query(`DELETE FROM idempotency_keys WHERE (scope, key) IN (SELECT scope, key FROM idempotency_keys WHERE created_at < now() - interval '${KEPT_FOR}' LIMIT 20 FOR UPDATE SKIP LOCKED)`);
  const rows = await sequelize.query<{ key: string }>(
    `INSERT INTO idempotency_keys (scope, key, request_hash) VALUES ($scope, $key, $hash)
     ON CONFLICT (scope, key) DO UPDATE SET created_at = now()
       WHERE idempotency_keys.status IS NULL AND idempotency_keys.request_hash = $hash AND idempotency_keys.created_at < now() - interval '${TAKEN_OVER_AFTER}'
     RETURNING key`,
    { type: QueryTypes.SELECT, bind: { scope, key, hash } },
  );
  return rows.length > 0;
}

const pause = (ms: number) => new Promise<void>((resolve) => { setTimeout(resolve, ms); });

/** The reply that another request with this key got, or is about to get. @throws as `once` */
async function keptReply(sequelize: Sequelize, scope: string, key: string, hash: string, waitMs: number): Promise<Reply> {
  for (const until = Date.now() + waitMs; ; await pause(LOOK_EVERY_MS)) {
    const [kept] = await sequelize.query<Kept>('SELECT request_hash, status, body FROM idempotency_keys WHERE scope = $scope AND key = $key', {
      type: QueryTypes.SELECT, bind: { scope, key },
    });
    if (kept && kept.request_hash !== hash) throw problem('validation', 'This Idempotency-Key was used for another request.');
    if (kept && kept.status !== null) {
      return { status: kept.status, body: kept.body === null ? undefined : JSON.parse(kept.body) as unknown };
    }
    if (!kept || Date.now() >= until) throw problem('conflict', 'The same request is still at work.', undefined, { 'Retry-After': '1' });
  }
}

/**
 * Does `work` once for a key: the same request again gets the first one's reply, and a second click waits for it.
 * A refusal is not kept, so that it can be tried again.
 * @param scope the endpoint and who calls; keys of different callers never meet
 * @throws problems: malformed (no key), validation (the key came with another body before), conflict (the first is still at work,
 *   or was refused)
 */
export async function once(
  sequelize: Sequelize, scope: string, key: string | undefined, hash: string, work: () => Promise<Reply>, waitMs = WAIT_MS,
): Promise<Reply> {
  if (key === undefined || !/^[\x21-\x7e]{8,200}$/.test(key)) throw problem('malformed', 'Send an Idempotency-Key of 8 to 200 letters and digits.');
  if (!(await claim(sequelize, scope, key, hash))) return keptReply(sequelize, scope, key, hash, waitMs);
  const bind = { scope, key };
  try {
    const reply = await work();
    await sequelize.query('UPDATE idempotency_keys SET status = $status, body = $body WHERE scope = $scope AND key = $key', {
      bind: { ...bind, status: reply.status, body: reply.body === undefined ? null : JSON.stringify(reply.body) },
    });
    return reply;
  } catch (error) {
    await sequelize.query('DELETE FROM idempotency_keys WHERE scope = $scope AND key = $key AND status IS NULL', { bind });
    throw error;
  }
}
