import type { QuoteOption } from '../../shared/quote';

/** Where "book" leads for an option. */
export const bookHref = (option: Pick<QuoteOption, 'id'>): `/quote/book?option=${string}` => `/quote/book?option=${encodeURIComponent(option.id)}`;
