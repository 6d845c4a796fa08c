import * as endpoints from '../../shared/api/quotes';
import { linkLifeMs } from '../auth/public-links';
import { bind, type Api } from '../http/bind';
import { setCookie } from '../http/cookies';
import { openMy } from './open-my';
import { readMy } from './read-my';

export function myRoutes(api: Api): void {
  const { deps } = api;
  bind(api, endpoints.openMy, async ({ body, response }) => {
    const { intakeId, link } = await openMy(deps, body.token);
    setCookie(response, 'my', link.token, deps.env.https, linkLifeMs('my-cookie'));
    return readMy(deps, intakeId);
  }, { limit: 'open-link' });
  bind(api, endpoints.getMy, ({ homeownerIntakeId }) => readMy(deps, homeownerIntakeId));
}
