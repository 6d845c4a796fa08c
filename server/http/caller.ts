import type { Request } from 'express';
import type { Access, Endpoint } from '../../shared/api/endpoint';
import { findSession, type SignedIn } from '../auth/desk-sessions';
import { findLink } from '../auth/public-links';
import { sameText } from '../auth/tokens';
import type { Deps } from '../deps';
import { readCookie } from './cookies';
import { problem } from './problem';

/** Who is calling, as far as the endpoint asks. One browser may be several at once. */
export interface Caller {
  readonly intakeId: string | null;
  readonly homeownerIntakeId: string | null;
  readonly session: SignedIn | null;
}

const deskAccess: readonly Access[] = ['owner', 'estimator', 'sales', 'desk'];
const isUnsafe = ({ method }: Pick<Endpoint, 'method'>): boolean => method !== 'get';

async function intakeOf(deps: Deps, request: Request, cookie: 'intake' | 'my'): Promise<string | null> {
  const token = readCookie(request, cookie);
  const link = token === null ? null : await findLink(deps.models, cookie === 'intake' ? 'intake-cookie' : 'my-cookie', token, deps.clock());
  return link === null || link.expired ? null : link.intakeId;
}

async function sessionOf(deps: Deps, request: Request): Promise<SignedIn | null> {
  const token = readCookie(request, 'desk');
  return token === null ? null : findSession(deps.models, token, deps.clock());
}

/**
 * Finds out who calls and refuses who may not. To strangers, what they may not see looks like what does not exist.
 * @throws problems not-found, unauthenticated (the desk alone), forbidden (a role that may not, or a missing CSRF token)
 */
export async function admit(deps: Deps, request: Request, endpoint: Pick<Endpoint, 'method' | 'access'>): Promise<Caller> {
  const { access } = endpoint;
  const asksDesk = access.some((kind) => deskAccess.includes(kind));
  const caller: Caller = {
    intakeId: access.includes('intake') ? await intakeOf(deps, request, 'intake') : null,
    homeownerIntakeId: access.includes('homeowner') ? await intakeOf(deps, request, 'my') : null,
    session: asksDesk ? await sessionOf(deps, request) : null,
  };
  const { session } = caller;
  const byRole = session !== null && (access.includes('desk') || access.includes(session.staff.role));
  if (session !== null && isUnsafe(endpoint) && !sameText(request.get('X-CSRF-Token') ?? '', session.csrfToken)) {
    throw problem('forbidden', 'The page is out of date. Reload it and try again.');
  }
  if (access.includes('public') || caller.intakeId !== null || caller.homeownerIntakeId !== null || byRole) return caller;
  if (session !== null) throw problem('forbidden');
  if (access.every((kind) => deskAccess.includes(kind))) throw problem('unauthenticated');
  throw problem('not-found', 'No answers are open in this browser. Start again, or use the link we mailed to you.');
}
