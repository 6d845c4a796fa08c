import type { Transaction } from 'sequelize';
import type { LinkPurpose } from '../models/link';
import type { Models } from '../models/index';
import { hashOf, newToken } from './tokens';

const DAY_MS = 86_400_000;
/** How long each opens, in days. A homeowner's page lives as long as the job's papers are of use. */
const lifeDays: Record<LinkPurpose, number> = { 'intake-cookie': 90, resume: 30, 'my-cookie': 30, my: 400 };

export const linkLifeMs = (purpose: LinkPurpose): number => lifeDays[purpose] * DAY_MS;

export interface NewLink { readonly token: string; readonly expiresAt: Date }

/** Makes a cookie's or a mailed link's token for an intake; only its hash is stored. */
export async function makeLink(
  models: Models, purpose: LinkPurpose, intakeId: string, now: Date, transaction: Transaction | null = null,
): Promise<NewLink> {
  const token = newToken();
  const expiresAt = new Date(now.getTime() + linkLifeMs(purpose));
  await models.Link.create({ tokenHash: hashOf(token), purpose, intakeId, expiresAt, createdAt: now }, { transaction });
  return { token, expiresAt };
}

export interface FoundLink { readonly intakeId: string; readonly expired: boolean }

/** What a token opens; null when it is unknown or was taken back. `expired`: it was right once. */
export async function findLink(models: Models, purpose: LinkPurpose, token: string, now: Date): Promise<FoundLink | null> {
  const link = await models.Link.findOne({ where: { tokenHash: hashOf(token), purpose, revokedAt: null } });
  return link && { intakeId: link.intakeId, expired: link.expiresAt <= now };
}

/** Takes a token back. */
export async function revokeLink(models: Models, purpose: LinkPurpose, token: string, now: Date): Promise<void> {
  await models.Link.update({ revokedAt: now }, { where: { tokenHash: hashOf(token), purpose, revokedAt: null } });
}
