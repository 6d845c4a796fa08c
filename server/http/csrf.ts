import type { Request } from 'express';
import { problem } from './problem';

const hostOf = (origin: string): string | null => (URL.canParse(origin) ? new URL(origin).host : null);

/**
 * Refuses a change that another site asks for with our visitor's cookies. Browsers say where a request comes from in Sec-Fetch-Site,
 * older ones in Origin; a request that says neither is no browser's page and is refused as well.
 * @throws problem forbidden
 */
export function refuseOtherSites(request: Request, publicUrl: string): void {
  const site = request.get('Sec-Fetch-Site');
  const origin = request.get('Origin');
  const ours = site !== undefined
    ? site === 'same-origin'
    : origin !== undefined && (origin === new URL(publicUrl).origin || hostOf(origin) === request.get('Host'));
  if (!ours) throw problem('forbidden', 'This change was asked for by another site.');
}
