import { execFile } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { join } from 'node:path';
import { promisify } from 'node:util';
import pg from 'pg';

export interface TestDatabase {
  readonly url: string;
  drop(): Promise<void>;
}

const template = 'tidyrun_template';
const root = join(__dirname, '..', '..');
// Any number of our own: whoever holds it makes the template or copies it.
const lockNumber = 7_341_001;

/** Gives a database of its own, copied from a template that the first caller of a run migrates. */
export const createTestDatabase = () => create(async (client, name) => {
  await client.query('SELECT pg_advisory_lock($1)', [lockNumber]);
  const { rowCount } = await client.query('SELECT 1 FROM pg_database WHERE datname = $1', [template]);
  if (rowCount === 0) await makeTemplate(client);
  await client.query(`CREATE DATABASE ${name} TEMPLATE ${template}`);
});

/** Gives an empty database without any migration, for the tests of the migrations themselves. */
export const createBareDatabase = () => create(async (client, name) => {
  await client.query(`CREATE DATABASE ${name}`);
});

/** Gives one database to all tests of the file that calls it, for as long as they run. */
export function useTestDatabase(): { readonly url: string } {
  let database: TestDatabase | undefined;
  beforeAll(async () => {
    database = await createTestDatabase();
  });
  afterAll(async () => {
    await database?.drop();
  });
  return {
    get url() {
      if (database === undefined) throw new Error('The database is there from beforeAll on.');
      return database.url;
    },
  };
}

async function create(work: (client: pg.Client, name: string) => Promise<void>): Promise<TestDatabase> {
  const name = `test_${randomBytes(8).toString('hex')}`;
  await maintain((client) => work(client, name));
  return {
    url: urlOf(name),
    drop: () => maintain(async (client) => {
      await client.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
    }),
  };
}

/** Under another name until it is whole, so that a run that breaks off leaves no half template behind. */
async function makeTemplate(client: pg.Client): Promise<void> {
  const unfinished = `${template}_unfinished`;
  await client.query(`DROP DATABASE IF EXISTS ${unfinished} WITH (FORCE)`);
  await client.query(`CREATE DATABASE ${unfinished}`);
  await promisify(execFile)(process.execPath, ['--import', 'tsx', join(root, 'server', 'cli', 'migrate.ts')], {
    cwd: root,
    env: { ...process.env, DATABASE_URL: urlOf(unfinished) },
  });
  await client.query(`ALTER DATABASE ${unfinished} RENAME TO ${template}`);
}

function urlOf(database: string): string {
  const url = new URL(maintenanceUrl());
  url.pathname = `/${database}`;
  return url.toString();
}

function maintenanceUrl(): string {
  const url = process.env.TEST_DATABASE_URL;
  if (!url) throw new Error('TEST_DATABASE_URL is set by jest’s global set-up of the server project: run these tests through jest.');
  return url;
}

async function maintain(work: (client: pg.Client) => Promise<void>): Promise<void> {
  const client = new pg.Client({ connectionString: maintenanceUrl() });
  await client.connect();
  try {
    await work(client);
  } finally {
    await client.end();
  }
}
