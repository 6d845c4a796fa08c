import { accessibilityRows } from './measure/accessibility';
import { lighthouseRows } from './measure/lighthouse';
import { measure } from './measure/product';
import { printTable } from './measure/table';

/** `npm run audit`: Lighthouse on the landing page, and axe on every address at four widths. */
void measure(async (product, browser) => {
  printTable('Accessibility', await accessibilityRows(product, browser));
  printTable('Lighthouse on /', await lighthouseRows(`${product.siteUrl}/`));
});
