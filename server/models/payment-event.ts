import type { Sequelize } from 'sequelize';
import { column, table, type Row } from './table';

export interface PaymentEventColumns {
  /** The provider's id; a second one is the same event again. */
  eventId: string;
  type: string;
  createdAt: Date;
  handledAt: Date;
}
export type PaymentEvent = Row<PaymentEventColumns, 'handledAt'>;

/** Events of the payment provider that were handled. */
export const definePaymentEvent = (sequelize: Sequelize) => table<PaymentEventColumns, 'handledAt'>(sequelize, 'payment_events', {
  eventId: { ...column.text, primaryKey: true }, type: column.text, createdAt: column.time, handledAt: column.now,
});
