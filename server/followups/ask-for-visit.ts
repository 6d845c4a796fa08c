import type { Contact } from '../../shared/api/intakes';
import { consentWords } from '../../shared/consent';
import type { Deps } from '../deps';
import { problem } from '../http/problem';
import { placeOfZip } from '../intakes/place';
import { readIntake } from '../intakes/read-intake';
import { createLead } from '../leads/create-lead';
import { queueMail } from '../mail/queue-mail';
import type { Intake } from '../models/intake';
import { priceIntake } from '../quotes/price-intake';

/**
 * Hands an intake to the estimator without a price, whatever is answered so far; only the town must be known. What the answers say
 * is frozen with it, so that the desk sees what the homeowner saw. Asked again, it takes the newer contact.
 * @throws problems conflict (the deposit is paid), validation (no ZIP, or one that is not served)
 */
export async function askForVisit(deps: Deps, intakeId: string, contact: Contact): Promise<Intake> {
  const { sequelize, models, clock, pricing } = deps;
  const before = await readIntake(models, intakeId);
  if (placeOfZip(pricing.edition, before.answers.zip) === null) {
    throw problem('validation', 'We must know the town first.', [{ pointer: '/answers/zip', detail: 'Type a ZIP that we serve' }]);
  }
  const { id: quoteId, document } = await priceIntake(deps, intakeId, 'as far as answered');
  const intake = await sequelize.transaction(async (transaction) => {
    const now = clock();
    const locked = await readIntake(models, intakeId, transaction, true);
    if (locked.stage === 'paid') throw problem('conflict', 'The deposit for this job is already paid. The electrician looks at your answers anyway.');
    const known = locked.stage === 'visit-asked';
    const job = { intakeId, quoteId, document, option: null, depositId: null, contact, consentWords, consentAt: now };
    const lead = await createLead(deps, transaction, job, now);
    if (!known) await models.History.create({ leadId: lead.id, intakeId, at: now, who: 'Homeowner', what: 'Visit asked for', after: lead.workNote || null }, { transaction });
    await queueMail(deps, transaction, { template: 'visit-asked', dedupeKey: `visit-asked:${lead.id}`, intakeId, leadId: lead.id });
    await queueMail(deps, transaction, { template: 'new-lead', dedupeKey: `new-lead:${lead.id}`, intakeId, leadId: lead.id });
    return locked.update({ stage: 'visit-asked', updatedAt: now }, { transaction });
  });
  deps.jobs.nudge();
  return intake;
}
