import { staff } from './0001-staff';
import { intakes } from './0002-intakes';
import { quotesAndDeposits } from './0003-quotes-and-deposits';
import { leadsAndHistory } from './0004-leads-and-history';
import { outboxAndMails } from './0005-outbox-and-mails';
import { rateLimits } from './0006-rate-limits';
import type { Migration } from './migration';

/** Every migration, in order. Listed by hand: a name that has run anywhere never changes. */
export const migrations: readonly Migration[] = [staff, intakes, quotesAndDeposits, leadsAndHistory, outboxAndMails, rateLimits];
