import { Router, urlencoded } from 'express';
import { z } from '../../../shared/zod';
import { noSuchPage, payPage } from './pay-page';
import { expireOverdue, tryCard, type Provider } from './settle';

const formSchema = z.object({ card: z.string().max(40).default('') });

/** The payment page that stands in for the provider's own. */
export function payRoutes(provider: Provider): Router {
  const router = Router();
  router.use((_request, response, next) => {
    response.set({ 'Cache-Control': 'no-store', 'Content-Security-Policy': "default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'", 'Referrer-Policy': 'no-referrer' });
    expireOverdue(provider);
    next();
  });
  router.get('/:id', (request, response) => {
    const stored = provider.store.state.sessions[request.params.id];
    if (stored) response.send(payPage(stored));
    else response.status(404).send(noSuchPage());
  });
  // Sent on with 303 either way, so that a reload never pays again.
  router.post('/:id', urlencoded({ extended: false, limit: '10kb' }), (request, response) => {
    const stored = provider.store.state.sessions[request.params.id];
    if (!stored) { response.status(404).send(noSuchPage()); return; }
    const paid = tryCard(provider, stored, formSchema.safeParse(request.body).data?.card ?? '');
    response.redirect(303, paid ? (stored.session.success_url ?? `/pay/${stored.session.id}`) : `/pay/${stored.session.id}`);
  });
  return router;
}
