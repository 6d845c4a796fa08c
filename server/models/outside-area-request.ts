import type { Sequelize } from 'sequelize';
import { column, table, type Row } from './table';

export interface OutsideAreaRequestColumns { id: string; zip: string; email: string; createdAt: Date }
export type OutsideAreaRequest = Row<OutsideAreaRequestColumns, 'id' | 'createdAt'>;

/** Who asked to be told when we serve their town. */
export const defineOutsideAreaRequest = (sequelize: Sequelize) => table<OutsideAreaRequestColumns, 'id' | 'createdAt'>(sequelize, 'outside_area_requests', {
  id: column.id, zip: column.text, email: column.text, createdAt: column.now,
});
