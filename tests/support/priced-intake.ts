import { randomUUID } from 'node:crypto';
import { priceIntake } from '../../pricing/quote';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import type { Contact } from '../../shared/api/intakes';
import type { QuoteDocument, QuoteOption } from '../../shared/quote';
import type { Db } from '../../server/models/db';
import { knownHome } from './known-home';

export const contact: Contact = { name: 'Maren Oakes', email: 'maren@example.com', phone: '555-0117', street: '12 Example Lane', contactWays: ['email', 'phone'], consent: true };

export interface PricedIntake {
  readonly intakeId: string;
  readonly quoteId: string;
  readonly document: QuoteDocument;
  readonly option: QuoteOption;
}

/** What to store: into a known intake, or priced on another day than today. */
export interface StoreOptions { readonly intakeId?: string; readonly pricedOn?: string }

/** An intake whose price is frozen, stored as the API stores it: a home of which all is known but the panel's blank spaces. */
export async function storePricedIntake({ models }: Db, { intakeId, pricedOn }: StoreOptions = {}): Promise<PricedIntake> {
  const day = pricedOn ?? new Date().toISOString().slice(0, 10);
  const document = priceIntake({ facts: { ...knownHome(), blankSpaces: null }, edition: editionOne, pricedOn: day, samples: 50 });
  const option = document.options.find(({ recommended }) => recommended);
  if (!option) throw new Error('A known home has a recommended option');
  const columns = { answers: { zip: '00017' }, jurisdictionId: document.jurisdiction.id, stage: 'priced' } as const;
  const known = intakeId === undefined ? null : await models.Intake.findByPk(intakeId);
  const intake = known ? await known.update(columns) : await models.Intake.create(columns);
  const quote = await models.Quote.create({
    intakeId: intake.id, intakeVersion: 1, inputHash: randomUUID(), document: JSON.stringify(document), outcome: document.outcome,
    rulebookEdition: document.rulebookEdition, lowCents: option.lowCents, highCents: option.highCents,
  });
  return { intakeId: intake.id, quoteId: quote.id, document, option };
}
