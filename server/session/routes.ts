import * as endpoints from '../../shared/api/desk';
import type { Session } from '../../shared/api/desk';
import { endSession, findSession, type SignedIn } from '../auth/desk-sessions';
import { bind, type Api } from '../http/bind';
import { clearCookie, readCookie, setCookie } from '../http/cookies';
import { problem } from '../http/problem';
import { signIn } from './sign-in';

const presentSession = ({ staff, csrfToken }: SignedIn): Session => ({ name: staff.name, email: staff.email, role: staff.role, csrfToken });

export function sessionRoutes(api: Api): void {
  const { deps } = api;
  const { models, clock, env } = deps;

  bind(api, endpoints.signIn, async ({ body, request, response }) => {
    const token = await signIn(deps, body, readCookie(request, 'desk'));
    const session = await findSession(models, token, clock());
    if (!session) throw problem('unauthenticated');
    setCookie(response, 'desk', token, env.https);
    return presentSession(session);
  }, { limit: 'sign-in-address' });

  bind(api, endpoints.getSession, async ({ session }) => presentSession(session));

  bind(api, endpoints.signOut, async ({ session, response }) => {
    await endSession(models, session.sessionId, clock());
    clearCookie(response, 'desk', env.https);
  });
}
