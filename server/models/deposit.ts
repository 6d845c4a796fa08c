import type { Sequelize } from 'sequelize';
import type { Contact } from '../../shared/api/intakes';
import type { Deposit as DepositSeen } from '../../shared/api/quotes';
import { column, table, type Row } from './table';

export interface DepositColumns {
  id: string;
  intakeId: string;
  quoteId: string;
  optionId: string;
  amountCents: number;
  currency: 'usd';
  state: DepositSeen['state'];
  checkoutSessionId: string | null;
  paymentIntentId: string | null;
  contact: Contact;
  consentWords: string;
  createdAt: Date;
  paidAt: Date | null;
  refundedAt: Date | null;
}
type Given = 'id' | 'currency' | 'state' | 'checkoutSessionId' | 'paymentIntentId' | 'createdAt' | 'paidAt' | 'refundedAt';
export type Deposit = Row<DepositColumns, Given>;

/** Deposits and where they stand; at most one of an intake is paid. */
export const defineDeposit = (sequelize: Sequelize) => table<DepositColumns, Given>(sequelize, 'deposits', {
  id: column.id, intakeId: column.uuid, quoteId: column.uuid, optionId: column.text, amountCents: column.integer,
  currency: { ...column.text, defaultValue: 'usd' }, state: { ...column.text, defaultValue: 'pending' }, checkoutSessionId: column.text,
  paymentIntentId: column.text, contact: column.json, consentWords: column.text,
  createdAt: column.now, paidAt: column.time, refundedAt: column.time,
});
