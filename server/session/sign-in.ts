import { passwordIsRight } from '../auth/passwords';
import { startSession } from '../auth/desk-sessions';
import type { Deps } from '../deps';
import { problem } from '../http/problem';
import { countTry, forgetTries } from '../http/rate-limits';

/**
 * Checks e-mail and password and starts a session; the one that this browser held before ends.
 * @returns the token of the new cookie
 * @throws problems unauthenticated (the same words whatever was wrong), too-many
 */
export async function signIn(
  { sequelize, models, clock, env }: Deps, given: { readonly email: string; readonly password: string }, heldToken: string | null,
): Promise<string> {
  const email = given.email.trim().toLowerCase();
  await countTry(sequelize, 'sign-in-account', email, env.RATE_LIMIT_FACTOR);
  const staff = await models.Staff.findOne({ where: { email } });
  const right = await passwordIsRight(staff?.passwordHash ?? null, given.password);
  if (!staff || !right || !staff.active) throw problem('unauthenticated', 'E-mail or password is not right.');
  await forgetTries(sequelize, 'sign-in-account', email);
  return startSession(models, staff.id, heldToken, clock());
}
