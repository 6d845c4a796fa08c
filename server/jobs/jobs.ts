import { createHash } from 'node:crypto';
import PgBoss from 'pg-boss';
import type { Logger } from 'pino';
import type { Db } from '../models/db';
import { dispatchOutbox, taskKinds, type TaskKind, type Tasks } from './outbox';

export type TaskHandlers = { readonly [K in TaskKind]: (payload: Tasks[K]) => Promise<void> };

export interface Jobs {
  /** Looks into the outbox at once; call it after a commit that wrote to it. */
  readonly nudge: () => void;
  /** Starts looking and working. Safe in any number of processes. */
  readonly start: (handlers: TaskHandlers) => Promise<void>;
  /** Ends after the tasks at work; those that take longer than `graceMs` are taken up again by another process. */
  readonly stop: (graceMs?: number) => Promise<void>;
}

const OUTBOX_EVERY_MS = 1_000;
/** A mail server that is away is asked again every few seconds, so that all is caught up soon after it is back, for a day. */
const RETRY_EVERY_S = 10;
const RETRIES = (24 * 60 * 60) / RETRY_EVERY_S;
/** A task whose process died is taken up again after this. */
const EXPIRES_AFTER_S = 60;

/** Any number of our own: who holds it makes the queues. */
const START_LOCK = 7_341_003;

/** The job's id follows from the task's key, so that a task handed on twice is one job. */
function jobId(dedupeKey: string): string {
  const hex = createHash('sha256').update(dedupeKey).digest('hex');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-8${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}

/** Works the outbox off by pg-boss, which keeps its own tables in the schema `pgboss` of the same database. */
export function createJobs(databaseUrl: string, db: Db, logger: Logger): Jobs {
  const boss = new PgBoss({ connectionString: databaseUrl, schema: 'pgboss', max: 3, application_name: 'tidyrun-jobs' });
  boss.on('error', (error) => logger.warn({ err: error.message }, 'jobs: the database does not answer'));
  let timer: NodeJS.Timeout | undefined;
  let dispatching: Promise<void> | null = null;
  let again = false;

  const dispatch = async (): Promise<void> => {
    do {
      again = false;
      try {
        const taken = await dispatchOutbox(db, async ({ kind, dedupeKey, payload }) => {
          await boss.send(kind, payload, { id: jobId(dedupeKey) });
        });
        again ||= taken > 0;
      } catch (error) {
        logger.warn({ err: error instanceof Error ? error.message : 'unknown' }, 'jobs: the outbox waits');
        return;
      }
    } while (again && timer !== undefined);
  };
  const nudge = () => {
    if (timer === undefined) return;
    again = true;
    dispatching ??= dispatch().finally(() => { dispatching = null; });
  };
  const work = <K extends TaskKind>(kind: K, handle: TaskHandlers[K]) =>
    boss.work<Tasks[K]>(kind, { pollingIntervalSeconds: 0.5, batchSize: 1 }, async ([job]) => {
      if (job) await handle(job.data);
    });

  return {
    nudge,
    async start(handlers) {
      // Two processes that make the same tables at once would deadlock: the second waits and finds them made.
      await db.sequelize.transaction(async (transaction) => {
        await db.sequelize.query('SELECT pg_advisory_xact_lock($lock)', { transaction, bind: { lock: START_LOCK } });
        await boss.start();
        for (const kind of taskKinds) {
          await boss.createQueue(kind, {
            name: kind, retryLimit: RETRIES, retryDelay: RETRY_EVERY_S, retryBackoff: false, expireInSeconds: EXPIRES_AFTER_S,
          });
        }
      });
      await work('send-mail', handlers['send-mail']);
      await work('refund-deposit', handlers['refund-deposit']);
      timer = setInterval(nudge, OUTBOX_EVERY_MS);
      nudge();
    },
    async stop(graceMs = 5_000) {
      if (timer === undefined) return;
      clearInterval(timer);
      timer = undefined;
      await dispatching;
      await boss.stop({ graceful: true, timeout: graceMs, wait: true });
    },
  };
}
