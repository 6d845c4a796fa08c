import pino from 'pino';
import { createJobs, type Jobs } from '../../../server/jobs/jobs';
import { queueMail } from '../../../server/mail/queue-mail';
import type { Mailer, OutgoingMail } from '../../../server/mail/mailer';
import { sendMail, type Compose } from '../../../server/mail/send-mail';
import { useDb } from '../../support/db';

// At least once with a deduplication id, a mail once: the project's architecture contract ("Jobs and mail").
describe('jobs', () => {
  const db = useDb();
  const sent: OutgoingMail[] = [];
  let failWith: Error | null = null;
  const mailer: Mailer = {
    async send(mail) {
      // Long enough that a second worker would be in the middle of it too.
      await new Promise((next) => setTimeout(next, 50));
      if (failWith) throw failWith;
      sent.push(mail);
      return `<${mail.dedupeKey}@example.com>`;
    },
    close: () => undefined,
  };
  const compose: Compose = async () => ({ to: 'ione@example.com', content: { subject: 's', title: 't', blocks: [] } });
  const lines: string[] = [];
  const logger = pino({}, { write: (line: string) => { lines.push(line); } });
  const running: Jobs[] = [];
  const startJobs = async () => {
    const jobs = createJobs(db.url, db, logger);
    running.push(jobs);
    await jobs.start({ 'send-mail': ({ mailId }) => sendMail(db, mailer, compose, mailId), 'refund-deposit': () => Promise.resolve() });
    return jobs;
  };
  const queue = async (dedupeKey: string) => {
    const intake = await db.models.Intake.create({ answers: {} });
    await db.sequelize.transaction((transaction) => queueMail(db, transaction, { template: 'resume-link', dedupeKey, intakeId: intake.id, leadId: null }));
    const mail = await db.models.Mail.findOne({ where: { dedupeKey }, rejectOnEmpty: true });
    return { intake, mail };
  };
  const until = async (holds: () => Promise<boolean> | boolean) => {
    for (let tries = 0; tries < 200; tries += 1) {
      if (await holds()) return;
      await new Promise((next) => setTimeout(next, 50));
    }
    throw new Error(`Did not come about. Log: ${lines.join('')}`);
  };

  beforeEach(() => { sent.length = 0; failWith = null; });
  afterEach(async () => { await Promise.all(running.splice(0).map((jobs) => jobs.stop())); });

  it('send a mail that was queued before they started, and note its Message-ID', async () => {
    const { mail } = await queue('before');
    await startJobs();
    await until(async () => (await mail.reload()).state === 'sent');
    expect(mail).toMatchObject({ messageId: '<before@example.com>', attempts: 1 });
  });

  it('send each mail once with two processes at work', async () => {
    const [one, other] = [await startJobs(), await startJobs()];
    const queued = [];
    for (let count = 0; count < 12; count += 1) queued.push((await queue(`two-${count}`)).mail);
    one.nudge();
    other.nudge();
    await until(async () => (await db.models.Mail.count({ where: { state: 'queued' } })) === 0);
    expect(sent.map(({ dedupeKey }) => dedupeKey).sort()).toEqual(queued.map(({ dedupeKey }) => dedupeKey).sort());
  });

  it('queue the same mail once', async () => {
    const { intake } = await queue('same');
    await db.sequelize.transaction((transaction) => queueMail(db, transaction, { template: 'resume-link', dedupeKey: 'same', intakeId: intake.id, leadId: null }));
    expect(await db.models.Mail.count({ where: { dedupeKey: 'same' } })).toBe(1);
    await db.models.Mail.update({ state: 'failed' }, { where: { dedupeKey: 'same' } });
  });

  it('queue nothing when the change it tells of is not committed', async () => {
    const intake = await db.models.Intake.create({ answers: {} });
    const broken = db.sequelize.transaction(async (transaction) => {
      await queueMail(db, transaction, { template: 'resume-link', dedupeKey: 'rolled-back', intakeId: intake.id, leadId: null });
      throw new Error('the change failed');
    });
    await expect(broken).rejects.toThrow('the change failed');
    expect(await db.models.Mail.count({ where: { dedupeKey: 'rolled-back' } })).toBe(0);
  });

  it('send a mail once when two workers hold it at the same moment', async () => {
    const { mail } = await queue('held-twice');
    await Promise.all([1, 2, 3].map(() => sendMail(db, mailer, compose, mail.id)));
    expect(sent).toHaveLength(1);
  });

  it('keep a mail while the server is away, with no word of its address, and try again', async () => {
    const { mail } = await queue('away');
    failWith = Object.assign(new Error('could not reach ione@example.com'), { code: 'ESOCKET' });
    await expect(sendMail(db, mailer, compose, mail.id)).rejects.toThrow(/^The mail server is away: ESOCKET$/);
    expect(await mail.reload()).toMatchObject({ state: 'queued', attempts: 1, messageId: null });
    failWith = null;
    await sendMail(db, mailer, compose, mail.id);
    expect(await mail.reload()).toMatchObject({ state: 'sent', attempts: 2 });
  });

  it('give up a mail whose address is refused for good', async () => {
    const { mail } = await queue('refused');
    failWith = Object.assign(new Error('550 no such mailbox'), { code: 'EENVELOPE', responseCode: 550 });
    await sendMail(db, mailer, compose, mail.id);
    expect(await mail.reload()).toMatchObject({ state: 'failed', attempts: 1 });
  });

  it('hold no personal data in their payloads and logs', async () => {
    await queue('payload');
    await startJobs();
    await until(async () => (await db.models.Mail.count({ where: { dedupeKey: 'payload', state: 'sent' } })) === 1);
    const [payloads] = await db.sequelize.query('SELECT payload::text FROM outbox UNION ALL SELECT data::text FROM pgboss.job');
    expect(JSON.stringify(payloads)).not.toContain('@');
    expect(lines.join('')).not.toContain('@');
  });
});
