import type { Sequelize } from 'sequelize';
import type { Role } from '../../shared/roles';
import { column, table, type Row } from './table';

export interface StaffColumns {
  id: string;
  /** Lower case. */
  email: string;
  name: string;
  role: Role;
  passwordHash: string;
  active: boolean;
  createdAt: Date;
}
export type Staff = Row<StaffColumns, 'id' | 'active' | 'createdAt'>;

/** People of the contractor who may sign in. */
export const defineStaff = (sequelize: Sequelize) => table<StaffColumns, 'id' | 'active' | 'createdAt'>(sequelize, 'staff', {
  id: column.id, email: column.text, name: column.text, role: column.text, passwordHash: column.text,
  active: { ...column.boolean, defaultValue: true }, createdAt: column.now,
});
