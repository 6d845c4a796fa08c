import type { Sequelize } from 'sequelize';
import type { Models } from './index';

/** The database: its models, and Sequelize for transactions and SQL. */
export interface Db { readonly sequelize: Sequelize; readonly models: Models }
