import { refundDeposit } from '../deposits/refund-deposit';
import type { Deps } from '../deps';
import { createCompose } from '../mail/compose';
import { sendMail } from '../mail/send-mail';
import type { TaskHandlers } from './jobs';

/** What each task of the outbox does. */
export function createHandlers(deps: Deps): TaskHandlers {
  const compose = createCompose(deps);
  return {
    'send-mail': ({ mailId }) => sendMail(deps, deps.mailer, compose, mailId),
    'refund-deposit': async ({ depositId }) => {
      if (!deps.stripe) throw new Error('No payment provider is set up');
      await refundDeposit(deps, deps.stripe, depositId);
    },
  };
}
