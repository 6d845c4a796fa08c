import * as endpoints from '../../shared/api/quotes';
import type { Quote } from '../../shared/api/quotes';
import { bind, type Api } from '../http/bind';
import { problem } from '../http/problem';
import { priceIntake } from './price-intake';
import { findStandingQuote, type StoredQuote } from './read-quote';

const presentQuote = ({ id, document, createdAt }: StoredQuote): Quote => ({ id, document, answeredAt: createdAt.toISOString() });

export function quoteRoutes(api: Api): void {
  const { deps } = api;
  bind(api, endpoints.priceIntake, async ({ intakeId }) => presentQuote(await priceIntake(deps, intakeId)), { limit: 'quotes' });

  bind(api, endpoints.getQuote, async ({ intakeId }) => {
    const quote = await findStandingQuote(deps.sequelize, intakeId);
    if (!quote) throw problem('not-found', 'There is no price yet, or an answer changed since. Ask for a new one.');
    return presentQuote(quote);
  });
}
