import { createHash } from 'node:crypto';
import { factsInWords } from '../../shared/wizard/facts-in-words';
import type { ProblemError } from '../../shared/problem';
import { answersToFacts, askedFields, stepProblems, steps, type Answers } from '../../shared/wizard/index';
import type { Deps } from '../deps';
import { pointerOf, problem } from '../http/problem';
import { readIntake } from '../intakes/read-intake';
import { timeZoneOfZip } from '../intakes/place';
import type { Intake } from '../models/intake';
import { isoDateIn } from '../words/dates';
import { findStandingQuote, readQuote, type StoredQuote } from './read-quote';

/** Every question that keeps an intake from a price, with its words. */
const missing = (answers: Answers): ProblemError[] =>
  steps.filter((step) => askedFields(step, answers).length > 0).flatMap((step) => stepProblems(step, answers).map(({ field, detail }) => ({ pointer: pointerOf(['answers', field]), detail })));

const hashOf = (input: unknown): string => createHash('sha256').update(JSON.stringify(input)).digest('hex');

/** Prices the answers of an intake as they are now, by the newest edition and today's date where the home is. Stores nothing. */
function priceNow({ pricing, clock }: Deps, answers: Answers) {
  const { edition } = pricing;
  const facts = answersToFacts(answers);
  const pricedOn = isoDateIn(clock(), timeZoneOfZip(edition, answers.zip));
  const document = pricing.priceIntake({ facts, edition, pricedOn, factsInWords: [...factsInWords(facts, {})] });
  return { document, inputHash: hashOf({ facts, edition: edition.number, pricedOn }) };
}

const isHeld = ({ clock }: Deps, { document }: StoredQuote): boolean =>
  document.heldUntil >= isoDateIn(clock(), document.jurisdiction.timeZone);

/** The price to show again: paid for, or standing and still held. */
async function standing(deps: Deps, intake: Pick<Intake, 'id' | 'stage'>): Promise<StoredQuote | null> {
  const quote = await findStandingQuote(deps.sequelize, intake.id);
  return quote !== null && (intake.stage === 'paid' || intake.stage === 'visit-asked' || isHeld(deps, quote)) ? quote : null;
}

const TRIES = 3;

/** Stores a freshly made price unless answers changed or another tab stored one while it was made. @returns null then */
async function freeze(deps: Deps, intake: Intake, priced: ReturnType<typeof priceNow>): Promise<string | null> {
  const { sequelize, models, clock } = deps;
  const { document, inputHash } = priced;
  const recommended = document.options.find(({ id }) => id === document.recommendedOptionId);
  return sequelize.transaction(async (transaction) => {
    const now = await readIntake(models, intake.id, transaction, true);
    if (now.version !== intake.version || now.stage !== intake.stage) return null;
    await models.Quote.update({ withdrawnAt: clock() }, { where: { intakeId: intake.id, withdrawnAt: null }, transaction });
    const quote = await models.Quote.create({
      intakeId: intake.id, intakeVersion: intake.version, inputHash, document: JSON.stringify(document), outcome: document.outcome,
      rulebookEdition: document.rulebookEdition, createdAt: clock(),
      lowCents: recommended?.lowCents ?? null, highCents: recommended?.highCents ?? null,
    }, { transaction });
    if (now.stage === 'open' || now.stage === 'priced') await now.update({ stage: 'priced' }, { transaction });
    return quote.id;
  });
}

/** 'complete': every question that applies must have an answer. 'as far as answered': for handing over to the estimator without a price. */
export type HowComplete = 'complete' | 'as far as answered';

/**
 * Freezes a price from the answers. While a price stands and is held, the same document comes back, word for word.
 * @throws problems validation (questions without an answer), conflict (answers kept changing while it was priced)
 */
export async function priceIntake(deps: Deps, intakeId: string, howComplete: HowComplete = 'complete'): Promise<StoredQuote> {
  for (let tries = 0; tries < TRIES; tries += 1) {
    const intake = await readIntake(deps.models, intakeId);
    const open = intake.stage === 'open' || intake.stage === 'priced';
    const errors = open && howComplete === 'complete' ? missing(intake.answers) : [];
    if (errors.length > 0) throw problem('validation', 'Answer these first; “Not sure” is an answer.', errors);
    const known = await standing(deps, intake);
    if (known) return known;
    const id = await freeze(deps, intake, priceNow(deps, intake.answers));
    if (id !== null) return readQuote(deps.sequelize, id);
  }
  throw problem('conflict', 'Your answers are still being saved. Try again in a moment.');
}
