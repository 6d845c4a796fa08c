import { linkLifeMs } from '../auth/public-links';
import type { Deps } from '../deps';
import { maskEmail } from '../intakes/mask-email';
import { timeZoneOfZip } from '../intakes/place';
import { readIntake } from '../intakes/read-intake';
import { queueMail } from '../mail/queue-mail';
import { isoDateIn } from '../words/dates';

export interface Sent { readonly sentTo: string; readonly openUntil: string }

/**
 * Keeps the address of an intake and queues the mail with the link that resumes it.
 * @param requestKey says which request it is; the same one again mails nothing more
 * @returns the masked address, and the last day (ISO, where the home is) on which the link opens the answers
 */
export async function finishLater(deps: Deps, intakeId: string, email: string, requestKey: string): Promise<Sent> {
  const { sequelize, models, clock, pricing } = deps;
  const zip = await sequelize.transaction(async (transaction) => {
    const intake = await readIntake(models, intakeId, transaction, true);
    await intake.update({ email, updatedAt: clock() }, { transaction });
    await queueMail(deps, transaction, { template: 'resume-link', dedupeKey: `resume:${intakeId}:${requestKey}`, intakeId, leadId: null });
    return intake.answers.zip;
  });
  deps.jobs.nudge();
  const until = new Date(clock().getTime() + linkLifeMs('resume'));
  return { sentTo: maskEmail(email), openUntil: isoDateIn(until, timeZoneOfZip(pricing.edition, zip)) };
}
