import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { Umzug, type UmzugStorage } from 'umzug';
import { migrations } from './index';
import type { Migration } from './migration';

interface Context { readonly sequelize: Sequelize; readonly transaction: Transaction }

const storage: UmzugStorage<Context> = {
  async executed({ context: { sequelize, transaction } }) {
    const rows = await sequelize.query<{ name: string }>('SELECT name FROM migrations ORDER BY name', { type: QueryTypes.SELECT, transaction });
    return rows.map(({ name }) => name);
  },
  async logMigration({ name, context: { sequelize, transaction } }) {
    await sequelize.query('INSERT INTO migrations (name) VALUES ($name)', { bind: { name }, transaction });
  },
  async unlogMigration({ name, context: { sequelize, transaction } }) {
    await sequelize.query('DELETE FROM migrations WHERE name = $name', { bind: { name }, transaction });
  },
};

/** Any number of our own: who holds it migrates, others wait and then find nothing left to do. */
const LOCK = 7_341_002;

const migrator = (context: Context) => new Umzug<Context>({
  migrations: migrations.map(({ name, up, down }: Migration) => ({
    name,
    up: async () => { await context.sequelize.query(up, { transaction: context.transaction }); },
    down: async () => { await context.sequelize.query(down, { transaction: context.transaction }); },
  })),
  context, storage, logger: undefined,
});

const withMigrator = <T>(sequelize: Sequelize, work: (umzug: Umzug<Context>) => Promise<T>): Promise<T> =>
  sequelize.transaction(async (transaction) => {
    await sequelize.query('SELECT pg_advisory_xact_lock($lock)', { bind: { lock: LOCK }, transaction });
    await sequelize.query('CREATE TABLE IF NOT EXISTS migrations (name text PRIMARY KEY, run_at timestamptz NOT NULL DEFAULT now())', { transaction });
    return work(migrator({ sequelize, transaction }));
  });

/**
 * Brings the database to the newest shape, all or nothing. Safe when several processes do it at once.
 * @returns the names that were run now
 */
export const migrateUp = (sequelize: Sequelize): Promise<readonly string[]> =>
  withMigrator(sequelize, async (umzug) => (await umzug.up()).map(({ name }) => name));

/** Takes every migration back, newest first. */
export const migrateDown = (sequelize: Sequelize): Promise<readonly string[]> =>
  withMigrator(sequelize, async (umzug) => (await umzug.down({ to: 0 })).map(({ name }) => name));
