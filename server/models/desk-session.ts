import type { Sequelize } from 'sequelize';
import { column, table, type Row } from './table';

export interface DeskSessionColumns {
  id: string;
  /** SHA-256 of the cookie's token; the token itself is nowhere. */
  tokenHash: Buffer;
  staffId: string;
  createdAt: Date;
  lastSeenAt: Date;
  expiresAt: Date;
  revokedAt: Date | null;
}
type Given = 'id' | 'createdAt' | 'lastSeenAt' | 'revokedAt';
export type DeskSession = Row<DeskSessionColumns, Given>;

/** Sign-ins at the desk. */
export const defineDeskSession = (sequelize: Sequelize) => table<DeskSessionColumns, Given>(sequelize, 'desk_sessions', {
  id: column.id, tokenHash: column.bytes, staffId: column.uuid, createdAt: column.now, lastSeenAt: column.now,
  expiresAt: column.time, revokedAt: column.time,
});
