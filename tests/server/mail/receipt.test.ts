import { dollarRange } from '../../../shared/money';
import { handleEvent } from '../../../server/deposits/handle-event';
import { mailText } from '../../../server/mail/as-text';
import { createCompose, senderOf } from '../../../server/mail/compose';
import type Stripe from 'stripe';
import { startTestApp, type TestApp } from '../../support/app';
import { contact, storePricedIntake } from '../../support/priced-intake';

describe('the receipt', () => {
  let app: TestApp;
  const now = new Date('2026-12-01T17:00:00Z');
  beforeAll(async () => { app = await startTestApp({ clock: () => now }); });
  afterAll(() => app.stop());

  it('says what was paid, for what, what comes next and how to cancel, in figures of the frozen price', async () => {
    const { intakeId, quoteId, document, option } = await storePricedIntake(app.deps, { pricedOn: '2026-12-01' });
    await app.deps.models.Deposit.create({ intakeId, quoteId, optionId: option.id, contact, consentWords: 'agreed', amountCents: option.depositCents, checkoutSessionId: 'cs_1', createdAt: now });
    const event = { id: 'evt_1', type: 'checkout.session.completed', created: 1, data: { object: { id: 'cs_1', payment_status: 'paid', status: 'complete', amount_total: option.depositCents, payment_intent: 'pi_1' } } };
    await handleEvent(app.deps, event as unknown as Stripe.Event, now);
    const mail = await app.deps.models.Mail.findOne({ where: { intakeId, template: 'receipt' }, rejectOnEmpty: true });
    const composed = await createCompose(app.deps)(mail);
    const words = composed ? mailText(composed.content, senderOf(app.deps)) : '';

    expect(composed?.to).toBe(contact.email);
    expect(composed?.content.subject).toMatch(/^Your \$150 deposit is paid: job 1\d{3}$/);
    expect(words).toContain('Deposit: $150, paid Tue, Dec 1');
    expect(words).toContain(`${option.title}. ${option.subtitle}.`);
    expect(words).toContain(dollarRange(option.lowCents, option.highCents));
    for (const line of option.lines) expect(words).toContain(`${line.title}: ${line.lowCents === 0 && line.highCents === 0 ? 'Included' : dollarRange(line.lowCents, line.highCents)}`);
    for (const caution of document.cautions) expect(words).toContain(caution);
    expect(words).toContain('By Thu, Dec 3, 5 p.m.');
    // 16 CFR 429.1(a): midnight of the third business day after Tuesday, December 1, 2026 is that of Friday, December 4.
    expect(words).toContain('until midnight of Fri, Dec 4, the third business day after you paid');
    expect(words).toContain('reply to this mail or call 555-0142');
    expect(words).toContain('invented');
    // The voice guide's list of words never used.
    expect(words).not.toMatch(/!|\b(just|simply|unfortunately|oops|please|ASAP|seamless)\b/i);
  });

  it('goes to nobody when there is nobody left to write to', async () => {
    const intake = await app.deps.models.Intake.create({ answers: {} });
    const mail = await app.deps.models.Mail.create({ template: 'resume-link', dedupeKey: 'nobody', intakeId: intake.id });
    expect(await createCompose(app.deps)(mail)).toBeNull();
  });
});
