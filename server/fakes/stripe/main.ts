import { z } from '../../../shared/zod';
import { createFakeStripe } from './app';

const env = z.object({
  FAKE_STRIPE_PORT: z.coerce.number().int().min(0).max(65_535),
  FAKE_STRIPE_WEBHOOK_URL: z.url(),
  FAKE_STRIPE_WEBHOOK_SECRET: z.string().min(1),
  FAKE_STRIPE_DATA_DIR: z.string().min(1),
}).parse(process.env);

const fake = createFakeStripe({
  dataDir: env.FAKE_STRIPE_DATA_DIR,
  webhookTarget: () => ({ url: env.FAKE_STRIPE_WEBHOOK_URL, secret: env.FAKE_STRIPE_WEBHOOK_SECRET }),
});
const server = fake.app.listen(env.FAKE_STRIPE_PORT, '127.0.0.1', () => console.log(`Practice payments on 127.0.0.1:${env.FAKE_STRIPE_PORT}`));
server.once('error', (error) => {
  console.error(error.message);
  process.exit(1);
});
for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.once(signal, () => {
    fake.stop();
    server.close(() => process.exit(0));
    server.closeAllConnections();
  });
}
