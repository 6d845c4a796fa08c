import express, { Router, type Express } from 'express';
import { endpoints } from '../shared/api/index';
import { companyRoutes } from './company/routes';
import { depositRoutes } from './deposits/routes';
import type { Deps } from './deps';
import { followupRoutes } from './followups/routes';
import type { Api } from './http/bind';
import { handleErrors } from './http/errors';
import { logRequests } from './http/log';
import { notFound } from './http/not-found';
import { securityHeaders } from './http/security';
import { intakeRoutes } from './intakes/routes';
import { leadRoutes } from './leads/routes';
import { myRoutes } from './my/routes';
import { buildOpenApi } from './openapi/build-openapi';
import { photoRoutes } from './photos/routes';
import { quoteRoutes } from './quotes/routes';
import { sessionRoutes } from './session/routes';

/** Every resource, each binding its endpoints. */
const resources: readonly ((api: Api) => void)[] = [
  companyRoutes, intakeRoutes, photoRoutes, quoteRoutes, depositRoutes, followupRoutes, myRoutes, sessionRoutes, leadRoutes,
];

/** The server: the order of its middleware and nothing else. `bound` lists the endpoints that have a handler. */
export function createApp(deps: Deps): { readonly app: Express; readonly bound: Api['bound'] } {
  const { env, logger, web } = deps;
  const api: Api = { router: Router(), deps, bound: [] };
  for (const bindAll of resources) bindAll(api);
  const openApi = JSON.stringify(buildOpenApi(endpoints));
  const paymentOrigins = env.STRIPE_API_BASE === undefined ? [] : [new URL(env.STRIPE_API_BASE).origin];

  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', env.TRUSTED_PROXIES);
  app.set('query parser', 'simple');
  // Answers of the API are never stored; leads set their own.
  app.set('etag', false);
  app.use(logRequests(logger));
  app.use(securityHeaders(web?.inlineScriptHashes ?? [], { https: env.https, paymentOrigins }));
  app.get('/api/openapi.json', (_request, response) => { response.type('json').send(openApi); });
  app.use('/api', api.router, notFound);
  if (web) app.use(web.router);
  app.use(notFound);
  app.use(handleErrors(logger));
  return { app, bound: api.bound };
}
