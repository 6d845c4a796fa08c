import { QueryTypes, type Transaction } from 'sequelize';
import { firstOpenStep, type Answers } from '../../shared/wizard/index';
import type { Deps } from '../deps';
import type { IntakeColumns, IntakeStage } from '../models/intake';
import { placeOfZip } from './place';
import { readIntake } from './read-intake';

/** Takes back a price that nobody paid: what it was made from has changed. */
async function withdrawPrice({ models, clock }: Deps, transaction: Transaction, intakeId: string): Promise<void> {
  await models.Quote.update({ withdrawnAt: clock() }, { where: { intakeId, withdrawnAt: null }, transaction });
}

/**
 * Saves answers field by field; null takes one back. Whatever another tab saved meanwhile stays, because the fields are laid over the
 * stored ones in the database. Answers that say nothing new change nothing, not even the version.
 */
export const saveAnswers = (deps: Deps, intakeId: string, answers: Answers): Promise<IntakeColumns> =>
  deps.sequelize.transaction(async (transaction) => {
    const { sequelize, models, pricing, clock } = deps;
    const removed = Object.keys(answers).filter((id) => answers[id] === null);
    const given = Object.fromEntries(Object.entries(answers).filter(([, value]) => value !== null));
    const [changed] = await sequelize.query<{ answers: Answers; stage: IntakeStage }>(
      `UPDATE intakes SET answers = (answers - $removed::text[]) || $given::jsonb, version = version + 1, updated_at = $now
       WHERE id = $intakeId AND (answers - $removed::text[]) || $given::jsonb IS DISTINCT FROM answers
       RETURNING answers, stage`,
      { type: QueryTypes.SELECT, transaction, bind: { intakeId, removed, given: JSON.stringify(given), now: clock() } },
    );
    if (changed) {
      if (changed.stage === 'priced') await withdrawPrice(deps, transaction, intakeId);
      await models.Intake.update({
        stage: changed.stage === 'priced' ? 'open' : changed.stage,
        jurisdictionId: placeOfZip(pricing.edition, changed.answers.zip)?.id ?? null,
        currentStep: firstOpenStep(changed.answers).id,
      }, { where: { id: intakeId }, transaction });
    }
    return readIntake(models, intakeId, transaction);
  });
