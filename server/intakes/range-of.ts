import type { LiveRange } from '../../shared/quote';
import { answersToFacts, type Answers } from '../../shared/wizard/index';
import type { Pricing } from '../deps';

const KEPT = 500;
/** Ranges of late, by the facts they follow from: a page that reads what it has just saved costs nothing. */
const kept = new Map<string, LiveRange>();

/** The range that answers lead to so far. Only what is decided by the answers alone, so it may be remembered. */
export function rangeOf({ liveRange, edition }: Pricing, answers: Answers): LiveRange {
  const facts = answersToFacts(answers);
  const key = `${edition.number} ${JSON.stringify(facts)}`;
  const known = kept.get(key);
  if (known) return known;
  const range = liveRange({ facts, edition });
  if (kept.size >= KEPT) kept.delete(kept.keys().next().value ?? '');
  kept.set(key, range);
  return range;
}
