import type { Step } from '../field';

/** Step 7: the price. Its screen reads the quote document, not fields. */
export const price: Step = {
  id: 'price', number: 7, short: 'Price',
  groups: [{ id: 'price', title: 'Your price', short: 'price', fields: [] }],
  summary: () => '',
};
