import { QueryTypes, type Sequelize } from 'sequelize';
import { migrateDown, migrateUp } from '../../../server/migrations/migrator';
import { migrations } from '../../../server/migrations/index';
import { connect } from '../../../server/models/connect';
import { defineModels } from '../../../server/models/index';
import { createBareDatabase, type TestDatabase } from '../../support/database';

let database: TestDatabase;
let sequelize: Sequelize;

beforeEach(async () => {
  database = await createBareDatabase();
  sequelize = connect(database.url, 4);
});
afterEach(async () => {
  await sequelize.close();
  await database.drop();
});

/** Everything of ours that a database can hold, with its definition. */
const shape = () => sequelize.query<{ thing: string; words: string }>(`
  SELECT 'column ' || table_name || '.' || column_name AS thing, data_type || coalesce(column_default, '') || is_nullable AS words FROM information_schema.columns WHERE table_schema = 'public' AND table_name <> 'migrations'
  UNION ALL SELECT 'index ' || indexname, indexdef FROM pg_indexes WHERE schemaname = 'public' AND tablename <> 'migrations'
  UNION ALL SELECT 'constraint ' || conrelid::regclass || '.' || conname, pg_get_constraintdef(oid) FROM pg_constraint WHERE connamespace = 'public'::regnamespace AND conrelid <> 'migrations'::regclass
  UNION ALL SELECT 'function ' || proname, prosrc FROM pg_proc WHERE pronamespace = 'public'::regnamespace AND prolang = (SELECT oid FROM pg_language WHERE lanname = 'plpgsql')
  UNION ALL SELECT 'sequence ' || sequencename, start_value::text FROM pg_sequences WHERE schemaname = 'public'
  ORDER BY 1`, { type: QueryTypes.SELECT });

describe('migrations', () => {
  it('up, down and up again give the same shape, and down leaves nothing', async () => {
    expect(await migrateUp(sequelize)).toEqual(migrations.map(({ name }) => name));
    const first = await shape();
    expect(first.length).toBeGreaterThan(100);
    expect(await migrateDown(sequelize)).toEqual(migrations.map(({ name }) => name).reverse());
    expect(await shape()).toEqual([]);
    await migrateUp(sequelize);
    expect(await shape()).toEqual(first);
    expect(await migrateUp(sequelize)).toEqual([]);
  });

  it('two processes that migrate at once run each migration once', async () => {
    const runs = await Promise.all([migrateUp(sequelize), migrateUp(sequelize)]);
    expect(runs.map(({ length }) => length).sort()).toEqual([0, migrations.length]);
  });

  it('every column of every model is in its table', async () => {
    await migrateUp(sequelize);
    defineModels(sequelize);
    for (const model of Object.values(sequelize.models)) await expect(model.findAll({ limit: 1 })).resolves.toEqual([]);
  });
});

describe('what the tables refuse', () => {
  const run = (sql: string) => sequelize.query(sql);
  const intake = async () => {
    const [row] = await sequelize.query<{ id: string }>('INSERT INTO intakes DEFAULT VALUES RETURNING id', { type: QueryTypes.SELECT });
    return row?.id ?? '';
  };
  const quote = async (intakeId: string, more = '') => {
    const [row] = await sequelize.query<{ id: string }>(
      `INSERT INTO quotes (intake_id, intake_version, input_hash, document, outcome, rulebook_edition, low_cents, high_cents)
       VALUES ('${intakeId}', 1, 'x', '{}', 'range', 1, 100, 200) ${more} RETURNING id`, { type: QueryTypes.SELECT });
    return row?.id ?? '';
  };
  const deposit = (intakeId: string, quoteId: string, cents: number, state: string) => run(
    `INSERT INTO deposits (intake_id, quote_id, option_id, amount_cents, state, contact, consent_words, paid_at)
     VALUES ('${intakeId}', '${quoteId}', 'a', ${cents}, '${state}', '{}', 'yes', ${state === 'paid' ? 'now()' : 'NULL'})`);

  beforeEach(async () => { await migrateUp(sequelize); });

  it('a second standing quote of one intake', async () => {
    const id = await intake();
    await quote(id);
    await expect(quote(id)).rejects.toThrow(/quotes_one_standing|Validation/);
    await run('UPDATE quotes SET withdrawn_at = now()');
    await expect(quote(id)).resolves.toBeTruthy();
  });

  it('a changed document of a frozen quote', async () => {
    await quote(await intake());
    await expect(run(`UPDATE quotes SET document = '{"a":1}'`)).rejects.toThrow('a frozen quote does not change');
  });

  it('a second paid deposit, a deposit of nothing, a deposit for another intake’s quote', async () => {
    const [id, other] = [await intake(), await intake()];
    const quoteId = await quote(id);
    await expect(deposit(id, quoteId, 0, 'pending')).rejects.toThrow(/amount_cents/);
    await expect(deposit(other, quoteId, 100, 'pending')).rejects.toThrow(/foreign key/);
    await deposit(id, quoteId, 100, 'paid');
    await deposit(id, quoteId, 100, 'pending');
    await expect(deposit(id, quoteId, 100, 'paid')).rejects.toThrow(/deposits_one_paid|Validation/);
  });

  it('a change or removal of history', async () => {
    await run(`INSERT INTO history (intake_id, who, what) VALUES ('${await intake()}', 'Homeowner', 'asked')`);
    await expect(run(`UPDATE history SET what = 'other'`)).rejects.toThrow('the history is only added to');
    await expect(run('DELETE FROM history')).rejects.toThrow('the history is only added to');
    await expect(run('TRUNCATE history')).rejects.toThrow('the history is only added to');
  });

  it('stages that do not exist and a low above its high', async () => {
    await expect(run(`INSERT INTO intakes (stage) VALUES ('lost')`)).rejects.toThrow(/stage/);
    const id = await intake();
    await expect(run(`INSERT INTO quotes (intake_id, intake_version, input_hash, document, outcome, rulebook_edition, low_cents, high_cents)
      VALUES ('${id}', 1, 'x', '{}', 'range', 1, 300, 200)`)).rejects.toThrow(/check/);
  });
});
