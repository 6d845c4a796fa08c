import { Router, json } from 'express';
import { z } from '../../../shared/zod';
import type { Provider } from './settle';

const modeSchema = z.object({ down: z.boolean().optional(), hold: z.boolean().optional() });
const sendSchema = z.object({
  times: z.number().int().min(1).max(50).default(1),
  ageSeconds: z.number().int().min(0).default(0),
  secret: z.string().optional(),
});

/**
 * What tests need and the provider has not: PUT /test/mode {down, hold} switches the API off or holds events back;
 * POST /test/events/:id/send {times, ageSeconds, secret} sends an event again: repeated, old, or signed with another secret.
 */
export function controlRoutes({ store, webhooks, clock }: Provider, setDown: (down: boolean) => void): Router {
  const router = Router();
  router.use(json());
  router.put('/mode', (request, response) => {
    const { down, hold } = modeSchema.parse(request.body);
    if (down !== undefined) setDown(down);
    if (hold !== undefined) webhooks.hold(hold);
    response.status(204).end();
  });
  router.post('/events/:id/send', async (request, response) => {
    const { times, ageSeconds, secret } = sendSchema.parse(request.body ?? {});
    const event = store.state.events.find(({ id }) => id === request.params.id);
    if (!event) { response.status(404).json({}); return; }
    const at = new Date(clock().getTime() - ageSeconds * 1000);
    response.json({ statuses: await Promise.all(Array.from({ length: times }, () => webhooks.send(event, at, secret))) });
  });
  return router;
}
