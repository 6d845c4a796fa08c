import type { Edition } from '../schema';
import { flags } from './flags';
import { jurisdictions } from './jurisdictions';
import { labor } from './labor';
import { likelihoods } from './likelihoods';
import { lines } from './lines';
import { priceBook } from './price-book';
import { rules } from './rules';

/** The rulebook that the demo opens with. Data only: the desk stores later editions in the same shape. */
export const editionOne: Edition = {
  number: 1,
  validFrom: '2026-01-05',
  author: 'Cleo Alder',
  note: 'Opening rulebook. Prices, fees and likelihoods are invented for the demo.',
  jurisdictions,
  priceBook,
  labor,
  markup: { material: 2_000, charger: 1_500 },
  minimumCents: 65_000,
  wire: { panelSlackFt: 6, chargerSlackFt: 3, wastePercent: 10 },
  deposit: { cents: 15_000 },
  holdDays: 30,
  options: { wiredAmps: [16, 24, 32, 40, 48], plugInAmps: [32, 40], ourChargerAmps: 48, upgradeAmps: 200 },
  likelihoods,
  flags,
  lines,
  rules,
};
