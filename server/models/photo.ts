import type { Sequelize } from 'sequelize';
import type { Photo as PhotoSeen } from '../../shared/api/intakes';
import { column, table, type Row } from './table';

export interface PhotoColumns {
  id: string;
  intakeId: string;
  slot: PhotoSeen['slot'];
  widthPx: number;
  heightPx: number;
  bytes: number;
  verdict: PhotoSeen['verdict'];
  storageKey: string;
  thumbKey: string;
  createdAt: Date;
  removedAt: Date | null;
}
type Given = 'id' | 'createdAt' | 'removedAt';
export type Photo = Row<PhotoColumns, Given>;

/** Stored pictures, re-encoded. */
export const definePhoto = (sequelize: Sequelize) => table<PhotoColumns, Given>(sequelize, 'photos', {
  id: column.id, intakeId: column.uuid, slot: column.text, widthPx: column.integer, heightPx: column.integer, bytes: column.integer,
  verdict: column.text, storageKey: column.text, thumbKey: column.text, createdAt: column.now, removedAt: column.time,
});
