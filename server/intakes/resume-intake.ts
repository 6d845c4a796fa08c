import { findLink, makeLink, type NewLink } from '../auth/public-links';
import type { Deps } from '../deps';
import { problem } from '../http/problem';
import type { Intake } from '../models/intake';
import { readIntake } from './read-intake';

/**
 * Opens an intake by its mailed link and makes the token of this browser's cookie.
 * @throws problems not-found (unknown or taken back), gone (it was right once)
 */
export async function resumeIntake({ models, clock }: Deps, token: string): Promise<{ intake: Intake; link: NewLink }> {
  const found = await findLink(models, 'resume', token, clock());
  if (!found) throw problem('not-found', 'This link opens nothing. Use the newest one we mailed to you, or start again.');
  if (found.expired) throw problem('gone', 'Links open your answers for 30 days. Start again, or call us: we still have your answers.');
  const intake = await readIntake(models, found.intakeId);
  return { intake, link: await makeLink(models, 'intake-cookie', intake.id, clock()) };
}
