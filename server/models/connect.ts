import { Sequelize } from 'sequelize';

/** Long enough for anything we ask; what takes longer is ended by the database. */
const STATEMENT_TIMEOUT_MS = 15_000;
const CONNECT_TIMEOUT_MS = 5_000;
/** Waiting for a free connection; above this we are too busy and say so. */
const ACQUIRE_TIMEOUT_MS = 15_000;

/** A pool of connections; none is made before the first query. `poolSize`: how many at most. */
export const connect = (databaseUrl: string, poolSize = 10): Sequelize =>
  new Sequelize(databaseUrl, {
    dialect: 'postgres', logging: false,
    pool: { max: poolSize, min: 0, acquire: ACQUIRE_TIMEOUT_MS, idle: 10_000 },
    dialectOptions: { application_name: 'tidyrun', statement_timeout: STATEMENT_TIMEOUT_MS, connectionTimeoutMillis: CONNECT_TIMEOUT_MS },
  });
