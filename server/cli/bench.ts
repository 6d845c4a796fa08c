import { pricingTimeRows } from './measure/pricing-times';
import { measure } from './measure/product';
import { scriptSizeRows } from './measure/script-sizes';
import { printTable } from './measure/table';

/** `npm run bench`: how large the web app is on its way to a homeowner, and how long a price takes. */
async function main(): Promise<void> {
  printTable('Pricing, in this process', pricingTimeRows());
  await measure(async (product, browser) => {
    printTable('JavaScript over the wire, as compressed', await scriptSizeRows(product, browser));
  });
}

void main();
