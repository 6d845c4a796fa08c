import type { Sequelize } from 'sequelize';
import { defineDeposit } from './deposit';
import { defineDeskSession } from './desk-session';
import { defineHistory } from './history';
import { defineIntake } from './intake';
import { defineLead } from './lead';
import { defineLink } from './link';
import { defineMail } from './mail';
import { defineOutsideAreaRequest } from './outside-area-request';
import { definePaymentEvent } from './payment-event';
import { definePhoto } from './photo';
import { defineQuote } from './quote';
import { defineStaff } from './staff';

/** Every table with a model. The outbox and the idempotency keys are worked in SQL where they live. */
export const defineModels = (sequelize: Sequelize) => ({
  Staff: defineStaff(sequelize),
  DeskSession: defineDeskSession(sequelize),
  Intake: defineIntake(sequelize),
  Link: defineLink(sequelize),
  OutsideAreaRequest: defineOutsideAreaRequest(sequelize),
  Photo: definePhoto(sequelize),
  Quote: defineQuote(sequelize),
  Deposit: defineDeposit(sequelize),
  PaymentEvent: definePaymentEvent(sequelize),
  Lead: defineLead(sequelize),
  History: defineHistory(sequelize),
  Mail: defineMail(sequelize),
});
export type Models = ReturnType<typeof defineModels>;
