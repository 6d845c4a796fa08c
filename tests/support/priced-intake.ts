import { randomUUID } from 'node:crypto';
import { priceIntake } from '../../pricing/quote';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import type { Contact } from '../../shared/api/intakes';
import type { QuoteDocument, QuoteOption } from '../../shared/quote';
import type { Db } from '../../server/models/db';
import { knownHome } from './known-home';

export const contact: Contact = { name: 'Maren Oakes', email: 'maren@example.com', phone: '555-0117', street: '12 Example Lane', contactWays: ['email', 'phone'], consent: true };

export interface PricedIntake { readonly intakeId: string; readonly quoteId: string; readonly document: QuoteDocument; readonly option: QuoteOption }

/** An intake whose price is frozen, stored as the API stores it: a home of which all is known but the panel's blank spaces. */
export async function storePricedIntake({ models }: Db, pricedOn = new Date().toISOString().slice(0, 10)): Promise<PricedIntake> {
  const document = priceIntake({ facts: { ...knownHome(), blankSpaces: null }, edition: editionOne, pricedOn, samples: 50 });
  const option = document.options.find(({ recommended }) => recommended);
  if (!option) throw new Error('A known home has a recommended option');
  const intake = await models.Intake.create({ answers: { zip: '00017' }, jurisdictionId: document.jurisdiction.id, stage: 'priced' });
  const quote = await models.Quote.create({
    intakeId: intake.id, intakeVersion: 1, inputHash: randomUUID(), document: JSON.stringify(document), outcome: document.outcome,
    rulebookEdition: document.rulebookEdition, lowCents: option.lowCents, highCents: option.highCents,
  });
  return { intakeId: intake.id, quoteId: quote.id, document, option };
}
