import type { NewLink } from '../auth/public-links';
import { makeLink } from '../auth/public-links';
import type { Deps } from '../deps';
import type { Intake } from '../models/intake';

/** Opens an intake without any answer, with the token of the browser's cookie. */
export const startIntake = ({ sequelize, models, clock }: Deps): Promise<{ intake: Intake; link: NewLink }> =>
  sequelize.transaction(async (transaction) => {
    const now = clock();
    const intake = await models.Intake.create({ createdAt: now, updatedAt: now, currentStep: 'home' }, { transaction });
    return { intake, link: await makeLink(models, 'intake-cookie', intake.id, now, transaction) };
  });
