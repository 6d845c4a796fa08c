import * as endpoints from '../../shared/api/company';
import type { Company } from '../../shared/api/company';
import { bind, type Api } from '../http/bind';
import { askForArea } from './ask-for-area';
import { companyOf } from './present';

export function companyRoutes(api: Api): void {
  const { deps } = api;
  let company: Company | undefined;
  bind(api, endpoints.getCompany, async () => (company ??= companyOf(deps)));

  bind(api, endpoints.getHealth, async () => {
    await deps.sequelize.query('SELECT 1');
    return { status: 'ok' as const };
  });

  bind(api, endpoints.askForArea, async ({ body }) => askForArea(deps.sequelize, body.zip, body.email, deps.clock()), { limit: 'outside-area' });
}
