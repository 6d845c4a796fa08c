import type { Sequelize } from 'sequelize';
import { column, table, type Row } from './table';

export const linkPurposes = ['intake-cookie', 'resume', 'my-cookie', 'my'] as const;
export type LinkPurpose = (typeof linkPurposes)[number];

export interface LinkColumns {
  id: string;
  /** SHA-256 of the token; the token itself is nowhere. */
  tokenHash: Buffer;
  purpose: LinkPurpose;
  intakeId: string;
  expiresAt: Date;
  revokedAt: Date | null;
  createdAt: Date;
}
type Given = 'id' | 'revokedAt' | 'createdAt';
export type Link = Row<LinkColumns, Given>;

/** Cookies and mailed links of the public. */
export const defineLink = (sequelize: Sequelize) => table<LinkColumns, Given>(sequelize, 'links', {
  id: column.id, tokenHash: column.bytes, purpose: column.text, intakeId: column.uuid,
  expiresAt: column.time, revokedAt: column.time, createdAt: column.now,
});
