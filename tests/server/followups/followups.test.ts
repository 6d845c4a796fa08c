import { randomUUID } from 'node:crypto';
import { createCompose } from '../../../server/mail/compose';
import { createStripe } from '../../../server/payments/stripe';
import type { My } from '../../../shared/api/quotes';
import { quoteDocumentSchema } from '../../../shared/quote';
import { startTestApp, testOrigin, type Agent, type TestApp } from '../../support/app';
import { openIntake } from '../../support/open-intake';
import { contact } from '../../support/priced-intake';

// The answers are invented. Words: the voice guide; statuses: RFC 9110; the flag: the product's list of jobs without an automatic price.
const homeAnswers = { zip: '00017', homeKind: 'house', tenure: 'own', parking: 'attached_garage', panelCondition: ['buzzing'] };

describe('followups', () => {
  let app: TestApp;
  const now = new Date('2026-12-01T17:00:00Z');

  beforeAll(async () => {
    app = await startTestApp({ clock: () => now, stripe: createStripe({ secretKey: 'sk_test_none', apiBase: 'http://127.0.0.1:1' }) });
  });
  afterAll(() => app.stop());

  async function open(answers: object = homeAnswers): Promise<{ browser: Agent; intakeId: string }> {
    const opened = await openIntake(app, app.browser());
    await opened.browser.patch('/api/intakes/current/answers').send({ answers }).expect(200);
    return opened;
  }
  const post = (browser: Agent, path: string, body: object, key = randomUUID()) => browser.post(`/api/intakes/current/${path}`).set('Idempotency-Key', key).send(body);
  const mailOf = async (intakeId: string, template: string) => {
    const mail = await app.deps.models.Mail.findOne({ where: { intakeId, template }, rejectOnEmpty: true });
    const composed = await createCompose(app.deps)(mail);
    if (!composed) throw new Error('There is somebody to write to');
    return { ...composed, words: JSON.stringify(composed.content) };
  };
  const linkIn = (words: string, page: string) => new RegExp(`${testOrigin}/${page}/([\\w-]{43})`).exec(words)?.[1] ?? '';

  describe('finish later', () => {
    it('refuses strangers, and an address that is none', async () => {
      await post(app.browser(), 'finish-later', { email: 'ione@example.com' }).expect(404);
      const { browser } = await open();
      expect((await post(browser, 'finish-later', { email: 'ione@' }).expect(422)).body).toMatchObject({ errors: [{ pointer: '/email' }] });
    });

    it('mails a link that opens the answers on another device, once for a double click', async () => {
      const { browser, intakeId } = await open();
      const key = randomUUID();
      const answer = await post(browser, 'finish-later', { email: 'ione@example.com' }, key).expect(200);
      // 30 days after December 1, 2026, by the calendar.
      expect(answer.body).toEqual({ sentTo: 'i•••@example.com', openUntil: '2026-12-31' });
      await post(browser, 'finish-later', { email: 'ione@example.com' }, key).expect(200);
      expect(await app.deps.models.Mail.count({ where: { intakeId } })).toBe(1);

      const { to, words, content } = await mailOf(intakeId, 'resume-link');
      expect(to).toBe('ione@example.com');
      expect(content.title).toBe('Your answers are kept');
      expect(words).toContain('The link works through Thu, Dec 31.');
      const other = app.browser();
      const { body } = await other.post('/api/resume').send({ token: linkIn(words, 'resume') }).expect(200);
      expect(body).toMatchObject({ answers: homeAnswers, savedTo: 'i•••@example.com' });
      await other.get('/api/intakes/current').expect(200);
    });
  });

  describe('a visit', () => {
    it('needs a town that we serve, and a contact', async () => {
      await post(app.browser(), 'visit', contact).expect(404);
      const outside = await open({ ...homeAnswers, zip: '99999' });
      expect((await post(outside.browser, 'visit', contact).expect(422)).body).toMatchObject({ errors: [{ pointer: '/answers/zip' }] });
      const { browser } = await open();
      expect((await post(browser, 'visit', { ...contact, consent: false }).expect(422)).body).toMatchObject({ errors: [{ pointer: '/consent' }] });
    });

    it('is handed to the estimator without a price, with the caution first, and shows on the homeowner’s page', async () => {
      const { browser, intakeId } = await open();
      expect((await post(browser, 'visit', contact).expect(200)).body).toMatchObject({ stage: 'visit-asked' });
      const lead = await app.deps.models.Lead.findOne({ where: { intakeId }, rejectOnEmpty: true });
      // Two working days after Tuesday, December 1, 5 p.m. in Denver.
      expect(lead).toMatchObject({ stage: 'needs-a-visit', lowCents: null, highCents: null, work: 'Visit, no price yet', dueAt: new Date('2026-12-04T00:00:00Z') });

      const { to, words } = await mailOf(intakeId, 'visit-asked');
      expect(to).toBe(contact.email);
      expect(words).toContain('Leave the panel alone and call 555-0142');
      expect(words).toContain('By Thu, Dec 3, 5 p.m., we get in touch by e-mail or by phone');
      const desk = await mailOf(intakeId, 'new-lead');
      expect(desk.to).toBe('office@example.com');
      expect(desk.words).toContain(`${testOrigin}/desk/leads/${lead.id}`);
      expect(desk.words).not.toMatch(/Example Lane|555-0117|maren@/);

      const page = app.browser();
      await page.get('/api/my').expect(404);
      const { body } = (await page.post('/api/my').send({ token: linkIn(words, 'my') }).expect(200)) as { body: My };
      expect(body).toMatchObject({ jobNumber: lead.jobNumber, name: 'Maren Oakes', deposit: null, optionId: null });
      expect(quoteDocumentSchema.parse(body.quote).outcome).toBe('visit');
      expect(body.timeline.map(({ id }) => id)).toContain('asked');
      expect((await page.get('/api/my').expect(200)).body).toEqual(body);
    });

    it('asked twice is one lead, with the newer contact, and each mail once', async () => {
      const { browser, intakeId } = await open();
      await post(browser, 'visit', contact).expect(200);
      await post(browser, 'visit', { ...contact, street: '14 Example Lane' }).expect(200);
      const leads = await app.deps.models.Lead.findAll({ where: { intakeId } });
      expect(leads.map(({ street, version }) => [street, version])).toEqual([['14 Example Lane', 2]]);
      expect(await app.deps.models.Mail.count({ where: { intakeId } })).toBe(2);
      expect(await app.deps.models.History.count({ where: { intakeId } })).toBe(1);
    });
  });

  describe('the homeowner’s link', () => {
    it('opens nothing when it is guessed, of another kind, or taken from a cookie', async () => {
      await app.browser().post('/api/my').send({ token: 'x'.repeat(43) }).expect(404);
      const { browser, intakeId } = await open();
      await post(browser, 'finish-later', { email: 'ione@example.com' }).expect(200);
      const resume = linkIn((await mailOf(intakeId, 'resume-link')).words, 'resume');
      await app.browser().post('/api/my').send({ token: resume }).expect(404);
      await app.browser().post('/api/resume').send({ token: 'x'.repeat(43) }).expect(404);
    });

    it('says so when it has run out', async () => {
      const { browser, intakeId } = await open();
      await post(browser, 'visit', contact).expect(200);
      const token = linkIn((await mailOf(intakeId, 'visit-asked')).words, 'my');
      await app.deps.models.Link.update({ createdAt: new Date('2025-01-01'), expiresAt: new Date('2025-02-01') }, { where: { intakeId, purpose: 'my' } });
      await app.browser().post('/api/my').send({ token }).expect(410).expect('Content-Type', /problem\+json/);
    });
  });

  it('leave no name, address, link or ZIP in the log', () => {
    expect(app.log()).not.toMatch(/Maren|ione@|maren@|Example Lane|00017|[\w-]{43}/);
  });
});
