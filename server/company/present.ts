import { unknownFacts } from '../../shared/facts';
import type { Company } from '../../shared/api/company';
import { company } from '../config/company';
import type { Deps } from '../deps';

/** The contractor as the public sees it. The opening range is worked out once, from nothing known. */
export function companyOf({ pricing, env }: Pick<Deps, 'pricing' | 'env'>): Company {
  const { edition } = pricing;
  const opening = pricing.openingRange(unknownFacts(), edition);
  if (!opening) throw new RangeError(`Rulebook edition ${edition.number} cannot price a home of which nothing is known`);
  return {
    ...company, demo: env.DEMO, depositCents: edition.deposit.cents,
    towns: edition.jurisdictions.map(({ name, zips }) => ({ name, zips })),
    openingLowCents: opening.lowCents, openingHighCents: opening.highCents,
  };
}
