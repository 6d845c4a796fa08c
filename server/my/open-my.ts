import { findLink, makeLink, type NewLink } from '../auth/public-links';
import type { Deps } from '../deps';
import { problem } from '../http/problem';

/**
 * Opens the homeowner's page by its mailed link and makes the token of this browser's cookie.
 * @throws problems not-found (unknown or taken back), gone (it was right once)
 */
export async function openMy({ models, clock }: Deps, token: string): Promise<{ intakeId: string; link: NewLink }> {
  const found = await findLink(models, 'my', token, clock());
  if (!found) throw problem('not-found', 'This link opens nothing. Use the one in our newest mail, or call us.');
  if (found.expired) throw problem('gone', 'This link has run out. Call us and we send a new one.');
  return { intakeId: found.intakeId, link: await makeLink(models, 'my-cookie', found.intakeId, clock()) };
}
