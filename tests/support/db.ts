import { connect } from '../../server/models/connect';
import type { Db } from '../../server/models/db';
import { defineModels } from '../../server/models/index';
import { useTestDatabase } from './database';

/** A migrated database with its models, for all tests of the file that calls it. */
export function useDb(): Db & { readonly url: string } {
  const database = useTestDatabase();
  let db: Db | undefined;
  beforeAll(() => {
    const sequelize = connect(database.url, 8);
    db = { sequelize, models: defineModels(sequelize) };
  });
  afterAll(async () => {
    await db?.sequelize.close();
  });
  const there = () => {
    if (!db) throw new Error('The database is there from beforeAll on.');
    return db;
  };
  return { get sequelize() { return there().sequelize; }, get models() { return there().models; }, get url() { return database.url; } };
}
