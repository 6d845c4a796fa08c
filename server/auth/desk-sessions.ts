import type { Staff } from '../models/staff';
import type { Models } from '../models/index';
import { csrfTokenOf, hashOf, newToken } from './tokens';

const HOUR_MS = 3_600_000;
const LIFE_MS = 12 * HOUR_MS;
const IDLE_MS = 4 * HOUR_MS;
/** Being seen is written down no more often than this. */
const SEEN_EVERY_MS = 60_000;

export interface SignedIn {
  readonly sessionId: string;
  readonly staff: Pick<Staff, 'id' | 'name' | 'email' | 'role'>;
  readonly csrfToken: string;
}

/** Starts a session of a person and ends the one that this browser held before. @returns the cookie's token */
export async function startSession(models: Models, staffId: string, heldToken: string | null, now: Date): Promise<string> {
  const token = newToken();
  const expiresAt = new Date(now.getTime() + LIFE_MS);
  await models.DeskSession.create({ tokenHash: hashOf(token), staffId, createdAt: now, lastSeenAt: now, expiresAt });
  if (heldToken !== null) await models.DeskSession.update({ revokedAt: now }, { where: { tokenHash: hashOf(heldToken), revokedAt: null } });
  return token;
}

/** Who a cookie's token stands for; null when it is unknown, over, idle for too long, or the person may no longer sign in. */
export async function findSession(models: Models, token: string, now: Date): Promise<SignedIn | null> {
  const session = await models.DeskSession.findOne({ where: { tokenHash: hashOf(token), revokedAt: null } });
  if (!session || session.expiresAt <= now || now.getTime() - session.lastSeenAt.getTime() > IDLE_MS) return null;
  const staff = await models.Staff.findOne({ where: { id: session.staffId, active: true } });
  if (!staff) return null;
  if (now.getTime() - session.lastSeenAt.getTime() > SEEN_EVERY_MS) await session.update({ lastSeenAt: now });
  const { id, name, email, role } = staff;
  return { sessionId: session.id, staff: { id, name, email, role }, csrfToken: csrfTokenOf(token) };
}

export async function endSession(models: Models, sessionId: string, now: Date): Promise<void> {
  await models.DeskSession.update({ revokedAt: now }, { where: { id: sessionId, revokedAt: null } });
}
