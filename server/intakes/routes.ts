import type { Response } from 'express';
import * as endpoints from '../../shared/api/intakes';
import { linkLifeMs, revokeLink } from '../auth/public-links';
import type { Deps } from '../deps';
import { bind, type Api } from '../http/bind';
import { clearCookie, readCookie, setCookie } from '../http/cookies';
import { presentIntake } from './present';
import { readIntake } from './read-intake';
import { resumeIntake } from './resume-intake';
import { saveAnswers } from './save-answers';
import { startIntake } from './start-intake';

const holdIntake = ({ env }: Deps, response: Response, token: string): void =>
  setCookie(response, 'intake', token, env.https, linkLifeMs('intake-cookie'));

export function intakeRoutes(api: Api): void {
  const { deps } = api;
  const { models } = deps;

  bind(api, endpoints.startIntake, async ({ caller, response }) => {
    if (caller.intakeId !== null) return presentIntake(deps, await readIntake(models, caller.intakeId));
    const { intake, link } = await startIntake(deps);
    holdIntake(deps, response, link.token);
    return presentIntake(deps, intake);
  }, { limit: 'start-intake' });

  bind(api, endpoints.getIntake, async ({ intakeId }) => presentIntake(deps, await readIntake(models, intakeId)));

  bind(api, endpoints.saveAnswers, async ({ intakeId, body }) => presentIntake(deps, await saveAnswers(deps, intakeId, body.answers)), { limit: 'answers' });

  bind(api, endpoints.resumeIntake, async ({ body, response }) => {
    const { intake, link } = await resumeIntake(deps, body.token);
    holdIntake(deps, response, link.token);
    return presentIntake(deps, intake);
  }, { limit: 'open-link' });

  bind(api, endpoints.forgetIntake, async ({ request, response }) => {
    const token = readCookie(request, 'intake');
    if (token !== null) await revokeLink(models, 'intake-cookie', token, deps.clock());
    clearCookie(response, 'intake', deps.env.https);
  });
}
