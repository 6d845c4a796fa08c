import { createHash } from 'node:crypto';
import type { Request } from 'express';
import { QueryTypes, type Sequelize } from 'sequelize';
import { problem } from './problem';

/** How often a caller may do something: `most` times in `everyS` seconds. Counted in the database, so that all processes count together. */
export const limits = {
  'sign-in-account': { most: 8, everyS: 15 * 60 },
  'sign-in-address': { most: 30, everyS: 15 * 60 },
  'start-intake': { most: 60, everyS: 60 * 60 },
  answers: { most: 600, everyS: 5 * 60 },
  quotes: { most: 60, everyS: 5 * 60 },
  'finish-later': { most: 6, everyS: 60 * 60 },
  'open-link': { most: 30, everyS: 15 * 60 },
  photos: { most: 60, everyS: 10 * 60 },
  deposits: { most: 20, everyS: 10 * 60 },
  'outside-area': { most: 10, everyS: 60 * 60 },
} as const satisfies Record<string, { most: number; everyS: number }>;
export type LimitName = keyof typeof limits;

/** What is counted is stored as a hash: neither addresses nor e-mails. */
const keyOf = (name: LimitName, who: string): string => createHash('sha256').update(`${name}\n${who}`).digest('base64url');

/**
 * Counts one try and refuses when there were too many.
 * @param who an address or an account
 * @throws problem too-many with Retry-After
 */
export async function countTry(sequelize: Sequelize, name: LimitName, who: string, factor: number): Promise<void> {
  const { most, everyS } = limits[name];
  const [row] = await sequelize.query<{ tries: number; left: number }>(
    `INSERT INTO rate_limits (key, tries, resets_at) VALUES ($key, 1, now() + make_interval(secs => $everyS))
     ON CONFLICT (key) DO UPDATE SET
       tries = CASE WHEN rate_limits.resets_at <= now() THEN 1 ELSE rate_limits.tries + 1 END,
       resets_at = CASE WHEN rate_limits.resets_at <= now() THEN now() + make_interval(secs => $everyS) ELSE rate_limits.resets_at END
     RETURNING tries, ceil(extract(epoch FROM resets_at - now()))::int AS left`,
    { type: QueryTypes.SELECT, bind: { key: keyOf(name, who), everyS } },
  );
  if (row && row.tries > most * factor) throw problem('too-many', `Try again in ${minutes(row.left)}.`, undefined, { 'Retry-After': String(row.left) });
}

/** Forgets the tries of someone who turned out to be right. */
export async function forgetTries(sequelize: Sequelize, name: LimitName, who: string): Promise<void> {
  await sequelize.query('DELETE FROM rate_limits WHERE key = $key', { bind: { key: keyOf(name, who) } });
}

/** Removes counts that are over. */
export async function sweepTries(sequelize: Sequelize): Promise<void> {
  await sequelize.query('DELETE FROM rate_limits WHERE resets_at < now()');
}

const minutes = (seconds: number): string => (seconds <= 90 ? 'a minute' : `${Math.ceil(seconds / 60)} minutes`);

/** The network a request comes from; of an IPv6 address the part that one household has. */
export function addressOf(request: Request): string {
  const ip = request.ip ?? '';
  return ip.includes(':') && !ip.startsWith('::ffff:') ? ip.split(':').slice(0, 4).join(':') : ip;
}
