import { steps, askedFields, type Answers } from '../../shared/wizard/index';
import { answersToFacts } from '../../shared/wizard/answers-to-facts';
import { dollars } from '../../shared/money';
import { consentWords } from '../../shared/consent';
import { leadStageWords, type LeadStage } from '../../shared/api/desk';
import type { Contact } from '../../shared/api/intakes';
import type { QuoteOption } from '../../shared/quote';
import type { Deps } from '../deps';
import { startIntake } from '../intakes/start-intake';
import { saveAnswers } from '../intakes/save-answers';
import { createLead } from '../leads/create-lead';
import { addPhoto } from '../photos/add-photo';
import { priceIntake } from '../quotes/price-intake';
import { demoHome } from './demo-homes';
import { demoEmail, demoPhone, demoStreets } from './demo-people';
import type { DemoIntake } from './demo-plan';
import type { SeededStaff } from './demo-staff';
import { drawPhoto, type DrawnPhoto } from './draw-photos';
import type { Chance } from './random';

const DAY_MS = 86_400_000;
const HOUR_MS = 3_600_000;

export interface Seeding { readonly deps: Deps; readonly random: Chance; readonly staff: readonly SeededStaff[] }

/** The product as it was at a moment: the same code, another clock. */
const asOf = (deps: Deps, at: Date): Deps => ({ ...deps, clock: () => at });

const isWizardStep = (reached: DemoIntake['reached']) => steps.some((step) => step.id === reached);

/** Answers up to the step where this one stopped; the last step of those half done. */
function answersUntil(answers: Answers, reached: string): Answers {
  const stop = steps.findIndex((step) => step.id === reached);
  const kept = steps.flatMap((step, index) => {
    const fields = askedFields(step, answers);
    return index < stop ? fields : index === stop ? fields.slice(0, Math.floor(fields.length / 2)) : [];
  });
  return Object.fromEntries(kept.flatMap((field) => (answers[field.id] === undefined ? [] : [[field.id, answers[field.id]]])));
}

/** A home that comes out as this intake needs: with an automatic price, or without one. */
function homeFor({ deps, random }: Seeding, plan: DemoIntake): Answers {
  const visit = plan.reached === 'needs-a-visit';
  for (;;) {
    const answers = demoHome(random.pick(plan.homes), random, random.pick([0, 0.05, 0.15, 0.3]));
    const { outcome } = deps.pricing.liveRange({ facts: answersToFacts(answers), edition: deps.pricing.edition });
    if ((outcome === 'visit') === visit) return answers;
  }
}

async function seedPhotos(deps: Deps, random: Chance, intakeId: string, answers: Answers): Promise<void> {
  const mainAmps = Number(answers.mainBreakerAmps) || random.pick([100, 150, 200]);
  const blanks = Number(answers.blankSpaces) || 0;
  const slots: readonly DrawnPhoto[] = ['panel', 'label', 'wall', 'way', 'meter'];
  for (const slot of slots.filter(() => random.often(0.65))) {
    const fault = random.often(0.12) ? random.pick(['dark', 'blurred'] as const) : undefined;
    await addPhoto(deps, intakeId, slot, await drawPhoto(slot, mainAmps, blanks, fault));
  }
}

/** Makes one intake of the demo, through the code that real ones go through, at the times of the plan. */
export async function seedIntake(seeding: Seeding, plan: DemoIntake, name: string, index: number, today: Date): Promise<void> {
  const { random, staff } = seeding;
  const started = new Date(today.getTime() - plan.daysAgo * DAY_MS - random.whole(1, 5) * HOUR_MS);
  const at = (minutes: number) => asOf(seeding.deps, new Date(started.getTime() + minutes * 60_000));
  const { models, sequelize } = seeding.deps;
  const full = homeFor(seeding, plan);
  const answers = isWizardStep(plan.reached) ? answersUntil(full, plan.reached) : full;

  const { intake } = await startIntake(at(0));
  await saveAnswers(at(6), intake.id, answers);
  if (plan.later) await models.Intake.update({ email: demoEmail(name) }, { where: { id: intake.id } });
  await models.History.create({ intakeId: intake.id, at: started, who: 'Homeowner', what: 'Started' });
  if (isWizardStep(plan.reached)) return;

  await seedPhotos(at(7), random, intake.id, answers);
  const quote = await priceIntake(at(8), intake.id);
  await models.History.create({ intakeId: intake.id, at: at(8).clock(), who: 'Tidyrun', what: quote.document.outcome === 'visit' ? 'No automatic price' : 'Price shown' });
  if (plan.reached === 'priced') return;

  const stage = plan.reached as LeadStage;
  const contact: Contact = { name, email: demoEmail(name), phone: demoPhone(index), street: `${random.whole(2, 98)} ${random.pick(demoStreets)}`, contactWays: random.pick([['email'], ['email', 'text'], ['email', 'phone']]), consent: true };
  const option: QuoteOption | null = quote.document.options.find(({ id }) => id === quote.document.recommendedOptionId) ?? null;
  const paidAt = at(15).clock();
  await sequelize.transaction(async (transaction) => {
    // Nobody paid: the demo's deposits stand in our books alone, and no mail is sent about them.
    const deposit = option && await models.Deposit.create({
      intakeId: intake.id, quoteId: quote.id, optionId: option.id, amountCents: option.depositCents, state: 'paid', contact, consentWords, createdAt: paidAt, paidAt,
    }, { transaction });
    await models.Intake.update({ stage: option ? 'paid' : 'visit-asked', updatedAt: paidAt }, { where: { id: intake.id }, transaction });
    const given = { contact, consentWords, consentAt: paidAt, depositId: deposit?.id ?? null };
    const lead = await createLead(seeding.deps, transaction, { intakeId: intake.id, quoteId: quote.id, document: quote.document, option, ...given }, paidAt);
    const person = random.pick(staff as [SeededStaff, ...SeededStaff[]]);
    await models.History.create({ leadId: lead.id, intakeId: intake.id, at: paidAt, who: option ? 'Payment provider' : 'Homeowner', what: option ? 'Deposit paid' : 'Asked for a visit', after: option ? `${dollars(option.depositCents)} for ${option.title}` : null }, { transaction });
    const firm = ['firm-price-sent', 'accepted', 'booked', 'closed'].includes(stage) && option ? option.midCents : lead.firmCents;
    await lead.update({ stage, assigneeId: person.id, firmCents: firm, ...(stage === 'booked' || stage === 'closed' ? { dueAt: null } : {}) }, { transaction });
    if (stage !== 'check-photos' && stage !== 'needs-a-visit') {
      await models.History.create({ leadId: lead.id, at: at(1_500).clock(), staffId: person.id, who: person.name, what: 'Moved', before: leadStageWords['check-photos'], after: leadStageWords[stage] }, { transaction });
    }
  });
}
