import * as desk from '../../shared/api/desk';
import { bind, type Api } from '../http/bind';
import { problem } from '../http/problem';
import { getLead } from './get-lead';
import { listLeads } from './list-leads';
import { moveLead } from './move-lead';

/** The version in If-Match, as GET gives it in ETag: `"7"`. @throws problem precondition-required */
function versionOf(ifMatch: string | undefined): number {
  if (ifMatch === undefined) throw problem('precondition-required', 'Send If-Match with the version you have seen');
  const match = /^(?:W\/)?"(\d{1,9})"$/.exec(ifMatch.trim());
  if (!match) throw problem('stale', 'That version is not known. Load the lead again.');
  return Number(match[1]);
}

/** Leads at the desk. */
export function leadRoutes(api: Api): void {
  const { deps } = api;
  bind(api, desk.listLeads, ({ query }) => listLeads(deps.sequelize, query));
  bind(api, desk.getLead, async ({ params, session, response }) => {
    const lead = await getLead(deps, params.id, session.staff.role);
    response.setHeader('ETag', `"${lead.version}"`);
    return lead;
  });
  bind(api, desk.moveLead, async ({ params, body, session, request, response }) => {
    await moveLead(deps, params.id, versionOf(request.get('If-Match')), body, session);
    const lead = await getLead(deps, params.id, session.staff.role);
    response.setHeader('ETag', `"${lead.version}"`);
    return lead;
  });
}
